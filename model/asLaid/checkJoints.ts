import type { Course } from '../coursing/types';
import type { Drawing } from '../drawing/schema';
import { ticks } from '../length/ticks';
import { ruleValue } from '../rules/registry';
import { finding, placeKey } from './finding';
import type { LaidFinding, LaidJoint, ToleranceSet } from './types';

/** Joints in a row that the mean is taken of (LABC Technical Manual v8, ch. 1). */
const IN_A_ROW = 8;

/**
 * Bed joints. By `tms` each is held to its planned joint, and the first to the limits of the first bed joint; by `labc` each
 * is held to the mean of every eight in a row that it belongs to, read at one place, and the worst is told.
 */
export function checkJoints(
  drawing: Drawing,
  joints: readonly LaidJoint[],
  courseByNumber: ReadonlyMap<number, Course>,
  set: ToleranceSet,
): LaidFinding[] {
  if (set === 'labc') return fromMean(drawing, joints);
  const most = ticks(ruleValue(drawing, 'bedJointTolerance'));
  const firstLeast = ruleValue(drawing, 'firstBedJointLeast');
  const firstMost = ruleValue(drawing, 'firstBedJointMost');
  return joints.map((one) => {
    if (one.course > 1)
      return finding('joint', [one], one.thickness - (courseByNumber.get(one.course)?.joint ?? one.thickness), {
        rule: 'bedJointTolerance',
        most,
      });
    // Off by what passes the nearer limit; 0 between the two.
    const rule = one.thickness < firstLeast ? 'firstBedJointLeast' : 'firstBedJointMost';
    const off = Math.min(0, one.thickness - firstLeast) + Math.max(0, one.thickness - firstMost);
    return { ...finding('firstJoint', [one], off, { rule, most: ticks(0) }), allowed: ticks(ruleValue(drawing, rule)) };
  });
}

function fromMean(drawing: Drawing, joints: readonly LaidJoint[]): LaidFinding[] {
  const most = ticks(ruleValue(drawing, 'jointFromMeanMost'));
  const byPlace = new Map<string, LaidJoint[]>();
  for (const one of joints) {
    const group = byPlace.get(placeKey(one));
    if (group) group.push(one);
    else byPlace.set(placeKey(one), [one]);
  }
  return [...byPlace.values()].flatMap((group) => {
    const upwards = [...group].sort((a, b) => a.course - b.course);
    const worst = new Map<LaidJoint, number>();
    for (let i = 0; i + IN_A_ROW <= upwards.length; i++) {
      const row = upwards.slice(i, i + IN_A_ROW);
      if (row[IN_A_ROW - 1]!.course - row[0]!.course !== IN_A_ROW - 1) continue;
      const mean = row.reduce((sum, { thickness }) => sum + thickness, 0) / IN_A_ROW;
      for (const one of row) {
        const off = one.thickness - mean;
        if (Math.abs(off) >= Math.abs(worst.get(one) ?? 0)) worst.set(one, off);
      }
    }
    return [...worst].map(([one, off]) => finding('jointFromMean', [one], off, { rule: 'jointFromMeanMost', most }));
  });
}
