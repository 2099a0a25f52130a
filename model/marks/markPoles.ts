/** The marks of every pole and lift: each measured from its exact height and rounded once. */
import type { Coursing, Lift } from '../coursing/types';
import type { Drawing } from '../drawing/schema';
import { roundToStep, ticks, type Ticks } from '../length/ticks';
import type { PoleSet, StoryPole } from '../poles/types';
import type { Reason } from '../reasons';
import { heightAt } from '../survey/heightAt';
import type { Ground } from '../survey/types';
import type { ThingRef } from '../things';
import { markHeights, type MarkHeight } from './heights';
import type { Marks, PoleMark, PoleMarks } from './types';

/**
 * Marks every pole for every lift. All poles carry the same marks, because courses are level all the way round; what
 * differs is how far they are above the foundation and the foot. In lift 1 the foot is lapped down over the foundation
 * at the pole, in the others over the top of the beam below, so a pole reaches its length less the lap above it. A
 * mark names the openings of the runs at its pole, or the first of them elsewhere. Only where openings want very many
 * heights off the course lines does a pole leave out those of other runs. Marks above a pole's
 * head stay in its list and give the reason `poleTooShort`.
 */
export function markPoles(drawing: Drawing, ground: Ground, coursing: Coursing, poles: PoleSet): Marks {
  const reasons: Reason[] = [];
  const runOfOpening = new Map(drawing.openings.map((opening) => [opening.id, opening.runId]));
  const lifts = coursing.lifts.map((lift) => {
    const heights = markHeights(drawing, coursing, lift);
    return { lift, heights, byRun: openingsByRun(heights, runOfOpening), crowded: isCrowded(heights) };
  });
  const marked: PoleMarks[] = [];
  for (const pole of poles.poles) {
    const foundation = foundationAt(ground, pole);
    for (const { lift, heights, byRun, crowded } of lifts) {
      const one = markPole({ drawing, ground, pole, lift, foundation, heights, byRun, crowded });
      marked.push(one);
      const highest = one.marks[0];
      if (highest && highest.height > one.head) {
        reasons.push({
          code: 'poleTooShort',
          weight: 'warning',
          thing: { kind: 'pole', id: pole.id },
          against: [{ kind: 'lift', id: String(lift.number) }],
          amount: ticks(highest.height - one.head),
        });
      }
    }
  }
  return { poles: marked, reasons };
}

/**
 * More heights off the course lines than this, wanted by openings alone, and a pole carries only those of its own runs: the
 * rest would hide the course marks, and grow with the square of the building.
 */
const MOST_OPENING_MARKS = 24;

function isCrowded(heights: readonly MarkHeight[]): boolean {
  return heights.filter(openingOnly).length > MOST_OPENING_MARKS;
}

function openingOnly(mark: MarkHeight): boolean {
  return mark.course === null && mark.things.length === 0;
}

type OpeningsByRun = ReadonlyMap<string, ReadonlyMap<MarkHeight, readonly ThingRef[]>>;

function openingsByRun(heights: readonly MarkHeight[], runOfOpening: ReadonlyMap<string, string>): OpeningsByRun {
  const byRun = new Map<string, Map<MarkHeight, ThingRef[]>>();
  for (const height of heights) {
    for (const thing of height.openings) {
      const runId = runOfOpening.get(thing.id);
      if (runId === undefined) continue;
      const ofRun = byRun.get(runId) ?? new Map<MarkHeight, ThingRef[]>();
      byRun.set(runId, ofRun);
      const list = ofRun.get(height);
      if (list) list.push(thing);
      else ofRun.set(height, [thing]);
    }
  }
  return byRun;
}

interface PoleInLift {
  readonly drawing: Drawing;
  readonly ground: Ground;
  readonly pole: StoryPole;
  readonly lift: Lift;
  readonly foundation: Ticks;
  readonly heights: readonly MarkHeight[];
  readonly byRun: OpeningsByRun;
  readonly crowded: boolean;
}

function markPole({ drawing, ground, pole, lift, foundation, heights, byRun, crowded }: PoleInLift): PoleMarks {
  const { footLap, poleLength } = drawing.poleKit;
  const stands = lift.number === 1 ? foundation : lift.base;
  const foot = ticks(stands - footLap);
  const here = pole.runIds.map((runId) => byRun.get(runId));
  const carried = crowded
    ? heights.filter((one) => !openingOnly(one) || here.some((ofRun) => ofRun?.has(one)))
    : heights;
  const marks = carried.map((one): PoleMark => {
    const fromLine = ticks(one.height - ground.levelLine);
    const fromFoot = ticks(one.height - foot);
    const aboveFoundation = ticks(one.height - foundation);
    const openings = here.flatMap((ofRun) => ofRun?.get(one) ?? []);
    return {
      height: one.height,
      course: one.course,
      kinds: one.kinds,
      things: [...one.things, ...(openings.length > 0 ? openings : one.openings.slice(0, 1))],
      fromLine,
      fromFoot,
      aboveFoundation,
      printed: {
        fromLine: roundToStep(fromLine, drawing.tapeStep),
        fromFoot: roundToStep(fromFoot, drawing.tapeStep),
        aboveFoundation: roundToStep(aboveFoundation, drawing.tapeStep),
      },
    };
  });
  return {
    poleId: pole.id,
    letter: pole.letter,
    lift: lift.number,
    foundation,
    foot,
    head: ticks(foot + poleLength),
    levelLine: ground.levelLine,
    marks,
  };
}

/** The foundation at a pole: at its corner, or along its run by its id, `<runId>@<ticks>`. */
function foundationAt(ground: Ground, pole: StoryPole): Ticks {
  if (pole.cornerId !== null) return ground.heightByCorner.get(pole.cornerId) ?? ticks(0);
  const cut = pole.id.lastIndexOf('@');
  const at = Number(pole.id.slice(cut + 1));
  return heightAt(ground, pole.id.slice(0, cut), Number.isFinite(at) ? at : 0);
}
