import { type CurveView } from './views.ts';

/** One line of a curve. Lines of a pane differ by their dashes and their names, never by colour alone. */
export interface CurveLine {
  key: string;
  pane: 'volts' | 'amps';
  /** "Voltage" */
  name: string;
  unit: 'V' | 'A';
  /** In words, for who hears the reading. */
  said: string;
  places: number;
  /** Dashes of the stroke; none for the first line of a pane. */
  dashes: string;
  values: readonly number[];
}

type Kind = Pick<CurveLine, 'pane' | 'unit' | 'places'> & { plural: string };

const volts: Kind = { pane: 'volts', unit: 'V', places: 2, plural: 'volts' };
const amps: Kind = { pane: 'amps', unit: 'A', places: 1, plural: 'amperes' };

const dashed = ['', '9 5', '2 4'];

/** The lines in the order in which they are named, read and listed. */
export function linesOf(curve: CurveView): CurveLine[] {
  const { batteryVolts, inputVolts, batteryAmps } = curve;
  const isTwoEnded = batteryVolts !== undefined;
  const voltLines = [
    { key: 'volts', name: isTwoEnded ? 'At the charger' : 'Voltage', values: curve.volts },
    { key: 'battery-volts', name: 'At the battery', values: batteryVolts },
    { key: 'input-volts', name: 'Input', values: inputVolts },
  ];
  const ampLines = [
    { key: 'amps', name: batteryAmps ? 'Charger' : 'Current', values: curve.amps },
    { key: 'battery-amps', name: 'Into the battery', values: batteryAmps },
  ];
  return [...draw(volts, voltLines), ...draw(amps, ampLines)];
}

interface Given {
  key: string;
  name: string;
  values: readonly number[] | undefined;
}

function draw({ plural, ...kind }: Kind, given: readonly Given[]): CurveLine[] {
  const lines = given.flatMap(({ values, ...line }) => (values ? [{ ...line, values }] : []));
  return lines.map((line, index) => ({
    ...kind,
    ...line,
    said: lines.length > 1 ? `${plural}, ${line.name.toLowerCase()}` : plural,
    dashes: dashed[index] ?? '',
  }));
}

/** "14.40"; a true minus stands before what flows out. */
export function figureOf({ places }: CurveLine, value: number): string {
  const figure = value.toFixed(places);
  return Number(figure) === 0 ? figure.replace('-', '') : figure.replace('-', '\u2212');
}

/** "Voltage, V"; "At the battery, V" */
export const headOf = ({ name, unit }: CurveLine) => `${name}, ${unit}`;
