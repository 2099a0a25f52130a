/** Courses beside an opening that keep to the bond of the whole wall and are closed only at the jambs. */
import { measureFill, spanLength, type BondLimits, type CourseFill, type Span } from './courseFill';

/** Pieces between a jamb and the wall's bond, nearest the jamb first. */
type Closing = readonly number[];

/**
 * Ways to close `room` (clear of the joint at the bond's first piece): with one piece, or with that and the next unit
 * made into two. `fitsAlready` where the bond's first piece needs nothing beside it.
 */
function closingsFor(
  room: number,
  fitsAlready: boolean,
  limits: BondLimits,
): { readonly pieces: Closing; readonly taken: number }[] {
  const { unit, leastPiece } = limits;
  const closings: { pieces: Closing; taken: number }[] = [];
  if (fitsAlready) closings.push({ pieces: [], taken: 0 });
  if (room >= leastPiece && room <= unit) closings.push({ pieces: [room], taken: 0 });
  const two = room + unit;
  const least = Math.min(leastPiece, unit);
  for (const first of new Set([Math.round(two / 2), least, two - least, two - unit])) {
    const second = two - first;
    if (first >= least && second >= least && first < unit && second < unit)
      closings.push({ pieces: [first, second], taken: 1 });
  }
  return closings;
}

/** Whether a piece that far from a jamb or a lintel's end needs nothing between: no gap, or a joint inside its limits. */
function fitsBeside(gap: number, joint: boolean, limits: BondLimits): boolean {
  return joint ? gap >= limits.joint.least && gap <= limits.joint.most : gap === 0;
}

/**
 * Fills a span with the pieces of the whole wall's course (`[start, end, …]`) that lie inside it, closing what is left at
 * each jamb. `atStart` and `atEnd` say which ends are the wall's own, where the course already fits.
 */
export function gridFills(
  span: Span,
  course: readonly number[],
  atStart: boolean,
  atEnd: boolean,
  limits: BondLimits,
): CourseFill[] {
  if (spanLength(span) <= 0) return [];
  const from = span.from.at + (span.from.joint && !atStart ? limits.joint.nominal : 0);
  const to = span.to.at - (span.to.joint && !atEnd ? limits.joint.nominal : 0);
  let first = 0;
  while (first < course.length && course[first]! < from) first += 2;
  let last = course.length - 2;
  while (last >= 0 && course[last + 1]! > to) last -= 2;
  if (last < first) return [];
  const jointBefore = first >= 2 ? course[first]! - course[first - 1]! : limits.joint.nominal;
  const jointAfter = last + 2 < course.length ? course[last + 2]! - course[last + 1]! : limits.joint.nominal;
  const none = [{ pieces: [] as Closing, taken: 0 }];
  const starts = atStart
    ? none
    : closingsFor(
        course[first]! - jointBefore - from,
        fitsBeside(course[first]! - span.from.at, span.from.joint, limits),
        limits,
      );
  const ends = atEnd
    ? none
    : closingsFor(
        to - course[last + 1]! - jointAfter,
        fitsBeside(span.to.at - course[last + 1]!, span.to.joint, limits),
        limits,
      );
  const fills: CourseFill[] = [];
  for (const start of starts)
    for (const end of ends) {
      const inner = course.slice(first + 2 * start.taken, last + 2 - 2 * end.taken);
      // A unit that is made into two closers has to be a whole one, and not be wanted at both jambs.
      const taken = [
        ...course.slice(first, first + 2 * start.taken),
        ...course.slice(last + 2 - 2 * end.taken, last + 2),
      ];
      if (
        inner.length === 0 ||
        (taken.length > 0 && taken.some((at, i) => i % 2 === 1 && at - taken[i - 1]! !== limits.unit))
      )
        continue;
      const pieces: number[] = [];
      let at = from;
      for (const size of start.pieces) {
        pieces.push(at, at + size);
        at += size + jointBefore;
      }
      pieces.push(...inner);
      const closed: number[] = [];
      at = to;
      for (const size of end.pieces) {
        closed.unshift(at - size, at);
        at -= size + jointAfter;
      }
      fills.push(measureFill(span, [...pieces, ...closed], limits));
    }
  return fills;
}
