/**
 * A cost that depends on a height, over whole ticks, piece by piece linear. Costs are pairs compared in strict order:
 * first hard heights missed, then soft misses by weight. The search adds, slides and takes the lower of such costs.
 */

/** `hard`: missed hard heights × `HARD_MISS` + ticks missed. `soft`: weighted ticks. Whole numbers, exact in doubles. */
export interface Cost {
  readonly hard: number;
  readonly soft: number;
}

/** One missed hard height: more than any sum of missed ticks can reach (60 heights × 200 m is under 2³⁴). */
export const HARD_MISS = 2 ** 40;

export const NO_COST: Cost = { hard: 0, soft: 0 };

/** Cost at `lo` and its slope for each tick up to `hi`, both ends included. */
export interface Piece {
  readonly lo: number;
  readonly hi: number;
  readonly hard: number;
  readonly soft: number;
  readonly hardSlope: number;
  readonly softSlope: number;
}

export function compareCosts(a: Cost, b: Cost): number {
  return a.hard !== b.hard ? a.hard - b.hard : a.soft - b.soft;
}

export function addCosts(a: Cost, b: Cost): Cost {
  return { hard: a.hard + b.hard, soft: a.soft + b.soft };
}

export function costOn(piece: Piece, height: number): Cost {
  const along = height - piece.lo;
  return { hard: piece.hard + piece.hardSlope * along, soft: piece.soft + piece.softSlope * along };
}

/** The cost at one height, by binary search; null where no piece covers it. */
export function costAt(pieces: readonly Piece[], height: number): Cost | null {
  let low = 0;
  let high = pieces.length - 1;
  while (low <= high) {
    const middle = (low + high) >> 1;
    const piece = pieces[middle] as Piece;
    if (height < piece.lo) high = middle - 1;
    else if (height > piece.hi) low = middle + 1;
    else return costOn(piece, height);
  }
  return null;
}

/** The piece cut to `lo`…`hi`, which lies within it. */
export function cut(piece: Piece, lo: number, hi: number): Piece {
  return lo === piece.lo && hi === piece.hi ? piece : moved(piece, lo, hi, 0);
}

/** The part of a piece within `lo`…`hi`, moved up `by`. Written out field by field: the search lives on this. */
function moved(piece: Piece, lo: number, hi: number, by: number): Piece {
  const along = lo - piece.lo;
  return {
    lo: lo + by,
    hi: hi + by,
    hard: piece.hard + piece.hardSlope * along,
    soft: piece.soft + piece.softSlope * along,
    hardSlope: piece.hardSlope,
    softSlope: piece.softSlope,
  };
}

/** Adds a piece at the upper end, joined to the last one where it goes straight on. */
function append(pieces: Piece[], piece: Piece): void {
  const last = pieces[pieces.length - 1];
  if (last && last.hi + 1 === piece.lo) {
    const next = costOn(last, piece.lo);
    const slopes = last.hardSlope === piece.hardSlope && last.softSlope === piece.softSlope;
    if (next.hard === piece.hard && next.soft === piece.soft && (slopes || piece.lo === piece.hi)) {
      pieces[pieces.length - 1] = moved(last, last.lo, piece.hi, 0);
      return;
    }
  }
  pieces.push(piece);
}

/** Walks two lists over stretches on which each is one piece or nothing. */
function together(
  a: readonly Piece[],
  b: readonly Piece[],
  visit: (lo: number, hi: number, one: Piece | undefined, other: Piece | undefined) => void,
): void {
  let i = 0;
  let j = 0;
  let at = Math.min(a[0]?.lo ?? Infinity, b[0]?.lo ?? Infinity);
  while (i < a.length || j < b.length) {
    const p = a[i];
    const q = b[j];
    const one = p && p.lo <= at ? p : undefined;
    const other = q && q.lo <= at ? q : undefined;
    const end = Math.min(p ? (one ? p.hi : p.lo - 1) : Infinity, q ? (other ? q.hi : q.lo - 1) : Infinity);
    if (one || other) visit(at, end, one, other);
    if (p && p.hi === end) i++;
    if (q && q.hi === end) j++;
    at = end + 1;
  }
}

/** The lower of two costs at every height that either covers. */
export function lowerOf(a: readonly Piece[], b: readonly Piece[]): Piece[] {
  if (a.length === 0) return [...b];
  if (b.length === 0) return [...a];
  const lower: Piece[] = [];
  together(a, b, (lo, hi, one, other) => {
    if (one && other) appendLower(lower, cut(one, lo, hi), cut(other, lo, hi));
    else append(lower, cut((one ?? other) as Piece, lo, hi));
  });
  return lower;
}

/** The lower of two pieces over the same stretch: at most three parts, split where the order of their costs turns. */
function appendLower(lower: Piece[], a: Piece, b: Piece): void {
  const hard = a.hard - b.hard;
  const hardSlope = a.hardSlope - b.hardSlope;
  const soft = a.soft - b.soft;
  const softSlope = a.softSlope - b.softSlope;
  const turns: number[] = [];
  if (hardSlope !== 0) {
    const zero = a.lo - hard / hardSlope;
    turns.push(Math.ceil(zero), Math.floor(zero) + 1);
  } else if (hard === 0 && softSlope !== 0) {
    turns.push(Math.floor(a.lo - soft / softSlope) + 1);
  }
  let lo = a.lo;
  for (const turn of [...turns, a.hi + 1]) {
    if (turn <= lo || turn > a.hi + 1) continue;
    const hi = turn - 1;
    // The order is the same on the whole part except perhaps where the two are equal at one end.
    const better = compareCosts(costOn(a, lo), costOn(b, lo)) || compareCosts(costOn(a, hi), costOn(b, hi));
    append(lower, cut(better <= 0 ? a : b, lo, hi));
    lo = turn;
  }
}

/** The sum of two costs, over the heights that both cover. */
export function sumOf(a: readonly Piece[], b: readonly Piece[]): Piece[] {
  const sum: Piece[] = [];
  together(a, b, (lo, hi, one, other) => {
    if (!one || !other) return;
    const p = cut(one, lo, hi);
    const q = cut(other, lo, hi);
    append(sum, {
      lo,
      hi,
      hard: p.hard + q.hard,
      soft: p.soft + q.soft,
      hardSlope: p.hardSlope + q.hardSlope,
      softSlope: p.softSlope + q.softSlope,
    });
  });
  return sum;
}

/** The least cost of coming to each height from one that is `least` to `most` below it, kept to `lo`…`hi`. */
export function slideUp(
  pieces: readonly Piece[],
  least: number,
  most: number,
  lo: number,
  hi: number,
): readonly Piece[] {
  return lowestOf(pieces.map((piece) => clip(slidePiece(piece, least, most), lo, hi)));
}

/** The lowest of many costs, taken in pairs so that the work grows as n log n. */
export function lowestOf(costs: readonly (readonly Piece[])[]): readonly Piece[] {
  let round = costs.filter((pieces) => pieces.length > 0);
  while (round.length > 1) {
    const next: (readonly Piece[])[] = [];
    for (let i = 0; i < round.length; i += 2) {
      const [one, other] = [round[i] as readonly Piece[], round[i + 1]];
      next.push(other ? lowerOf(one, other) : one);
    }
    round = next;
  }
  return round[0] ?? [];
}

function slidePiece(piece: Piece, least: number, most: number): Piece[] {
  const { lo, hi, hardSlope, softSlope } = piece;
  const rising = hardSlope !== 0 ? hardSlope : softSlope;
  if (rising === 0 || lo === hi) return [flat(piece, lo + least, hi + most, lo)];
  return rising > 0
    ? [flat(piece, lo + least, lo + most, lo), moved(piece, lo + 1, hi, most)]
    : [moved(piece, lo, hi - 1, least), flat(piece, hi + least, hi + most, hi)];
}

function flat(piece: Piece, lo: number, hi: number, from: number): Piece {
  const along = from - piece.lo;
  return {
    lo,
    hi,
    hard: piece.hard + piece.hardSlope * along,
    soft: piece.soft + piece.softSlope * along,
    hardSlope: 0,
    softSlope: 0,
  };
}

function clip(pieces: readonly Piece[], lo: number, hi: number): Piece[] {
  const kept: Piece[] = [];
  for (const piece of pieces) {
    const from = Math.max(lo, piece.lo);
    const to = Math.min(hi, piece.hi);
    if (from <= to) kept.push(cut(piece, from, to));
  }
  return kept;
}

/** The same pieces, each costing `soft` more. */
export function charged(pieces: readonly Piece[], soft: number): readonly Piece[] {
  return soft === 0 ? pieces : pieces.map((piece) => ({ ...piece, soft: piece.soft + soft }));
}

/** The same costs, `by` higher. */
export function raise(pieces: readonly Piece[], by: number): Piece[] {
  return pieces.map((piece) => moved(piece, piece.lo, piece.hi, by));
}

/** The heights at which neither part of the cost is over its bound. */
export function prune(pieces: readonly Piece[], bound: Cost): Piece[] {
  const kept: Piece[] = [];
  for (const piece of pieces) {
    const hard = under(piece.lo, piece.hi, piece.hard, piece.hardSlope, bound.hard);
    const soft = under(piece.lo, piece.hi, piece.soft, piece.softSlope, bound.soft);
    const lo = Math.max(hard.lo, soft.lo);
    const hi = Math.min(hard.hi, soft.hi);
    if (lo <= hi) kept.push(cut(piece, lo, hi));
  }
  return kept;
}

/** Where a straight cost stays within its bound; `lo` is over `hi` where it never does. */
function under(lo: number, hi: number, start: number, slope: number, bound: number): { lo: number; hi: number } {
  const room = bound - start;
  if (slope === 0) return room >= 0 ? { lo, hi } : { lo, hi: lo - 1 };
  if (slope > 0) return { lo, hi: Math.min(hi, lo + Math.floor(room / slope)) };
  return { lo: Math.max(lo, lo + Math.ceil(room / slope)), hi };
}
