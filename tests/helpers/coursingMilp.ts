/**
 * The coursing problem as a mixed-integer linear program, written from the objective and not from our search, and solved
 * part by part in strict order: each part's least is held as a limit while the next one is minimised.
 *
 * Heights y, counts n, thinner courses t and how much lower their units are g: for unit u and joint limits l…m,
 *   n (u + l) ≤ rise + g ≤ n (u + m),  (u − most) t ≤ g ≤ (u − least) t,  t ≤ n,  a course at least in every lift.
 * The joint (rise + g) / n − u is no linear term, so for the last two parts n is one of its values: z = 1 for the one it has.
 */
import type { Highs } from 'highs';
import type { Problem, Stop } from '../../model/coursing/problem';
import { LpText } from './lpText';

/** Hard heights missed, ticks they are missed by, soft misses, thinner courses, largest step, spread. */
export type CostParts = readonly [number, number, number, number, number, number];

interface Bounds {
  readonly lo: number;
  readonly hi: number;
}

/** How far each stop may lie from its height: three courses, and six more for each beam below; the search allows less. */
function widest(problem: Problem, index: number): number {
  const beams = problem.stops.slice(0, index).filter((stop) => stop.beamDepth > 0).length;
  return 3 * (problem.unit + problem.joint.most) * (1 + 2 * beams);
}

function riseBounds(problem: Problem, off: readonly number[], i: number): Bounds {
  const stop = problem.stops[i] as Stop;
  const below = problem.stops[i - 1];
  const from = below ? below.height + below.beamDepth : problem.start;
  const slack = (off[i] as number) + (below ? (off[i - 1] as number) : 0);
  return { lo: Math.max(0, stop.height - from - slack), hi: stop.height - from + slack };
}

/** The rows that every part has. */
function rowsOf(problem: Problem, off: readonly number[]): LpText {
  const lp = new LpText();
  const { unit, joint, thin } = problem;
  let lift: string[] | null = null;
  problem.stops.forEach((stop, i) => {
    const below = problem.stops[i - 1];
    const base = below ? below.beamDepth : problem.start;
    const rise: [number, string][] = [[1, `y${i}`], ...(below ? [[-1, `y${i - 1}`] as [number, string]] : [])];
    const cut: [number, string][] = thin ? [[1, `g${i}`]] : [];
    lp.row([...rise, ...cut, [-(unit + joint.least), `n${i}`]], '>=', base);
    lp.row([...rise, ...cut, [-(unit + joint.most), `n${i}`]], '<=', base);
    if (thin) {
      lp.row(
        [
          [1, `g${i}`],
          [thin.most - unit, `t${i}`],
        ],
        '>=',
        0,
      );
      lp.row(
        [
          [1, `g${i}`],
          [thin.least - unit, `t${i}`],
        ],
        '<=',
        0,
      );
      lp.row(
        [
          [1, `t${i}`],
          [-1, `n${i}`],
        ],
        '<=',
        0,
      );
      lp.binary(`t${i}`);
    }
    lp.row(
      [
        [1, `y${i}`],
        [-1, `d${i}`],
      ],
      '<=',
      stop.height,
    );
    lp.row(
      [
        [1, `y${i}`],
        [1, `d${i}`],
      ],
      '>=',
      stop.height,
    );
    lp.row([[1, `d${i}`]], '<=', off[i] as number);
    if (stop.hold === 'hard') {
      lp.row(
        [
          [1, `d${i}`],
          [-(off[i] as number), `b${i}`],
        ],
        '<=',
        0,
      );
      lp.binary(`b${i}`);
    } else
      lp.row(
        [
          [1, `e${i}`],
          [-1, `d${i}`],
        ],
        '>=',
        -stop.tolerance,
      );
    lp.whole(`n${i}`);
    lift?.push(`n${i}`);
    if (stop.beamDepth > 0) {
      if (lift)
        lp.row(
          lift.map((name) => [1, name]),
          '>=',
          1,
        );
      lift = [];
    }
  });
  return lp;
}

/** The rows that tie each interval's joint to its count: `s` is the step, `p` and `q` the thickest and thinnest joint. */
function tieJoints(lp: LpText, problem: Problem, off: readonly number[]): void {
  const { unit, joint, thin } = problem;
  problem.stops.forEach((_, i) => {
    const below = problem.stops[i - 1];
    const base = below ? below.beamDepth : problem.start;
    const { lo, hi } = riseBounds(problem, off, i);
    const taller = hi + (thin ? unit - thin.least : 0);
    const rise: [number, string][] = [[1, `y${i}`]];
    if (below) rise.push([-1, `y${i - 1}`]);
    if (thin) rise.push([1, `g${i}`]);
    const from = Math.max(0, Math.ceil(lo / (unit + joint.most) - 1e-9));
    const to = Math.floor(taller / (unit + joint.least) + 1e-9);
    const counts = Array.from({ length: Math.max(0, to - from + 1) }, (__, k) => from + k);
    lp.row(
      counts.map((k) => [1, `z${i}_${k}`]),
      '=',
      1,
    );
    lp.row([[1, `n${i}`], ...counts.map((k): [number, string] => [-k, `z${i}_${k}`])], '=', 0);
    lp.whole(`y${i}`);
    for (const k of counts) {
      const z = `z${i}_${k}`;
      lp.binary(z);
      if (k === 0) continue;
      const even = k * (unit + joint.nominal);
      const over = Math.max(0, taller - even);
      const under = Math.max(0, even - lo);
      lp.row([...rise, [-k, 's'], [over, z]], '<=', base + even + over);
      lp.row([...rise, [k, 's'], [-under, z]], '>=', base + even - under);
      const most = Math.max(0, taller - k * unit);
      const least = Math.max(0, k * (unit + joint.most) - lo);
      lp.row([...rise, [-k, 'p'], [most, z]], '<=', base + k * unit + most);
      lp.row([...rise, [-k, 'q'], [-least, z]], '>=', base + k * unit - least);
    }
  });
  lp.row([[1, 'q']], '<=', joint.most);
  lp.row(
    [
      [1, 'p'],
      [-1, 'q'],
    ],
    '>=',
    0,
  );
}

const WITHOUT_GAP = { mip_rel_gap: 0, mip_abs_gap: 1e-9 };

/**
 * Tried in turn. HiGHS 1.15 now and then calls a small program of this kind infeasible, or stops short of its least: never
 * the same one under all of these settings.
 */
const SETTINGS = [
  { ...WITHOUT_GAP, presolve: 'on', mip_feasibility_tolerance: 1e-8, primal_feasibility_tolerance: 1e-8 },
  { ...WITHOUT_GAP, presolve: 'off', mip_feasibility_tolerance: 1e-7, primal_feasibility_tolerance: 1e-7 },
  { ...WITHOUT_GAP, presolve: 'off', mip_feasibility_tolerance: 1e-9, primal_feasibility_tolerance: 1e-9 },
] as const;

/** Room above a whole least that is held as a limit, for the solver's own tolerance. */
const SLACK = 1e-5;

/** How far two answers to one part may lie apart: less than any two different joints of a few dozen courses. */
export const SAME = 1e-4;

/**
 * The least cost, part by part. `reached` is the cost of a plan that is known to be one (checked without HiGHS): where HiGHS
 * claims that so little can't be had, its next settings are tried.
 */
export function leastByMilp(highs: Pick<Highs, 'solve'>, problem: Problem, reached?: CostParts): CostParts {
  const { stops } = problem;
  const off = stops.map((_, i) => widest(problem, i));
  const held: [[number, string][], number][] = [];
  const parts: number[] = [];

  /** The next part: its least, then held. Whole where its terms are: whole heights lose nothing (see `search.ts`). */
  function next(terms: [number, string][], slack: number, tied: boolean): number {
    const least = terms.length > 0 ? minimum(terms, tied) : 0;
    const settled = tied ? least : Math.round(least);
    if (terms.length > 0) held.push([terms, settled + slack]);
    parts.push(settled);
    return settled;
  }

  function minimum(terms: [number, string][], tied: boolean): number {
    const lp = rowsOf(problem, off);
    if (tied) tieJoints(lp, problem, off);
    held.forEach(([limited, most]) => lp.row(limited, '<=', most));
    const text = lp.minimise(terms);
    const most = reached?.[parts.length] ?? Infinity;
    const answers: string[] = [];
    for (const setting of SETTINGS) {
      const { Status, ObjectiveValue } = highs.solve(text, setting);
      const isWhole = tied || Math.abs(ObjectiveValue - Math.round(ObjectiveValue)) < 1e-2;
      if (Status === 'Optimal' && isWhole && ObjectiveValue < most + SAME) return ObjectiveValue;
      answers.push(`${Status} ${ObjectiveValue}`);
    }
    throw new Error(`HiGHS found no least of part ${parts.length}: ${answers.join(', ')}`);
  }

  const of = (kind: Stop['hold'], term: (i: number, stop: Stop) => [number, string][]): [number, string][] =>
    stops.flatMap((stop, i) => (stop.hold === kind ? term(i, stop) : []));
  /** No stop is further off than the least of its part allows: limits that the held rows imply. */
  const draw = (kind: Stop['hold'], most: (stop: Stop) => number): void => {
    stops.forEach((stop, i) => {
      if (stop.hold === kind) off[i] = Math.min(off[i] as number, most(stop));
    });
  };

  next(
    of('hard', (i) => [[1, `b${i}`]]),
    0,
    false,
  );
  const hardTicks = next(
    of('hard', (i) => [[1, `d${i}`]]),
    SLACK,
    false,
  );
  draw('hard', () => hardTicks);
  const soft = next(
    of('soft', (i, { weight }) => [
      [weight, `d${i}`],
      [9 * weight, `e${i}`],
    ]),
    SLACK,
    false,
  );
  draw('soft', ({ weight }) => Math.ceil(soft / weight));
  next(problem.thin ? stops.map((_, i) => [1, `t${i}`]) : [], 0, false);
  next([[1, 's']], 1e-7, true);
  next(
    [
      [1, 'p'],
      [-1, 'q'],
    ],
    0,
    true,
  );
  return parts as unknown as CostParts;
}
