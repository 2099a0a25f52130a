import { describe, expect, it } from 'vitest';
import { planCourses } from '../../../model/coursing/planCourses';
import type { Coursing } from '../../../model/coursing/types';
import type { ControlHeight, Drawing } from '../../../model/drawing/schema';
import { inches, ticks, type Ticks } from '../../../model/length/ticks';
import { writeLength } from '../../../model/length/write';
import { levelGround } from '../../../model/survey/levelGround';
import { EMPTY_SURVEY } from '../../../model/drawing/surveySchema';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import { wordCost, wordProof } from '../../../model/words/wordCoursing';
import { earthBlock, rectangle, withWindow } from '../../helpers/drawings';
import { strictSay } from './speaker';

const speak = strictSay();

const write = (length: Ticks): string => writeLength(length, { units: 'imperial', step: ticks(1016), style: 'inches' });

function plan(drawing: Drawing): Coursing {
  const walls = layOutWalls(drawing);
  return planCourses(drawing, walls, levelGround(drawing, walls, EMPTY_SURVEY));
}

function plate(height: number, change: Partial<ControlHeight> = {}): ControlHeight {
  const base = { id: 'p', kind: 'plate', name: '', tolerance: ticks(0), hold: 'hard', weight: 1 } as const;
  return { ...base, height: inches(height), ...change };
}

describe('what an answer costs, in words', () => {
  it('says that every height is met with the nominal joint', () => {
    const drawing = { ...rectangle(240, 120), controlHeights: [plate(96)] };
    expect(wordCost(plan(drawing).answer, drawing, speak, write)).toEqual([
      'Every height is met.',
      'Every bed joint is 1/2", the nominal one.',
    ]);
  });

  it('names every missed height, the hard one first, and the joints', () => {
    // Courses reach 8 1/8 in and 11 3/4 in, not the shelf at 10 between them; the sill at 38 is soft and gives way.
    const drawing = {
      ...withWindow(rectangle(240, 120), 'r1', { at: 60, width: 36, sill: 38, head: 80 }),
      controlHeights: [plate(96), plate(10, { id: 'k', kind: 'named', name: 'Shelf' })],
    };
    const words = wordCost(plan(drawing).answer, drawing, speak, write);
    expect(words[0]).toBe('The course line lies 1 3/4" above Shelf, which is held hard.');
    expect(words[1]).toMatch(
      /^The course line lies .* (above|below) the sill of the window in A–B, more than its tolerance\.$/,
    );
    expect(words[words.length - 1]).toMatch(/^Bed joints of 3\/8" to 5\/8", at most 1\/8" from the nominal one\.$/);
  });

  it('says that a miss is within its tolerance, and leaves out what the tape can’t show', () => {
    const tolerance = inches(0.25);
    const drawing = {
      ...rectangle(240, 120),
      controlHeights: [plate(96), plate(8.25, { id: 'k', kind: 'named', name: 'Shelf', hold: 'soft', tolerance })],
    };
    const { answer } = plan(drawing);
    expect(wordCost(answer, drawing, speak, write)[0]).toBe(
      'The course line lies 1/8" below Shelf, within its tolerance.',
    );
    const tiny = {
      ...answer,
      controls: answer.controls.map((one) => ({ ...one, miss: ticks(Math.sign(one.miss) * 500) })),
    };
    expect(wordCost(tiny, drawing, speak, write)[0]).toBe('Every height is met.');
  });

  it('names the thinner course and its height', () => {
    const drawing = {
      ...rectangle(240, 120, earthBlock({ thinCourse: { least: inches(1.5), most: inches(3) } })),
      controlHeights: [plate(95), plate(11, { id: 'k', kind: 'named', name: 'Shelf' })],
    };
    expect(wordCost(plan(drawing).answer, drawing, speak, write)).toEqual([
      'Every height is met.',
      'Course 3 is a thinner one: its units are 2 1/2" high.',
      'Every bed joint is 1/2", the nominal one.',
    ]);
  });

  it('tells even joints that are a hair off the nominal from nominal ones', () => {
    const even = { ...rectangle(240, 120), controlHeights: [plate(98)] };
    expect(wordCost(plan(even).answer, even, speak, write)[1]).toBe(
      'Every bed joint is 7/16", 1/16" from the nominal one.',
    );
  });

  it('words every proof that is short of the whole, and nothing where it is whole', () => {
    expect(wordProof('all', speak)).toBeNull();
    expect(wordProof(undefined, speak)).toBeNull();
    for (const proof of ['heights', 'held', 'none'] as const) expect(wordProof(proof, speak)).toMatch(/\.$/);
  });
});
