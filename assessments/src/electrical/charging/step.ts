import { advance, branchOn } from './circuit.ts';
import { readInput, startSlopePerH } from './inputs.ts';
import { SAME_H } from './timetable.ts';
import { driveAt, flagsOf, look, type Moment, type Sight, type World } from './world.ts';

const SECONDS_PER_HOUR = 3600;
/** Halvings of a step of a minute: to some microseconds. */
const HALVINGS = 24;

/** One step, cut short where one of the flags changes. */
export function stepFrom(world: World, from: Moment, spanH: number): Moment {
  const sight = look(world, from, from.hour);
  const flags = flagsOf(world, from, sight);
  const isChanged = (moment: Moment): boolean => {
    // The instant before: what the timetable changes at the end belongs to the next step.
    const seen = look(world, moment, Math.max(from.hour, moment.hour - 2 * SAME_H));
    return flagsOf(world, moment, seen) !== flags;
  };
  const whole = momentAfter(world, from, { spanH, sight });
  if (!isChanged(whole)) return whole;
  let before = 0;
  let after = { spanH, moment: whole };
  for (let halving = 0; halving < HALVINGS; halving += 1) {
    const middleH = (before + after.spanH) / 2;
    const moment = momentAfter(world, from, { spanH: middleH, sight });
    if (isChanged(moment)) after = { spanH: middleH, moment };
    else before = middleH;
  }
  return after.moment;
}

function momentAfter(
  world: World,
  from: Moment,
  { spanH, sight }: { spanH: number; sight: Sight },
): Moment {
  const { run } = world;
  const drive = driveAt(world, from.hour + spanH / 2);
  const battery = advance(run.battery, from.battery, {
    spanS: spanH * SECONDS_PER_HOUR,
    branchAt: (state) => branchOn(sight.branch.at, { battery: run.battery, state, drive }),
  });
  const hour = from.hour + spanH;
  const moment = { hour, battery, startCharge: from.startCharge };
  return { ...moment, startCharge: startChargeAfter(world, { from, to: moment }, spanH) };
}

/** The start battery by its slope half-way, at the mean of the watts drawn at both ends. */
function startChargeAfter(
  world: World,
  { from, to }: { from: Moment; to: Moment },
  spanH: number,
): number {
  const { vehicle } = world.run;
  if (!vehicle) return NaN;
  const wattsAt = (moment: Moment): number => {
    const { circuit } = look(world, moment, from.hour);
    const isDrawn = world.sources.source === 'vehicle';
    return isDrawn ? (circuit.volts * circuit.amps) / vehicle.efficiency : 0;
  };
  const slope = (charge: number, watts: number): number =>
    startSlopePerH(
      vehicle.battery,
      readInput(vehicle, { hour: from.hour, charge, watts }).batteryA,
    );
  const [first, last] = [wattsAt(from), wattsAt(to)];
  const middle = from.startCharge + (slope(from.startCharge, first) * spanH) / 2;
  return share(from.startCharge + slope(share(middle), (first + last) / 2) * spanH);
}

const share = (charge: number): number => Math.min(1, Math.max(0, charge));
