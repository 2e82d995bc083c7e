/** Words of a sheet for what an interval shows. */
export type StageWord = 'bulk' | 'absorption' | 'float' | 'rest' | 'off' | 'cannot tell';

/** What is read off a drawn charge curve; `at` names the given that holds the time. */
export type CurveRead =
  | { kind: 'bulk ends' | 'float starts' | 'absorption lasts' | 'amps before float' }
  | { kind: 'quiet ends' | 'protection opens' | 'vehicle taken' | 'vehicle let go' }
  | { kind: 'highest volts' | 'amp-hours in bulk' }
  | {
      kind: 'amps at' | 'volts at' | 'battery amps at' | 'battery volts at' | 'input volts at';
      at: string;
    };

/**
 * A curve as it is kept: names of given values. What is marked optional was added later; a plan kept
 * before has none of it.
 */
export interface CurvePlan {
  battery: {
    kind: 'flooded' | 'agm' | 'gel' | 'lithium';
    capacity: string;
    charge: string;
    blocks: number;
    temperature?: string;
    aged?: { capacity: string; resistance: string };
    protection?: { opensAt: string; closesAt?: string };
  };
  charger: {
    limit: string;
    absorption: string;
    float: string | null;
    tail: string;
    /** h; null for no limit. */
    longestAbsorption: string | null;
    leastAbsorption?: string;
    tailAt?: 'charger' | 'battery';
    afterAbsorption?: 'float' | 'rest' | 'hold';
    restart?: string;
    compensation?: string;
    quietUntil?: string;
    derate?: { from: string; to: string; over?: string };
    lead?: string;
    sense?: 'charger' | 'battery';
    pauses?: { every: string; for: string };
  };
  vehicle?: VehiclePlan;
  solar?: { amps: string; shade?: { from: string; until: string; amps: string } };
  load: { amps: string; from: string | null; until?: string } | null;
  hours: number;
  show?: ('battery volts' | 'battery amps' | 'input volts')[];
  /** An interval may be kept before or after the time a given names. */
  intervals: { label: string; stage: StageWord; before: string | null; after: string | null }[];
}

interface VehiclePlan {
  from?: string;
  until?: string;
  volts: string;
  engage: string;
  release: string;
  delay: string;
  override: boolean;
  cable: string;
  efficiency: string;
  battery: { capacity: string; charge: string };
}
