/** A symbol of the course's drawings, in words. */
export interface DrawingSymbol {
  readonly slug: string;
  /** Letter of its reference designation; empty when it has none. */
  readonly letter: string;
  readonly name: string;
  /** What it looks like, for whoever cannot see it. */
  readonly looks: string;
  readonly means: string;
}

const symbol = (
  slug: string,
  [letter, name]: readonly [string, string],
  [looks, means]: readonly [string, string],
): DrawingSymbol => ({ slug, letter, name, looks, means });

/** Symbols of IEC 60617 as the course draws them (from memory). */
export const SYMBOLS: readonly DrawingSymbol[] = [
  symbol(
    'battery',
    ['B', 'Battery'],
    [
      'Pairs of a long thin line and a short one, across the conductor; the long line is positive.',
      'A source that is always there: it cannot be switched off, only disconnected.',
    ],
  ),
  symbol(
    'alternator',
    ['G', 'Alternator or other machine'],
    ['A circle with the letter G.', 'A source while its engine turns.'],
  ),
  symbol(
    'panel',
    ['G', 'Solar panel'],
    [
      'A rectangle with a small triangle pointing in from one short side, and two arrows of light.',
      'A source whenever there is light.',
    ],
  ),
  symbol(
    'converter',
    ['U', 'Charger or converter'],
    [
      'A square cut by a diagonal, with a sign for DC on each side.',
      'Takes power in at one voltage and gives it out at another.',
    ],
  ),
  symbol(
    'fuse',
    ['F', 'Fuse'],
    [
      'A rectangle along the conductor, with the line running through it.',
      'Opens by itself when the current is too large for its cable.',
    ],
  ),
  symbol(
    'breaker',
    ['Q', 'Circuit breaker'],
    [
      'A switch with a small cross at its fixed contact.',
      'Opens by itself and can be closed again.',
    ],
  ),
  symbol(
    'isolator',
    ['Q', 'Isolator'],
    [
      'A switch with a short bar across its fixed contact.',
      'Opened to work safely, and locked; not meant to break a load.',
    ],
  ),
  symbol(
    'switch',
    ['S', 'Switch'],
    ['A line hinged at one contact and standing off the other.', 'Turns a load on and off.'],
  ),
  symbol(
    'relay',
    ['K', 'Relay'],
    [
      'A rectangle for the coil, a dashed line to the contact it moves.',
      'A switch moved by a small current in another circuit.',
    ],
  ),
  symbol('lamp', ['E', 'Lamp'], ['A circle with a cross in it.', 'A load that gives light.']),
  symbol(
    'resistor',
    ['R', 'Resistor or heater'],
    ['A plain rectangle, open inside.', 'A load that turns power into heat.'],
  ),
  symbol(
    'motor',
    ['M', 'Motor'],
    ['A circle with the letter M.', 'A load that takes several times its current as it starts.'],
  ),
  symbol(
    'voltmeter',
    ['P', 'Voltmeter'],
    ['A circle with the letter V.', 'Connected across what it measures.'],
  ),
  symbol(
    'ammeter',
    ['P', 'Ammeter'],
    ['A circle with the letter A.', 'Connected so that the current goes through it.'],
  ),
  symbol(
    'shunt',
    ['R', 'Shunt'],
    [
      'A resistor with two small taps between its ends.',
      'A known small resistance: the millivolts across it tell the current.',
    ],
  ),
  symbol(
    'diode',
    ['V', 'Diode'],
    [
      'A triangle whose tip meets a bar.',
      'Lets current through the way the triangle points, and costs some volts.',
    ],
  ),
  symbol(
    'socket',
    ['X', 'Terminal, plug or socket'],
    [
      'A small open circle for a terminal; an arc over a short line for a plug in its socket.',
      'A place where a circuit can be parted and tested.',
    ],
  ),
  symbol(
    'joint',
    ['', 'Joint of conductors'],
    ['A dot where lines meet.', 'Connected; lines that cross without a dot are not.'],
  ),
  symbol(
    'busbar',
    ['W', 'Busbar'],
    [
      'A thick line that conductors join.',
      'One point of the circuit, made long enough to bolt to.',
    ],
  ),
  symbol(
    'frame',
    ['', 'Frame or chassis'],
    [
      'A short line with three slanting strokes under it.',
      'Connected to the body of the vehicle or boat. It is not the ground.',
    ],
  ),
  symbol(
    'earth',
    ['', 'Protective earth'],
    [
      'Three lines under each other, each shorter than the one above, in a circle.',
      'A connection to earth for safety. Work on it belongs to licensed electricians.',
    ],
  ),
];
