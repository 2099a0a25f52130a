import { roundTicks, ticks, type Ticks } from '../length/ticks';
import type { Ground, ProfilePoint } from './types';

/** Height of the foundation on a profile at a distance along its run: straight between points, flat beyond its ends. */
export function heightOnProfile(profile: readonly ProfilePoint[], at: number): Ticks {
  const first = profile[0];
  const last = profile[profile.length - 1];
  if (!first || !last) return ticks(0);
  if (at <= first.at) return first.height;
  if (at >= last.at) return last.height;
  let low = 0;
  let high = profile.length - 1;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if ((profile[middle] as ProfilePoint).at <= at) low = middle;
    else high = middle;
  }
  const before = profile[low] as ProfilePoint;
  const after = profile[high] as ProfilePoint;
  if (after.at === before.at) return before.height;
  return roundTicks(before.height + ((after.height - before.height) * (at - before.at)) / (after.at - before.at));
}

/** Height of the foundation under a run's outside face, above the high point; zero for a run that is not there. */
export function heightAt(ground: Pick<Ground, 'profileByRun'>, runId: string, at: number): Ticks {
  return heightOnProfile(ground.profileByRun.get(runId) ?? [], at);
}
