import { type Stage } from '../electrical/charging.ts';
import { type Option } from './compiled.ts';

export const STAGES: readonly Stage[] = ['bulk', 'absorption', 'float'];

const NAMES: Record<Stage, string> = { bulk: 'Bulk', absorption: 'Absorption', float: 'Float' };

/** What to say when the first is read as the second (definitions: DIN 41773, from memory). */
const READ_AS: Record<Stage, Partial<Record<Stage, string>>> = {
  bulk: {
    absorption:
      'In absorption the voltage is held. Here it still climbs and the current is at the charger’s limit.',
    float: 'In float the voltage is held low. Here it climbs and the charger gives all it has.',
  },
  absorption: {
    bulk: 'In bulk the current is held and the voltage climbs. Here the voltage is flat at its higher setting.',
    float: 'Float is the lower held voltage. Here the voltage is still at the absorption setting.',
  },
  float: {
    bulk: 'In bulk the voltage climbs. Here it is flat: the voltage names the stage, not the current.',
    absorption:
      'Absorption is the higher held voltage. Here the voltage has gone down to the float setting.',
  },
};

/** Options of "name this interval", each wrong one with its reason. */
export function stageOptions(right: Stage, stages: readonly Stage[]): Option[] {
  return stages.map((stage) => ({
    text: NAMES[stage],
    right: stage === right,
    say: READ_AS[right][stage] ?? null,
  }));
}
