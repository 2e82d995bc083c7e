import { OutOfRange, within } from '../out-of-range.ts';
import { type ChargeRun, type ChargerSettings, type VehicleInput } from './settings.ts';

/**
 * Refuses a run that makes no sense.
 *
 * @throws {OutOfRange} naming the value, the rule and the remedy.
 */
export function requireRun(run: ChargeRun): void {
  const { charge, charger, vehicle, hours, stepS } = run;
  within(charge, {
    what: 'Charge at the start',
    unit: 'of full',
    least: 0.01,
    most: 0.99,
    remedy: 'give it as a share of the capacity',
  });
  within(hours, { what: 'Log', unit: 'h', least: 0.05, most: 48, remedy: 'shorten it' });
  within(stepS, { what: 'Step', unit: 's', least: 1, most: 600, remedy: 'choose a shorter one' });
  requireCharger(charger);
  if (vehicle) requireVehicle(vehicle);
  requireProtection(run.battery.protection);
}

function requireProtection(protection: ChargeRun['battery']['protection']): void {
  if (!protection || protection.closesV < protection.opensV) return;
  const { closesV, opensV } = protection;
  throw new OutOfRange(
    `Protection that closes at ${closesV} V is not below the ${opensV} V at which it opens; lower it.`,
  );
}

function requireCharger(charger: ChargerSettings): void {
  within(charger.limitA, {
    what: 'Current limit',
    unit: 'A',
    least: 1,
    most: 500,
    remedy: 'give what the charger puts out in bulk',
  });
  requireOrder(charger);
  requirePauses(charger.pauses);
  within(charger.leadOhms ?? 0, {
    what: 'Lead',
    unit: 'Ω',
    least: 0,
    most: 1,
    remedy: 'give the resistance of the pair, out and back',
  });
}

function requireOrder(charger: ChargerSettings): void {
  const { floatV, absorptionV, afterAbsorption = 'float' } = charger;
  const { leastAbsorptionH = 0, longestAbsorptionH } = charger;
  if (afterAbsorption === 'float' && !(floatV < absorptionV)) {
    throw new OutOfRange(
      `Float ${floatV} V is not below absorption ${absorptionV} V; lower the float setting.`,
    );
  }
  if (leastAbsorptionH > longestAbsorptionH) {
    throw new OutOfRange(
      `Least absorption ${leastAbsorptionH} h is over the longest, ${longestAbsorptionH} h; shorten it.`,
    );
  }
}

function requirePauses(pauses: ChargerSettings['pauses']): void {
  if (!pauses) return;
  const everyS = pauses.everyH * 3600;
  within(everyS, {
    what: 'Off-load look every',
    unit: 's',
    least: 10,
    most: 3600,
    remedy: 'it comes every few minutes',
  });
  within(pauses.forH * 3600, {
    what: 'Off-load look of',
    unit: 's',
    least: 1,
    most: everyS / 2,
    remedy: 'it lasts some seconds',
  });
}

function requireVehicle({ engageV, releaseV, efficiency, charge }: VehicleInput): void {
  if (!(releaseV < engageV)) {
    throw new OutOfRange(
      `Release ${releaseV} V is not below engagement ${engageV} V; lower it, or the charger hunts.`,
    );
  }
  within(efficiency, {
    what: 'Efficiency',
    unit: 'of the watts in',
    least: 0.5,
    most: 1,
    remedy: 'give it as a share',
  });
  within(charge, {
    what: 'Charge of the start battery',
    unit: 'of full',
    least: 0.05,
    most: 1,
    remedy: 'give it as a share of its capacity',
  });
}
