/** Whether a set of cuts goes into so many lengths, by filling one length after another. */
import type { Sized } from './binBound';

/** Steps left to a search, each a size looked at; counted, never timed. */
export interface Work {
  left: number;
}

/**
 * Fills `count` lengths with all the sizes (falling), or says that it can't be done (`null`) or that the work ran out
 * (`'work'`). The next length always takes the largest size that is left, and with it a set of others to which none that
 * is left could be added: in any filling, what would still fit can be moved there from another length, so that nothing is
 * lost. What all lengths together can waste is known beforehand, and a length that wastes more is not tried.
 * States once found hopeless are kept. Returns the sizes of each length.
 */
export function completeBins(
  sizes: readonly Sized[],
  length: number,
  count: number,
  work: Work,
): number[][] | null | 'work' {
  const left = sizes.map((each) => each.count);
  const total = sizes.reduce((sum, each) => sum + each.size * each.count, 0);
  const bins: number[][] = [];
  const hopeless = new Set<string>();
  let remaining = sizes.reduce((sum, each) => sum + each.count, 0);

  function nextBin(waste: number): boolean {
    if (remaining === 0) return true;
    if (bins.length >= count || work.left <= 0) return false;
    work.left -= sizes.length;
    const key = `${bins.length} ${left.join()}`;
    if (hopeless.has(key)) return false;
    const first = left.findIndex((n) => n > 0);
    const bin: number[] = [];
    bins.push(bin);
    take(first, bin);
    if (fill(first, length - sizes[first]!.size, Infinity, bin, waste)) return true;
    give(first, bin);
    bins.pop();
    if (work.left > 0) hopeless.add(key);
    return false;
  }

  function take(i: number, bin: number[]): void {
    left[i]! -= 1;
    remaining -= 1;
    bin.push(sizes[i]!.size);
  }

  function give(i: number, bin: number[]): void {
    left[i]! += 1;
    remaining += 1;
    bin.pop();
  }

  /** `passed` is the smallest size that was passed over though it was left: it must not fit in the end. */
  function fill(from: number, room: number, passed: number, bin: number[], waste: number): boolean {
    work.left -= 1 + sizes.length - from;
    if (work.left <= 0) return false;
    for (let i = from; i < sizes.length; i += 1) {
      const { size } = sizes[i]!;
      if (left[i] === 0 || size > room) continue;
      take(i, bin);
      if (fill(i, room - size, passed, bin, waste)) return true;
      give(i, bin);
      passed = Math.min(passed, size);
      if (work.left <= 0) return false;
    }
    return passed > room && room <= waste && nextBin(waste - room);
  }

  if (nextBin(count * length - total)) return bins;
  return work.left <= 0 ? 'work' : null;
}
