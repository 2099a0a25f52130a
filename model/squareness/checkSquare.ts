/** Taped sides and diagonals against the drawing: how far out the corners stand, and which to move by how much. */
import type { Vec } from '../geometry/point';
import { roundTicks, ticks, type Ticks } from '../length/ticks';
import { alignShape } from './alignShape';
import { fitShape } from './fitShape';
import type { CornerMove, DrawnCorner, Squareness, Taped, TapedResult } from './types';

/** A normalised residual over this is a misreading rather than chance: 1 in 1 000 (the usual limit of data snooping, from memory). */
const MISREAD = 3.29;
/** Less of its own error than this showing, a measurement is taken as unchecked. */
const UNCHECKED = 1e-6;
/** Numbers this near are the same: beyond it, one spare measurement can't tell which is misread. */
const ALIKE = 1e-3;

export interface SquareLimits {
  /** How nearly the tape was read: the standard deviation of a measurement; above zero. */
  readonly accuracy: Ticks;
  /** How far a length may be out (the rule `squareMost`). */
  readonly most: Ticks;
}

/**
 * Checks a figure of any number of corners, in any order, by any of its sides and diagonals. The corners as they stand are
 * fitted to the tape by least squares, the drawing is laid over them as nearly as it goes, and the moves are what is left.
 * Measurements that name no corner, or one corner twice, are left out. Work grows as n³; total on anything.
 */
export function checkSquare(
  corners: readonly DrawnCorner[],
  taped: readonly Taped[],
  { accuracy, most }: SquareLimits,
): Squareness {
  const indexOf = new Map(corners.map(({ id }, i) => [id, i]));
  const used = taped.flatMap((one) => {
    const [a, b] = [indexOf.get(one.from), indexOf.get(one.to)];
    return a === undefined || b === undefined || a === b ? [] : [{ ...one, a, b }];
  });
  const drawn = centred(corners);
  const fit = fitShape(drawn, used);
  const results = used.map(({ id, a, b, length }, i): TapedResult => {
    const wanted = Math.hypot(drawn[b]!.x - drawn[a]!.x, drawn[b]!.y - drawn[a]!.y);
    const checked = fit.checked[i]! < UNCHECKED ? 0 : fit.checked[i]!;
    const residual = fit.residuals[i]!;
    return {
      id,
      drawn: roundTicks(wanted),
      off: roundTicks(length - roundTicks(wanted)),
      residual: roundTicks(residual),
      checked,
      normalised: checked === 0 ? 0 : Math.abs(residual) / (accuracy * Math.sqrt(checked)),
    };
  });
  const spareExact = fit.checked.reduce((sum, part) => sum + part, 0);
  const freedoms = Math.max(0, 2 * corners.length - 3);
  const fixed = corners.length > 1 && Math.abs(used.length - spareExact - freedoms) < 0.01;
  const worst = ticks(results.reduce((far, { off }) => Math.max(far, Math.abs(off)), 0));
  return {
    taped: results,
    spare: used.length - freedoms,
    fixed,
    worst,
    within: worst <= most,
    moves: movesTo(corners, alignShape(drawn, fit.points), fit.points),
    single: fixed ? singleMove(corners, drawn, fit.points) : null,
    misread: misreadOf(results, fit.residuals),
  };
}

function centred(corners: readonly DrawnCorner[]): readonly Vec[] {
  const n = Math.max(1, corners.length);
  const middle = corners.reduce((sum, { at }) => ({ x: sum.x + at.x / n, y: sum.y + at.y / n }), { x: 0, y: 0 });
  return corners.map(({ at }) => ({ x: at.x - middle.x, y: at.y - middle.y }));
}

function movesTo(corners: readonly DrawnCorner[], wanted: readonly Vec[], found: readonly Vec[]): CornerMove[] {
  // The figure as found lies over the drawing but for a small turn; moves are told in the drawing's directions.
  return corners.map(({ id }, i) => {
    const [x, y] = [wanted[i]!.x - found[i]!.x, wanted[i]!.y - found[i]!.y];
    return { cornerId: id, x: roundTicks(x), y: roundTicks(y), distance: roundTicks(Math.hypot(x, y)) };
  });
}

/** For each corner the drawing is laid over all the others; the one that leaves those least out is moved. */
function singleMove(
  corners: readonly DrawnCorner[],
  drawn: readonly Vec[],
  found: readonly Vec[],
): Squareness['single'] {
  let best: { move: CornerMove; squares: number; left: number } | null = null;
  for (let moved = 0; moved < corners.length; moved++) {
    const moves = alignShape(drawn, found, (i) => i !== moved).map((at, i) => {
      return { x: at.x - found[i]!.x, y: at.y - found[i]!.y };
    });
    let [squares, left] = [0, 0];
    moves.forEach(({ x, y }, i) => {
      if (i === moved) return;
      squares += x * x + y * y;
      left = Math.max(left, Math.hypot(x, y));
    });
    if (best && best.squares <= squares) continue;
    const { x, y } = moves[moved]!;
    const { id } = corners[moved]!;
    const move = { cornerId: id, x: roundTicks(x), y: roundTicks(y), distance: roundTicks(Math.hypot(x, y)) };
    best = { move, squares, left };
  }
  return best ? { ...best.move, left: roundTicks(best.left) } : null;
}

function misreadOf(results: readonly TapedResult[], residuals: readonly number[]): Squareness['misread'] {
  const largest = results.reduce((most, { normalised }) => Math.max(most, normalised), 0);
  if (!(largest > MISREAD)) return [];
  return results.flatMap(({ id, normalised, checked }, i) => {
    if (normalised < largest * (1 - ALIKE)) return [];
    // What shows of an error is its checked part, with the sign turned.
    return [{ id, by: roundTicks(-residuals[i]! / checked) }];
  });
}
