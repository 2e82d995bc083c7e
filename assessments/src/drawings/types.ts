/** Data of the drawings of a lesson that a reader can handle; figures in the unit of their name. */

interface Range {
  from: number;
  to: number;
  step: number;
}

interface Sourced {
  /** Where its figures come from, as printed under it. */
  source: string;
}

/** Voltage along a two-wire run whose length, area and current can be moved. */
export interface VoltageRun extends Sourced {
  kind: 'voltage-run';
  supplyV: number;
  start: { lengthM: number; areaMm2: number; amps: number };
  lengthM: Range;
  amps: Range;
  /** Sizes to choose from, each with the resistance of one conductor. */
  areas: { areaMm2: number; ohmsPerM: number }[];
  limits: { percent: number; volts: number; label: string }[];
}

/** What a meter shows at one moment of a charge. */
export interface ChargeMoment {
  volts: number;
  amps: number;
  chargePercent: number;
}

/** A charge stepped through stage by stage. */
export interface ChargeCurve extends Sourced {
  kind: 'charge-curve';
  settings: { chargerA: number; absorptionV: number; floatV: number; tailA: number };
  battery: { name: string; capacityAh: number; startPercent: number };
  hours: number;
  points: (ChargeMoment & { hour: number })[];
  stages: {
    name: 'bulk' | 'absorption' | 'float';
    fromH: number;
    toH: number;
    from: ChargeMoment;
    to: ChargeMoment;
    /** Put out in this stage. */
    ah: number;
    says: string;
  }[];
}

/** Which input a charger takes as an engine starts and stops. */
export interface SourceTimeline extends Sourced {
  kind: 'source-timeline';
  settings: { engageV: number; releaseV: number; delayS: number; solarA: number; chargerA: number };
  minutes: number;
  events: { minute: number; title: string; says: string }[];
  spells: {
    fromMinute: number;
    toMinute: number;
    engine: boolean;
    source: 'solar' | 'vehicle' | 'none';
    chargerA: number;
    says: string;
  }[];
  points: { minute: number; inputV: number; chargerA: number }[];
}

/** Charger against monitor against loads, each load switched on and off. */
export interface CurrentBalanceDrawing extends Sourced {
  kind: 'current-balance';
  chargerA: Range & { start: number };
  loads: { name: string; amps: number; isOn: boolean }[];
  /** Wired to the battery's own post, past the shunt. */
  bypass: { name: string; amps: number; isOn: boolean };
}

/** Data of one drawing. */
export type DrawingData = VoltageRun | ChargeCurve | SourceTimeline | CurrentBalanceDrawing;
