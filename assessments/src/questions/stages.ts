import { type Option } from './compiled.ts';
import { type StageWord } from './curve-types.ts';
import { type CurveSheet } from './curve-schema.ts';

/** What a trainee may answer; a charger that rests and one that is off read alike. */
type Answer = 'bulk' | 'absorption' | 'float' | 'rest' | 'cannot tell';

const ALWAYS: readonly Answer[] = ['bulk', 'absorption', 'float'];

const NAMES: Record<Answer, string> = {
  bulk: 'Bulk',
  absorption: 'Absorption',
  float: 'Float',
  rest: 'Off or at rest',
  'cannot tell': 'Cannot tell from these lines',
};

const FLOWS = 'No current leaves the charger here: no stage is at work.';
const HELD = 'A stage can be told: look at what is held, the current or the voltage.';

/** What to say when the first is read as the second (definitions: DIN 41773, from memory). */
const READ_AS: Record<Answer, Partial<Record<Answer, string>>> = {
  bulk: {
    absorption:
      'In absorption the voltage is held. Here it still climbs and the current is at the charger’s limit.',
    float: 'In float the voltage is held low. Here it climbs and the charger gives all it has.',
    rest: 'At rest no current leaves the charger. Here it gives all it has.',
    'cannot tell': HELD,
  },
  absorption: {
    bulk: 'In bulk the current is held and the voltage climbs. Here the voltage is flat at its higher setting.',
    float: 'Float is the lower held voltage. Here the voltage is still at the absorption setting.',
    rest: 'At rest nothing is held. Here the voltage is held at its higher setting.',
    'cannot tell': HELD,
  },
  float: {
    bulk: 'In bulk the voltage climbs. Here it is flat: the voltage names the stage, not the current.',
    absorption:
      'Absorption is the higher held voltage. Here the voltage has gone down to the float setting.',
    rest: 'At rest nothing is held. Here the voltage is held at its lower setting.',
    'cannot tell': HELD,
  },
  rest: {
    bulk: FLOWS,
    absorption: FLOWS,
    float: FLOWS,
    'cannot tell': 'It can be told: no current leaves the charger.',
  },
  'cannot tell': {
    bulk: 'In bulk the current is at the charger’s limit. Here it is under the limit, and the voltage under its setting.',
    absorption:
      'In absorption the voltage is flat at its setting. Here it is under it, and the current under the limit.',
    float:
      'In float the voltage is flat at its lower setting. Here it is not held, and the current is under the limit.',
    rest: 'At rest no current leaves the charger. Here some does.',
  },
};

/** The option that names what an interval shows. */
function answerTo(stage: StageWord): Answer {
  return stage === 'off' ? 'rest' : stage;
}

/**
 * Options of "name this interval", each wrong one with its reason: the three stages, and what else
 * the curve shows or offers.
 */
export function stageOptions(right: StageWord, curve: CurveSheet): Option[] {
  const shown = Object.values(curve.intervals).map((entry) =>
    answerTo(typeof entry === 'string' ? entry : entry.stage),
  );
  const key = answerTo(right);
  return [...new Set([...ALWAYS, ...shown, ...curve.offer])].map((answer) => ({
    text: NAMES[answer],
    right: answer === key,
    say: READ_AS[key][answer] ?? null,
  }));
}
