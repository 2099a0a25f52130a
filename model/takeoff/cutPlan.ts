/** Cutting plans: how many whole lengths it takes to make a set of cuts, each saw cut losing a kerf. */
import { leastLengths, type Sized } from './binBound';
import { completeBins, type Work } from './completeBins';

/** One whole length: the cuts made from it and what is left. */
export interface CutStock {
  readonly cuts: readonly number[];
  readonly left: number;
}

export interface CutPlan {
  readonly stock: readonly CutStock[];
  /** No plan has fewer lengths than this. */
  readonly least: number;
  /** Whether `stock` is proved to be the fewest; where not, the work ran out first. */
  readonly proved: boolean;
}

/** Steps that a plan may take to prove its count, enough for most lists of sixty cuts of as many sizes. */
const WORK = 2_000_000;

/** Lists longer than this are left at first fit where the bound does not prove it. */
const MOST_SEARCHED = 2000;

/**
 * Takes a cut off what is left of a length. A cut that leaves nothing needs no saw beyond it, and one that leaves less
 * than a kerf takes the rest with it.
 */
function leftAfter(left: number, cut: number, kerf: number): number {
  return Math.max(0, left - cut - kerf);
}

/** First fit by falling length: at most 11/9 of the least number of lengths plus one (Johnson's bound). */
export function firstFitFalling(cuts: readonly number[], stock: number, kerf: number): CutStock[] {
  const bins: { cuts: number[]; left: number }[] = [];
  // Bins already too full for the cut in hand stay so for every cut that is no shorter; equal cuts start where the last fitted.
  let start = 0;
  let last = Infinity;
  for (const cut of [...cuts].sort((a, b) => b - a)) {
    if (cut > stock) continue;
    if (cut < last) start = 0;
    last = cut;
    while (start < bins.length && bins[start]!.left < cut) start += 1;
    const bin = bins[start] ?? { cuts: [], left: stock };
    if (start === bins.length) bins.push(bin);
    bin.cuts.push(cut);
    bin.left = leftAfter(bin.left, cut, kerf);
  }
  return bins;
}

function sizesOf(sorted: readonly number[], kerf: number): Sized[] {
  const sizes: { size: number; count: number }[] = [];
  for (const cut of sorted) {
    const last = sizes[sizes.length - 1];
    if (last?.size === cut + kerf) last.count += 1;
    else sizes.push({ size: cut + kerf, count: 1 });
  }
  return sizes;
}

/**
 * The fewest lengths that make the cuts. A length is cut into cuts and a kerf after each but the last, so that cuts grown
 * by a kerf are to be packed into lengths grown by one. The plan by first fit is the answer where a bound says that
 * no plan has fewer lengths; else every smaller count is tried from that bound up, within `work` steps. Cuts longer than
 * the stock are left out: whoever asks can count what came back.
 */
export function cutPlan(cuts: readonly number[], stock: number, kerf: number, work = WORK): CutPlan {
  const sorted = cuts.filter((cut) => cut > 0 && cut <= stock).sort((a, b) => b - a);
  const quick = firstFitFalling(sorted, stock, kerf);
  if (sorted.length === 0) return { stock: quick, least: 0, proved: true };
  const sizes = sizesOf(sorted, kerf);
  let least = leastLengths(sizes, stock + kerf);
  const budget: Work = { left: sorted.length > MOST_SEARCHED ? 0 : work };
  for (; least < quick.length; least += 1) {
    const found = completeBins(sizes, stock + kerf, least, budget);
    if (found === 'work') return { stock: quick, least, proved: false };
    if (!found) continue;
    const bins = found.map((bin) => {
      const made = bin.map((size) => size - kerf);
      return { cuts: made, left: made.reduce((left, cut) => leftAfter(left, cut, kerf), stock) };
    });
    return { stock: bins, least, proved: true };
  }
  return { stock: quick, least: quick.length, proved: true };
}

/** The lengths of the best plan found within the usual work. */
export function planCuts(cuts: readonly number[], stock: number, kerf: number): readonly CutStock[] {
  return cutPlan(cuts, stock, kerf).stock;
}
