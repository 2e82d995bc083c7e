import { advance, branchOn, type Drive } from './circuit.ts';
import { readInput, startSlopePerH } from './inputs.ts';
import { SAME_H } from './timetable.ts';
import { driveAt, flagsOf, look, type Moment, type Sight, type World } from './world.ts';

const SECONDS_PER_HOUR = 3600;
/** Halvings of a step of a minute: to some microseconds. */
const HALVINGS = 24;

/** A moment with what is read the instant before it: by the timetable of the step that led there. */
export interface Stand {
  moment: Moment;
  sight: Sight;
}

/** One step, cut short where one of the flags changes. */
export function stepFrom(world: World, from: Stand, spanH: number): Stand & { isChanged: boolean } {
  const flags = flagsOf(world, from.moment, from.sight);
  const isChanged = ({ moment, sight }: Stand): boolean => flagsOf(world, moment, sight) !== flags;
  let after = standAfter(world, from, spanH);
  if (!isChanged(after)) return { ...after, isChanged: false };
  let [beforeH, afterH] = [0, spanH];
  for (let halving = 0; halving < HALVINGS; halving += 1) {
    const middleH = (beforeH + afterH) / 2;
    const middle = standAfter(world, from, middleH);
    if (isChanged(middle)) [after, afterH] = [middle, middleH];
    else beforeH = middleH;
  }
  return { ...after, isChanged: true };
}

function standAfter(world: World, from: Stand, spanH: number): Stand {
  const { run } = world;
  const { hour } = from.moment;
  const drive = driveOver(world, from, hour + spanH / 2);
  const battery = advance(run.battery, from.moment.battery, {
    spanS: spanH * SECONDS_PER_HOUR,
    branchAt: (state) => branchOn(from.sight.branch.at, { battery: run.battery, state, drive }),
  });
  const moment: Moment = { hour: hour + spanH, battery, startCharge: from.moment.startCharge };
  const before = Math.max(hour, moment.hour - 2 * SAME_H);
  if (run.vehicle) moment.startCharge = startChargeAfter(world, from, { moment, spanH });
  return { moment, sight: look(world, moment, before) };
}

/** Between two steps nothing switches; only a hot charger's limit slides. */
function driveOver(world: World, { sight }: Stand, hour: number): Drive {
  return world.run.charger.derate ? driveAt(world, hour) : sight.drive;
}

/** The start battery by its slope half-way, at the mean of the watts drawn at both ends. */
function startChargeAfter(
  { run, sources }: World,
  from: Stand,
  to: { moment: Moment; spanH: number },
): number {
  const { vehicle } = run;
  if (!vehicle) return NaN;
  const { hour, startCharge } = from.moment;
  const { volts, amps } = from.sight.circuit;
  const watts = sources.source === 'vehicle' ? (volts * amps) / vehicle.efficiency : 0;
  const slope = (charge: number): number =>
    startSlopePerH(vehicle.battery, readInput(vehicle, { hour, charge, watts }).batteryA);
  const middle = startCharge + (slope(startCharge) * to.spanH) / 2;
  return clamped(startCharge + slope(clamped(middle)) * to.spanH);
}

const clamped = (charge: number): number => Math.min(1, Math.max(0, charge));
