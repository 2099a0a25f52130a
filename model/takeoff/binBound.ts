/** A least number of lengths that a set of cuts can't do without. */

/** A size to be cut and how many of it. */
export interface Sized {
  readonly size: number;
  readonly count: number;
}

/** Up to this many different sizes are tried as the threshold of the bound. */
const MOST_THRESHOLDS = 200;

/**
 * The bound L2 of Martello and Toth (Knapsack Problems, 1990, section 8.3.2; from memory): for each threshold, sizes that
 * leave less than it beside them have a length of their own, those over half a length have one each, and what the smaller
 * ones don't find room for beside these takes more. Never more than the least count, never less than the sum over the length.
 */
export function leastLengths(sizes: readonly Sized[], length: number): number {
  const total = sizes.reduce((sum, { size, count }) => sum + size * count, 0);
  let best = Math.ceil(total / length - 1e-12);
  const small = sizes.filter(({ size }) => 2 * size <= length).map(({ size }) => size);
  for (const threshold of [0, ...small.slice(0, MOST_THRESHOLDS)]) {
    let own = 0;
    let half = 0;
    let room = 0;
    let rest = 0;
    for (const { size, count } of sizes) {
      if (size > length - threshold) own += count;
      else if (2 * size > length) [half, room] = [half + count, room + count * (length - size)];
      else if (size >= threshold) rest += size * count;
    }
    best = Math.max(best, own + half + Math.max(0, Math.ceil((rest - room) / length - 1e-12)));
  }
  return best;
}
