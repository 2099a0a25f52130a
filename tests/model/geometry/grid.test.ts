import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { boxesMeet, type Box } from '../../../model/geometry/box';
import { gridOf } from '../../../model/geometry/grid';

const boxes = fc.array(
  fc
    .tuple(
      fc.integer({ min: -1000, max: 1000 }),
      fc.integer({ min: -1000, max: 1000 }),
      fc.integer({ min: 0, max: 300 }),
      fc.integer({ min: 0, max: 300 }),
    )
    .map(([x, y, w, h]): Box => ({ minX: x, minY: y, maxX: x + w, maxY: y + h })),
  { maxLength: 60 },
);

describe('the grid', () => {
  it('finds just the boxes that looking at every one would find', () => {
    fc.assert(
      fc.property(boxes, boxes, (held, asked) => {
        const grid = gridOf(held);
        for (const box of asked) {
          const expected = held.flatMap((one, i) => (boxesMeet(one, box) ? [i] : []));
          expect(grid.find(box)).toEqual(expected);
        }
      }),
    );
  });

  it('answers where there is nothing, and where everything is in one place', () => {
    const box: Box = { minX: 5, minY: 5, maxX: 5, maxY: 5 };
    expect(gridOf([]).find(box)).toEqual([]);
    expect(gridOf([box, box]).find(box)).toEqual([0, 1]);
  });

  it('looks at few boxes of a long thin row', () => {
    const row = Array.from({ length: 2000 }, (_, i): Box => ({ minX: 10 * i, minY: 0, maxX: 10 * i + 8, maxY: 1 }));
    const grid = gridOf(row);
    expect(grid.find({ minX: 101, minY: 0, maxX: 125, maxY: 1 })).toEqual([10, 11, 12]);
  });
});
