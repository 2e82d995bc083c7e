/** Doublings of a bracket before a search gives up: 2^60 times the first guess. */
const MOST_DOUBLINGS = 60;

/**
 * Where a function that only rises passes through nought, to the last binary digit.
 *
 * @param scale - a size the root is likely to have, above 0; the bracket grows from there.
 * @throws {Error} when the function does not change its sign.
 */
export function risingRoot(rise: (x: number) => number, scale: number): number {
  let [low, high] = bracket(rise, scale);
  for (;;) {
    const middle = (low + high) / 2;
    if (middle <= low || middle >= high) return middle;
    if (rise(middle) < 0) low = middle;
    else high = middle;
  }
}

function bracket(rise: (x: number) => number, scale: number): [low: number, high: number] {
  let low = -scale;
  let high = scale;
  for (let doublings = 0; doublings < MOST_DOUBLINGS; doublings += 1) {
    const isLowUnder = rise(low) <= 0;
    if (isLowUnder && rise(high) >= 0) return [low, high];
    if (isLowUnder) high *= 2;
    else low *= 2;
  }
  throw new Error(`No root within ${high}: the function does not rise through nought.`);
}
