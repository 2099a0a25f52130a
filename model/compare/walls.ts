/** What changed of the corners and wall runs. */
import type { Drawing, WallRun } from '../drawing/schema';
import { distance } from '../geometry/vec';
import { roundTicks, type Ticks } from '../length/ticks';
import type { Walls } from '../walls/types';
import { matchById } from './matching';
import { lettersOf } from './openings';
import type { Change } from './types';

/** A run turned by less than this, in degrees, has kept its bearing: over 40 ft it is a sixteenth of an inch. */
const TURN_LEAST = 0.01;

function turnBetween(a: { x: number; y: number }, b: { x: number; y: number }): number {
  return Math.abs((Math.atan2(a.x * b.y - a.y * b.x, a.x * b.x + a.y * b.y) * 180) / Math.PI);
}

export function compareCorners(before: Drawing, after: Drawing): Change[] {
  const matched = matchById(before.corners, after.corners);
  const whole = (code: 'cornerAdded' | 'cornerRemoved') => (corner: { id: string; letter: string }) => ({
    code,
    thing: { kind: 'corner', id: corner.id } as const,
    names: { letter: corner.letter },
    before: null,
    after: null,
  });
  return [
    ...matched.removed.map(whole('cornerRemoved')),
    ...matched.added.map(whole('cornerAdded')),
    ...matched.both.flatMap(([was, now]): Change[] => {
      const moved: Ticks = roundTicks(distance(was, now));
      if (moved === 0) return [];
      const thing = { kind: 'corner', id: now.id } as const;
      return [{ code: 'cornerMoved', thing, names: { letter: now.letter }, before: null, after: moved }];
    }),
  ];
}

export function compareRuns(before: Drawing, after: Drawing, wallsBefore: Walls, wallsAfter: Walls): Change[] {
  const old = lettersOf(before);
  const letters = lettersOf(after);
  const matched = matchById(before.runs, after.runs);
  const lengthOf = (walls: Walls, run: WallRun) => walls.runById.get(run.id)?.length ?? null;
  const changes: Change[] = matched.removed.map((run) => ({
    code: 'runRemoved',
    thing: { kind: 'run', id: run.id },
    names: { run: old.run.get(run.id)?.name ?? '' },
    before: lengthOf(wallsBefore, run),
    after: null,
  }));
  for (const run of matched.added)
    changes.push({
      code: 'runAdded',
      thing: { kind: 'run', id: run.id },
      names: { run: letters.run.get(run.id)?.name ?? '' },
      before: null,
      after: lengthOf(wallsAfter, run),
    });
  const types = new Map(after.wallTypes.map((type) => [type.id, type.name]));
  for (const [was, now] of matched.both) {
    const thing = { kind: 'run', id: now.id } as const;
    const names = { run: letters.run.get(now.id)?.name ?? '' };
    const a = wallsBefore.runById.get(was.id);
    const b = wallsAfter.runById.get(now.id);
    if (a && b && a.length !== b.length)
      changes.push({ code: 'runLength', thing, names, before: a.length, after: b.length });
    const turned = a && b ? turnBetween(a.direction, b.direction) : 0;
    if (turned >= TURN_LEAST)
      changes.push({
        code: 'runTurned',
        thing,
        names: { ...names, degrees: degreesText(turned) },
        before: null,
        after: null,
      });
    if (was.wallTypeId !== now.wallTypeId)
      changes.push({
        code: 'wallType',
        thing,
        names: { ...names, name: types.get(now.wallTypeId) ?? '', part: 'run' },
        before: null,
        after: null,
      });
  }
  return changes;
}

/** Whole degrees, or tenths below ten. */
export function degreesText(degrees: number): string {
  return degrees < 10 ? String(Math.round(degrees * 10) / 10) : String(Math.round(degrees));
}
