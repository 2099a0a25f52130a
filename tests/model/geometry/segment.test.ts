import fc from 'fast-check';
import GeometryFactory from 'jsts/org/locationtech/jts/geom/GeometryFactory.js';
import Coordinate from 'jsts/org/locationtech/jts/geom/Coordinate.js';
import DistanceOp from 'jsts/org/locationtech/jts/operation/distance/DistanceOp.js';
import { describe, expect, it } from 'vitest';
import { distanceBetweenSegments, isOnSegment, meetLines, meetSegments } from '../../../model/geometry/segment';
import { ticks } from '../../../model/length/ticks';

const at = (x: number, y: number) => ({ x: ticks(x), y: ticks(y) });
const seg = (x1: number, y1: number, x2: number, y2: number) => ({ a: at(x1, y1), b: at(x2, y2) });

describe('two segments', () => {
  it('cross in the middle', () => {
    expect(meetSegments(seg(0, 0, 10, 10), seg(0, 10, 10, 0))).toEqual({ kind: 'cross', at: { x: 5, y: 5 } });
  });
  it('touch where an end of one lies on the other', () => {
    expect(meetSegments(seg(0, 0, 10, 0), seg(4, 0, 4, 9))).toEqual({ kind: 'touch', at: at(4, 0) });
    expect(meetSegments(seg(4, 9, 4, 0), seg(0, 0, 10, 0))).toEqual({ kind: 'touch', at: at(4, 0) });
    expect(meetSegments(seg(0, 0, 10, 0), seg(10, 0, 20, 5))).toEqual({ kind: 'touch', at: at(10, 0) });
    expect(meetSegments(seg(0, 0, 10, 0), seg(10, 0, 20, 0))).toEqual({ kind: 'touch', at: at(10, 0) });
  });
  it('overlap along one line, whichever way they run', () => {
    expect(meetSegments(seg(0, 0, 10, 0), seg(15, 0, 4, 0))).toEqual({
      kind: 'overlap',
      from: at(4, 0),
      to: at(10, 0),
    });
    expect(meetSegments(seg(0, 0, 0, 10), seg(0, 2, 0, 5))).toEqual({ kind: 'overlap', from: at(0, 2), to: at(0, 5) });
  });
  it('stand apart by one tick over two kilometres', () => {
    expect(meetSegments(seg(-1_280_000_000, 0, 1_280_000_000, 1), seg(0, 1, 0, 9)).kind).toBe('apart');
    expect(meetSegments(seg(-1_280_000_000, 0, 1_280_000_000, 2), seg(0, 1, 0, 9)).kind).toBe('touch');
  });
  it('may be points', () => {
    expect(meetSegments(seg(3, 0, 3, 0), seg(0, 0, 10, 0))).toEqual({ kind: 'touch', at: at(3, 0) });
    expect(meetSegments(seg(3, 1, 3, 1), seg(0, 0, 10, 0)).kind).toBe('apart');
  });

  it('meet as a general geometry library says, on a dense grid', () => {
    const factory = new GeometryFactory();
    const line = (s: ReturnType<typeof seg>) =>
      factory.createLineString([new Coordinate(s.a.x, s.a.y), new Coordinate(s.b.x, s.b.y)]);
    const small = fc.integer({ min: 0, max: 6 });
    fc.assert(
      fc.property(fc.tuple(small, small, small, small), fc.tuple(small, small, small, small), (p, q) => {
        fc.pre((p[0] !== p[2] || p[1] !== p[3]) && (q[0] !== q[2] || q[1] !== q[3]));
        const [a, b] = [seg(...p), seg(...q)];
        const away = DistanceOp.distance(line(a), line(b));
        expect(meetSegments(a, b).kind === 'apart').toBe(away > 0);
        expect(distanceBetweenSegments(a.a, a.b, b.a, b.b)).toBeCloseTo(away, 9);
        expect(meetSegments(b, a).kind).toBe(meetSegments(a, b).kind);
      }),
      { numRuns: 3000 },
    );
  });
});

describe('points and lines', () => {
  it('knows a point on a segment from one past its end', () => {
    expect(isOnSegment(at(0, 0), at(6, 3), at(4, 2))).toBe(true);
    expect(isOnSegment(at(0, 0), at(6, 3), at(8, 4))).toBe(false);
    expect(isOnSegment(at(0, 0), at(6, 3), at(4, 3))).toBe(false);
  });
  it('finds where lines meet, and none where they are parallel', () => {
    expect(meetLines(at(0, 0), { x: 1, y: 0 }, at(7, 5), { x: 0, y: 1 })).toEqual({ x: 7, y: 0 });
    expect(meetLines(at(0, 0), { x: 1, y: 2 }, at(7, 5), { x: 2, y: 4 })).toBeNull();
  });
});
