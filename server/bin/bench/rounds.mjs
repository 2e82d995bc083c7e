/** Thrown away: the compiler is still at work on what runs for the first time. */
const warmingRounds = 2;

const sorted = (numbers) => [...numbers].sort((a, b) => a - b);

/** The value below which this share of the numbers lies. */
const quantile = (numbers, share) => sorted(numbers)[Math.round((numbers.length - 1) * share)];

function compareFigure(rounds, name) {
  const ours = rounds.map((round) => round.ours[name]);
  const bare = rounds.map((round) => round.bare[name]);
  const ratios = rounds.map((round) => round.ours[name] / round.bare[name]);
  return {
    ours: quantile(ours, 0.5),
    bare: quantile(bare, 0.5),
    ratio: quantile(ratios, 0.5),
    low: quantile(ratios, 0.25),
    high: quantile(ratios, 0.75),
  };
}

/**
 * Measures two ways of doing the same in turn, who goes first changing every round, so that
 * whatever else the machine does falls on both.
 *
 * @param sides - `ours` and `bare` each resolve to figures by name, in milliseconds.
 * @returns for each figure the medians, and the middle half of the rounds' ratios.
 */
export async function compare({ rounds, ours, bare, signal }) {
  const measured = [];
  for (let round = 0; round < warmingRounds + rounds; round += 1) {
    signal.throwIfAborted();
    const sides = round % 2 === 0 ? { ours, bare } : { bare, ours };
    const figures = {};
    for (const [side, measure] of Object.entries(sides)) figures[side] = await measure(round);
    if (round >= warmingRounds) measured.push(figures);
  }
  const names = Object.keys(measured[0].ours);
  return Object.fromEntries(names.map((name) => [name, compareFigure(measured, name)]));
}

/** The median of what `measure` says the processor took, over so many rounds. */
export async function medianOf(measure, rounds) {
  const figures = [];
  for (let round = 0; round < warmingRounds + rounds; round += 1) {
    const { processor } = await measure();
    if (round >= warmingRounds) figures.push(processor);
  }
  return quantile(figures, 0.5);
}

const processorMilliseconds = () => {
  const { user, system } = process.cpuUsage();
  return (user + system) / 1000;
};

/**
 * A side that does its work over and over until it has used so much of the processor, and says
 * how much one took. Not the clock: on a busy machine that would count other programs' turns.
 *
 * @param options - `batch` is how often it works between two looks.
 */
export function repeated(work, { milliseconds, batch = 1 }) {
  return async () => {
    const began = processorMilliseconds();
    let count = 0;
    let spent = 0;
    while (spent < milliseconds) {
      for (let turn = 0; turn < batch; turn += 1) await work();
      count += batch;
      spent = processorMilliseconds() - began;
    }
    return { processor: spent / count };
  };
}
