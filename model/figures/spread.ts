/** Texts in a column beside heights: each as near its own height as it can be, none nearer to the next than a gap. */

/**
 * Places for the wanted heights, given in rising order, at least `gap` apart and with the least sum of squared moves
 * (pooling neighbours that would touch: isotonic regression). Heights already far enough apart stay where they are.
 */
export function spreadApart(wanted: readonly number[], gap: number): number[] {
  // Taking i × gap off each height turns "at least a gap apart" into "never falling", which pooling solves.
  const pools: { sum: number; count: number }[] = [];
  wanted.forEach((height, i) => {
    pools.push({ sum: height - i * gap, count: 1 });
    for (;;) {
      const last = pools[pools.length - 1];
      const before = pools[pools.length - 2];
      if (!last || !before || before.sum / before.count <= last.sum / last.count) break;
      before.sum += last.sum;
      before.count += last.count;
      pools.pop();
    }
  });
  const places: number[] = [];
  for (const pool of pools)
    for (let i = 0; i < pool.count; i += 1) places.push(pool.sum / pool.count + places.length * gap);
  return places;
}
