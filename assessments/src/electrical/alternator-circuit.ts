import { feedConstantPower } from './alternator.ts';
import { OutOfRange } from './out-of-range.ts';

/** An alternator, a start battery and what hangs on its posts; the chassis is the return. */
export interface AlternatorCircuit {
  /** Held behind a resistance up to a current limit: 0 A with the engine off, Infinity for none. */
  alternator: { setV: number; ohms: number; limitA: number };
  startBattery: { restV: number; ohms: number };
  /** Steady demands at the posts, A. */
  loadsA: number;
  /** A DC-DC charger's input: watts, and the resistance of its pair, Ω. */
  charger: { watts: number; ohms: number };
}

export interface AlternatorFlow {
  /** At the start battery's posts, V. */
  postV: number;
  alternatorA: number;
  /** Into the start battery; under 0 it makes up what the alternator cannot give. */
  batteryA: number;
  chargerA: number;
  /** At the charger's input, V. */
  chargerV: number;
}

/**
 * Volts and amps of the circuit: the one point at which all currents at the posts add to nought
 * (Kirchhoff's current law).
 *
 * @throws {OutOfRange} when the circuit cannot give the charger's power.
 */
export function alternatorFlow(circuit: AlternatorCircuit): AlternatorFlow {
  const { startBattery, loadsA, charger } = circuit;
  let postV = postVolts(circuit, loadsA);
  // Each round draws what the last volts called for; the volts sink to the upper of two balances.
  for (let round = 0; round < MOST_ROUNDS; round += 1) {
    const fed = feedConstantPower({ openV: postV, ohms: charger.ohms, watts: charger.watts });
    const nextV = postVolts(circuit, loadsA + fed.amps);
    if (postV - nextV <= postV * SETTLED) {
      const batteryA = (nextV - startBattery.restV) / startBattery.ohms;
      const alternatorA = batteryA + loadsA + fed.amps;
      return { postV: nextV, alternatorA, batteryA, chargerA: fed.amps, chargerV: fed.volts };
    }
    if (nextV < startBattery.restV / 2) break;
    postV = nextV;
  }
  throw new OutOfRange(
    `${charger.watts} W is more than this circuit can give; lower the power or the resistances.`,
  );
}

const MOST_ROUNDS = 2000;
const SETTLED = 1e-14;

/** Volts at the posts under a demand: alternator within its limit, at it, or giving nothing. */
function postVolts({ alternator, startBattery }: AlternatorCircuit, demandA: number): number {
  const { setV, ohms, limitA } = alternator;
  const { restV } = startBattery;
  const bothV =
    (setV / ohms + restV / startBattery.ohms - demandA) / (1 / ohms + 1 / startBattery.ohms);
  const wantedA = (setV - bothV) / ohms;
  if (wantedA >= 0 && wantedA <= limitA) return bothV;
  return restV + ((wantedA > limitA ? limitA : 0) - demandA) * startBattery.ohms;
}
