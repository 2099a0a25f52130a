/** Braces as a choice of one pair for each pole, for a general mixed-integer solver to judge by. */
import type { Highs } from 'highs';
import type { Drawing } from '../../model/drawing/schema';
import { USUAL_BOUND } from '../../model/poles/group';
import { reachLimits, type Candidate, type CandidateOptions } from '../../model/poles/candidates';
import { bracesConflict } from '../../model/poles/clearance';
import { groundOf, obstacleOf, obstaclesOf } from '../../model/poles/obstacles';
import { placePoles } from '../../model/poles/placePoles';
import { PoleBraces } from '../../model/poles/poleBraces';
import { placeBraces } from '../../model/poles/search';
import { seatsAtCorners } from '../../model/poles/seats';
import { layOutWalls } from '../../model/walls/layOutWalls';

/** Bearings 15° apart and two reaches. */
export const MILP_CANDIDATES: CandidateOptions = { turnMost: 60, turnStep: 15, reaches: [66, 50] };

/** The poles of a drawing, to be braced among the few candidates; made anew each time, so that nothing is known yet. */
export function polesOf(drawing: Drawing): () => PoleBraces[] {
  const walls = layOutWalls(drawing);
  const placed = placePoles(drawing, walls);
  const poles = placed.poles.map((pole) => obstacleOf('pole', { kind: 'pole', id: pole.id }, pole.section));
  const ground = groundOf([...obstaclesOf(drawing, walls), ...poles], drawing.boundary);
  const kit = drawing.poleKit;
  const reach = reachLimits(kit);
  if (!reach) throw new Error('the kit has no leg that holds');
  const limits = { least: 60, most: 120 };
  return () =>
    seatsAtCorners(walls).flatMap((seat) => {
      const at = placed.poleById.get(seat.id)?.at;
      if (!at) return [];
      return [new PoleBraces({ poleId: seat.id, seat, at, kit, reach, limits, options: MILP_CANDIDATES }, ground)];
    });
}

/** Our own answer: the least cost, or null where a pole is left without braces. */
export function leastByUs(poles: readonly PoleBraces[], clearance: number): number | null {
  const { pairs, bounded } = placeBraces(poles, clearance, USUAL_BOUND);
  if (bounded.length > 0) throw new Error('the search was bounded');
  return pairs.every((pair) => pair !== null) ? pairs.reduce((sum, pair) => sum + (pair?.cost ?? 0), 0) : null;
}

interface Column {
  readonly name: string;
  readonly cost: number;
}

/**
 * One column a pair, one row a pole (one pair each), and for every two candidates of different poles that come too near one
 * another a row that takes the pairs of only one of them: as tight as pairwise rows can be.
 */
export function modelOf(poles: readonly PoleBraces[], clearance: number): string {
  const columns: Column[] = [];
  const rows: string[] = [];
  const uses = new Map<Candidate, { pole: number; names: string[] }>();
  poles.forEach((pole, p) => {
    const names: string[] = [];
    for (const a of pole.upTo(0, Infinity))
      for (const b of pole.upTo(1, Infinity)) {
        const [first, second] = [pole.headings(0)[a.heading], pole.headings(1)[b.heading]];
        const angle = first && second ? pole.angleCost(first, second) : Infinity;
        if (angle === Infinity) continue;
        const name = `x${columns.length}`;
        columns.push({ name, cost: a.cost + b.cost + angle });
        names.push(name);
        for (const candidate of [a, b]) {
          const use = uses.get(candidate) ?? { pole: p, names: [] };
          use.names.push(name);
          uses.set(candidate, use);
        }
      }
    if (names.length === 0) throw new Error(`pole ${pole.poleId} has no pair`);
    rows.push(` ${names.join(' + ')} = 1`);
  });
  const used = [...uses];
  used.forEach(([a, of], i) => {
    const from = poles[of.pole]!.at;
    for (const [b, other] of used.slice(i + 1))
      if (
        other.pole !== of.pole &&
        bracesConflict({ from, foot: a.foot }, { from: poles[other.pole]!.at, foot: b.foot }, clearance)
      )
        rows.push(` ${[...of.names, ...other.names].join(' + ')} <= 1`);
  });
  const cost = columns.map(({ name, cost: each }) => `${each} ${name}`).join('\n + ');
  return `Minimize\n obj: ${cost}\nSubject To\n${rows.join('\n')}\nBinary\n ${columns.map(({ name }) => name).join(' ')}\nEnd\n`;
}

/** The least cost by the solver; null where it finds that there is no placing. */
export function leastByHighs(highs: Highs, model: string): number | null {
  const solution = highs.solve(model, { mip_rel_gap: 0, mip_abs_gap: 0 });
  if (solution.Status === 'Infeasible') return null;
  if (solution.Status !== 'Optimal') throw new Error(`HiGHS ends with ${solution.Status}`);
  return Math.round(solution.ObjectiveValue);
}
