import { type CurveSheet } from './curve-schema.ts';

/** A name that a curve leans on, and the unit its given value must have. */
type Setting = readonly [name: string | undefined, unit: string];

/** Every name of a curve block. */
export function curveSettings(curve: CurveSheet): Setting[] {
  const { load } = curve;
  return [
    ...ofBattery(curve.battery),
    ...ofCharger(curve.charger),
    ...ofInputs(curve.input),
    ...ofIntervals(curve.intervals),
    [load?.amps, 'A'],
    [load?.from, 'h'],
    [load?.until, 'h'],
  ];
}

function ofBattery({ capacity, charge, ...battery }: CurveSheet['battery']): Setting[] {
  return [
    [capacity, 'Ah'],
    [charge, '%'],
    [battery.temperature, '°C'],
    [battery.aged?.capacity, '%'],
    [battery.aged?.resistance, ''],
    [battery.protection?.['opens at'], 'V'],
    [battery.protection?.['closes at'], 'V'],
  ];
}

function ofCharger(charger: CurveSheet['charger']): Setting[] {
  return [
    [charger.limit, 'A'],
    [charger.absorption, 'V'],
    [charger.float, 'V'],
    [charger.tail, 'A'],
    [charger['longest absorption'], 'h'],
    [charger['least absorption'], 'h'],
    [charger.restart, 'V'],
    [charger.compensation, 'mV/K'],
    [charger.quiet?.until, 'h'],
    [charger.derate?.from, 'h'],
    [charger.derate?.to, 'A'],
    [charger.derate?.over, 'h'],
    [charger.lead, 'mΩ'],
    [charger.pauses?.every, 's'],
    [charger.pauses?.for, 's'],
  ];
}

function ofInputs(input: CurveSheet['input']): Setting[] {
  return [...ofVehicle(input?.vehicle), ...ofSolar(input?.solar)];
}

function ofVehicle(vehicle: NonNullable<CurveSheet['input']>['vehicle']): Setting[] {
  if (!vehicle) return [];
  return [
    [vehicle.from, 'h'],
    [vehicle.until, 'h'],
    [vehicle.volts, 'V'],
    [vehicle.engage, 'V'],
    [vehicle.release, 'V'],
    [vehicle.delay, 's'],
    [vehicle.cable, 'mΩ'],
    [vehicle.efficiency, ''],
    [vehicle.battery.capacity, 'Ah'],
    [vehicle.battery.charge, '%'],
  ];
}

function ofSolar(solar: NonNullable<CurveSheet['input']>['solar']): Setting[] {
  if (!solar) return [];
  return [
    [solar.amps, 'A'],
    [solar.shade?.from, 'h'],
    [solar.shade?.until, 'h'],
    [solar.shade?.amps, 'A'],
  ];
}

function ofIntervals(intervals: CurveSheet['intervals']): Setting[] {
  return Object.values(intervals).flatMap((entry): Setting[] =>
    typeof entry === 'string'
      ? []
      : [
          [entry.before, 'h'],
          [entry.after, 'h'],
        ],
  );
}
