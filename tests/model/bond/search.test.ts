import { describe, expect, it } from 'vitest';
import type { BondLimits, Span } from '../../../model/bond/courseFill';
import type { CourseEnd } from '../../../model/bond/ends';
import { fillStretch } from '../../../model/bond/fillStretch';

/** Small numbers, all in hundreds, so that trying every arrangement in steps of a hundred is exact: a 14 in unit is 2 800. */
const STEP = 100;
const UNIT = 2800;
const JOINT = 100;
const LEAST = 700;
const limits: BondLimits = {
  unit: UNIT,
  joint: { nominal: JOINT, least: JOINT, most: JOINT },
  leastLap: LEAST,
  leastPiece: LEAST,
  wantedLap: LEAST,
  offset: 1 / 4,
};

const plain = (at: number, quoin: boolean): CourseEnd => ({ at, joint: false, lapped: false, returnWidth: 0, quoin });
const butt = (at: number): CourseEnd => ({ at, joint: true, lapped: true, returnWidth: 0, quoin: false });

type Ends = 'corners' | 'free' | 'jamb';

function spansFor(ends: Ends, length: number, width: number): readonly [Span, Span] {
  if (ends === 'free') {
    const span = { from: plain(0, false), to: plain(length, false) };
    return [span, span];
  }
  const to =
    ends === 'jamb'
      ? ([plain(length, false), plain(length, false)] as const)
      : ([plain(length, true), butt(length - width)] as const);
  return [
    { from: butt(width), to: to[0] },
    { from: plain(0, true), to: to[1] },
  ];
}

interface Laid {
  readonly joints: readonly number[];
  readonly inner: readonly (readonly [number, number])[];
  readonly cuts: number;
}

/** Every course that fills the span with pieces in steps of a hundred and at most `most` closers. */
function everyCourse(span: Span, most: number): Laid[] {
  const found: Laid[] = [];
  const end = span.to.at - (span.to.joint ? JOINT : 0);
  const grow = (at: number, pieces: [number, number][], cuts: number): void => {
    const [lastFrom, lastTo] = pieces[pieces.length - 1] ?? [0, 0];
    if (pieces.length > 0 && lastTo === end) {
      const isCut = ([a, b]: readonly [number, number]) => b - a < UNIT;
      if ((span.from.quoin && isCut(pieces[0]!)) || (span.to.quoin && isCut([lastFrom, lastTo]))) return;
      const joints = pieces.slice(1).map(([from]) => from - JOINT);
      if (span.from.joint) joints.unshift(span.from.at);
      if (span.to.joint) joints.push(end);
      found.push({ joints, inner: pieces.slice(1, -1).filter(isCut), cuts });
      return;
    }
    for (let size = LEAST; size <= UNIT; size += STEP) {
      const cut = size < UNIT ? 1 : 0;
      if (at + size > end || cuts + cut > most) continue;
      pieces.push([at, at + size]);
      grow(at + size + JOINT, pieces, cuts + cut);
      pieces.pop();
    }
  };
  grow(span.from.at + (span.from.joint ? JOINT : 0), [], 0);
  return found;
}

function laps(a: Laid, b: Laid): boolean {
  const apart = a.joints.every((p) => b.joints.every((q) => Math.abs(p - q) >= LEAST + JOINT));
  return apart && a.inner.every(([from, to]) => b.inner.every(([start, end]) => to <= start || end <= from));
}

/** The fewest cuts of any pair of courses that keeps every rule, or null. */
function fewestCuts(spans: readonly [Span, Span], most: number): number | null {
  const odds = everyCourse(spans[0], most);
  const evens = everyCourse(spans[1], most);
  for (let cuts = 0; cuts <= 2 * most; cuts += 1)
    for (const odd of odds) for (const even of evens) if (odd.cuts + even.cuts === cuts && laps(odd, even)) return cuts;
  return null;
}

function jointStarts(span: Span, pieces: readonly number[]): number[] {
  const joints: number[] = [];
  if (span.from.joint) joints.push(span.from.at);
  for (let i = 2; i < pieces.length; i += 2) joints.push(pieces[i - 1]!);
  if (span.to.joint) joints.push(pieces[pieces.length - 1]!);
  return joints;
}

function every(from: number, to: number, step: number): number[] {
  return Array.from({ length: Math.floor((to - from) / step) + 1 }, (_, i) => from + i * step);
}

describe('The search for a bond, against trying every arrangement', () => {
  const cases = [
    ...every(6000, 11_400, 300).map((length) => ['corners', length, 2000] as const),
    ...every(6100, 9100, 500).map((length) => ['corners', length, 1400] as const),
    ...every(3200, 9800, 300).map((length) => ['free', length, 0] as const),
    ...every(5000, 9800, 300).map((length) => ['jamb', length, 2000] as const),
  ];

  it.each(cases)('%s, %i long beside a wall %i thick: the same number of cuts', (ends, length, width) => {
    const spans = spansFor(ends, length, width);
    const expected = fewestCuts(spans, 2);
    const pair = fillStretch({ spans, first: 0, both: true, below: null, whole: null }, limits);
    const read = (parity: 0 | 1): Laid => {
      const { pieces, cuts } = pair[parity];
      const inner: [number, number][] = [];
      for (let i = 2; i < pieces.length - 2; i += 2)
        if (pieces[i + 1]! - pieces[i]! < UNIT) inner.push([pieces[i]!, pieces[i + 1]!]);
      return { joints: jointStarts(spans[parity], pieces), inner, cuts };
    };
    const [odd, even] = [read(0), read(1)];
    if (expected === null) return expect(laps(odd, even) && pair[0].faults + pair[1].faults === 0).toBe(false);
    expect({ cuts: odd.cuts + even.cuts, laps: laps(odd, even) }).toEqual({ cuts: expected, laps: true });
  });
});
