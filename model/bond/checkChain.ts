/** What breaks the rules in a chain as laid: at most one reason per run and code. */
import { roundTicks, type Ticks } from '../length/ticks';
import type { Reason } from '../reasons';
import type { Chain } from './chains';
import { endJoints, spanLength, type BondLimits, type CourseFill, type Span } from './courseFill';
import type { Parity } from './ends';
import { courseOf, parityOf, type LaidZone } from './layZones';
import { LAP_ROUNDING, visitLaps } from './laps';
import type { NoCut } from './noCut';

interface Found {
  lap: number;
  /** How much the shortest piece is under the least. */
  short: number;
  fails: boolean;
}

function runAt(chain: Chain, at: number): number {
  let r = 0;
  while (r < chain.runs.length - 1 && at >= chain.runs[r + 1]!.offset) r += 1;
  return r;
}

/** Whether a filled span has pieces all along it and its joints are inside their limits. */
function holds(span: Span, fill: CourseFill, limits: BondLimits): boolean {
  const length = spanLength(span);
  if (length <= 0) return true;
  if (fill.pieces.length === 0) return false;
  const count = fill.pieces.length / 2 - 1 + endJoints(span);
  let mortar = length;
  for (let i = 0; i < fill.pieces.length; i += 2) mortar -= fill.pieces[i + 1]! - fill.pieces[i]!;
  return mortar >= count * limits.joint.least && mortar <= count * limits.joint.most;
}

function checkZone(chain: Chain, zone: LaidZone, found: Found[], limits: BondLimits): void {
  const { firstCourse, lastCourse } = zone.zone;
  for (let course = firstCourse; course <= Math.min(firstCourse + 1, lastCourse); course += 1) {
    const parity = parityOf(course);
    for (const { stretch, pair } of zone.stretches) {
      const span: Span = { from: stretch.start[parity], to: stretch.end[parity] };
      const fill = pair[parity];
      if (!holds(span, fill, limits)) found[runAt(chain, (span.from.at + span.to.at) / 2)]!.fails = true;
      for (let i = 0; fill.shortPieces > 0 && i < fill.pieces.length; i += 2) {
        const run = found[runAt(chain, fill.pieces[i]!)]!;
        run.short = Math.max(run.short, limits.leastPiece - fill.pieces[i + 1]! + fill.pieces[i]!);
      }
    }
  }
}

/** Checks every pair of neighbouring courses that differs, once. */
export function checkChain(
  chain: Chain,
  laid: readonly LaidZone[],
  limits: BondLimits,
  noCutOf: (length: number) => NoCut,
): { laps: Ticks[]; reasons: Reason[] } {
  const found = chain.runs.map((): Found => ({ lap: Infinity, short: 0, fails: laid.length === 0 }));
  const compare = (upper: readonly number[], lower: readonly number[]) =>
    visitLaps(upper, lower, (at, lap) => {
      const run = found[runAt(chain, at)]!;
      run.lap = Math.min(run.lap, lap);
    });
  laid.forEach((zone, z) => {
    checkZone(chain, zone, found, limits);
    const joints = (parity: Parity) => courseOf(zone, parity).joints;
    const { firstCourse, lastCourse, startsLift } = zone.zone;
    if (lastCourse > firstCourse) compare(joints(1), joints(0));
    if (!startsLift) compare(joints(parityOf(firstCourse)), courseOf(laid[z - 1]!, parityOf(firstCourse - 1)).joints);
  });
  const reasons: Reason[] = [];
  chain.runs.forEach(({ run }, i) => {
    const { lap, short, fails } = found[i]!;
    const thing = { kind: 'run', id: run.runId } as const;
    const nearest = noCutOf(run.length);
    if (run.length <= 0) return;
    if (fails) reasons.push({ code: 'runDoesNotBond', weight: 'blocked', thing, nearest });
    if (lap <= 0) reasons.push({ code: 'straightJoint', weight: 'warning', thing, nearest });
    else if (lap < limits.leastLap - LAP_ROUNDING)
      reasons.push({
        code: 'lapUnderLeast',
        weight: 'warning',
        thing,
        amount: roundTicks(limits.leastLap - lap),
        nearest,
      });
    if (short > 0)
      reasons.push({ code: 'pieceUnderLeast', weight: 'warning', thing, amount: roundTicks(short), nearest });
  });
  const laps = found.map(({ lap }) => roundTicks(lap === Infinity ? limits.unit : Math.max(0, lap)));
  return { laps, reasons };
}
