/** Cutting plans: how many whole lengths it takes to make a set of cuts, each saw cut losing a kerf. */

/** One whole length: the cuts made from it and what is left. */
export interface CutStock {
  readonly cuts: readonly number[];
  readonly left: number;
}

/** Up to this many cuts are planned exactly; beyond, first fit by falling length. */
const EXACT_CUTS = 14;

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

/**
 * The fewest lengths that make the cuts, found by trying every way that differs, largest cut first, kept under the
 * count of the plan by first fit. Cuts longer than the stock are left out: whoever asks can count what came back.
 */
export function planCuts(cuts: readonly number[], stock: number, kerf: number): CutStock[] {
  const sorted = cuts.filter((cut) => cut > 0 && cut <= stock).sort((a, b) => b - a);
  let best = firstFitFalling(sorted, stock, kerf);
  const need = sorted.reduce((sum, cut) => sum + cut, 0);
  const bound = Math.ceil(need / stock);
  if (sorted.length > EXACT_CUTS || best.length <= bound) return best;
  const bins: { cuts: number[]; left: number }[] = [];
  const place = (k: number): boolean => {
    if (bins.length >= best.length) return false;
    const cut = sorted[k];
    if (cut === undefined) {
      best = bins.map((bin) => ({ cuts: [...bin.cuts], left: bin.left }));
      return best.length <= bound;
    }
    const tried = new Set<number>();
    for (const bin of bins) {
      if (bin.left < cut || tried.has(bin.left)) continue;
      tried.add(bin.left);
      const before = bin.left;
      bin.cuts.push(cut);
      bin.left = leftAfter(before, cut, kerf);
      if (place(k + 1)) return true;
      bin.cuts.pop();
      bin.left = before;
    }
    bins.push({ cuts: [cut], left: leftAfter(stock, cut, kerf) });
    if (place(k + 1)) return true;
    bins.pop();
    return false;
  };
  place(0);
  return best;
}
