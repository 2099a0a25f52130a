import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { gaugeHeights } from '../../../model/coursing/gaugeHeights';
import { planCourses } from '../../../model/coursing/planCourses';
import type { Drawing } from '../../../model/drawing/schema';
import { EMPTY_SURVEY } from '../../../model/drawing/surveySchema';
import { inches, ticks } from '../../../model/length/ticks';
import { levelGround } from '../../../model/survey/levelGround';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import { rectangle } from '../../helpers/drawings';

const drawing: Drawing = {
  ...rectangle(240, 120),
  bondBeams: [
    {
      id: 'b1',
      name: '',
      soffit: inches(96),
      depth: inches(7),
      tolerance: ticks(0),
      hold: 'hard',
      bars: { count: 2, diameter: inches(0.5), lap: inches(20) },
    },
  ],
};
const plan = (change: Partial<Drawing> = {}) => {
  const changed = { ...drawing, ...change };
  const walls = layOutWalls(changed);
  return planCourses(changed, walls, levelGround(changed, walls, EMPTY_SURVEY));
};

describe('heights that suit the gauge', () => {
  // A gauge of 4 in from a first course at 4 in; above the beam at 103 in, from there.
  it.each([
    [36, 36, 36, true],
    [37, 36, 40, true],
    [10, 8, 12, false],
    [2, null, 4, false],
    [104, null, 107, false],
    [110, 107, 111, false],
    [111, 111, 111, true],
    [111.25, 111, 115, true],
  ])('near %d in are %s and %d', (height, below, above, canBeMet) => {
    expect(gaugeHeights(drawing, plan(), inches(height))).toEqual({
      below: below === null ? null : inches(below),
      above: inches(above),
      canBeMet,
    });
  });

  it('are met at no cost when drawn', () => {
    fc.assert(
      fc.property(fc.integer({ min: inches(4), max: inches(95) }), (height) => {
        const near = gaugeHeights(drawing, plan(), ticks(height));
        for (const met of [near.below, near.above]) {
          const shelf = { id: 'k', kind: 'named', name: '', tolerance: ticks(0), hold: 'hard', weight: 1 } as const;
          const { answer } = plan({ controlHeights: [{ ...shelf, height: met! }] });
          expect(answer.cost).toEqual([0, 0, 0, 0, 0, 0]);
        }
      }),
      { numRuns: 40, seed: 5 },
    );
  });
});
