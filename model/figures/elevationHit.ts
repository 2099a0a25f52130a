/** What lies under a finger on an elevation: a pole, or the course at that height. */
import type { Vec } from '../geometry/point';
import type { SetOut } from '../setOut';
import { alongRun } from './onRun';

export type ElevationHit =
  { readonly kind: 'pole'; readonly poleId: string } | { readonly kind: 'course'; readonly number: number };

/**
 * The pole within reach of the place, or else the course at its height: each course with the joint under it. Null off
 * the wall's height, or where there is no such run. `reach` in ticks.
 */
export function hitElevation(setOut: SetOut, runId: string, at: Vec, reach: number): ElevationHit | null {
  const run = setOut.walls.runById.get(runId);
  if (!run) return null;
  let nearest: { id: string; distance: number } | null = null;
  for (const pole of setOut.poles.poles) {
    if (!pole.runIds.includes(runId) || pole.section.length === 0) continue;
    const along = pole.section.map((point) => alongRun(run, point));
    const distance = Math.max(Math.min(...along) - at.x, at.x - Math.max(...along), 0);
    if (distance <= reach && (!nearest || distance < nearest.distance)) nearest = { id: pole.id, distance };
  }
  if (nearest) return { kind: 'pole', poleId: nearest.id };
  const { courses } = setOut.coursing;
  let below = -Infinity;
  for (const course of courses) {
    if (at.y <= course.top && (at.y > below || course.number === 1) && at.y >= course.bottom - course.joint - reach)
      return { kind: 'course', number: course.number };
    below = course.top;
  }
  return null;
}
