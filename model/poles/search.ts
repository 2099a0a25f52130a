/**
 * Braces for all poles at once, at the least total cost.
 *
 * Every pole first takes its own cheapest pair. Where braces of different poles come too near one another, those poles
 * become one group and those braces are relevant; the group is solved again, exactly, with only the conflicts between its
 * relevant braces in force; and so on, joining groups two at a time and making braces relevant, until no conflict is left.
 *
 * That the result is the least for the whole site: let G1 … Gk be the final groups. In any placing of all poles without
 * conflicts, the poles of Gi have no conflict among their relevant braces, so they cost at least the optimum that was found
 * for Gi, which had only those conflicts to keep; and the whole costs at least the sum of the optima. The placing found has
 * no conflict at all and costs exactly that sum. It ends because every round joins groups or makes a brace relevant.
 * Most buildings need no joining, so the work grows with the number of poles.
 */
import { boxOfSegment, inflate } from '../geometry/box';
import { gridOf } from '../geometry/grid';
import { bracesConflict, type BraceLine } from './clearance';
import { placeInTurn } from './inTurn';
import { solveGroup, UNBRACED, type Member, type Part, type SearchBound, type Solved } from './group';
import type { Pair, PoleBraces } from './poleBraces';

export interface Placed {
  readonly pairs: readonly (Pair | null)[];
  readonly groups: readonly (readonly number[])[];
  /** Groups that reached the bound: their placing is free of conflicts but may not be the least. */
  readonly bounded: readonly (readonly number[])[];
  /** How far at most the placing is above the least; 0 where every group was solved to the end. */
  readonly gap: number;
}

interface Chosen {
  readonly pole: number;
  readonly which: 0 | 1;
  readonly line: BraceLine;
}

/** Every two chosen braces of different poles that conflict. */
function conflicts(
  poles: readonly PoleBraces[],
  pairs: readonly (Pair | null)[],
  clearance: number,
): [Chosen, Chosen][] {
  const chosen: Chosen[] = poles.flatMap((pole, i) => {
    const pair = pairs[i];
    if (!pair) return [];
    return ([0, 1] as const).map((which) => ({
      pole: i,
      which,
      line: { from: pole.at, foot: pair.braces[which].foot },
    }));
  });
  const boxes = chosen.map(({ line }) => inflate(boxOfSegment(line.from, line.foot), clearance));
  const grid = gridOf(boxes);
  const found: [Chosen, Chosen][] = [];
  chosen.forEach((a, n) => {
    const box = boxes[n];
    for (const m of box ? grid.find(box) : []) {
      const b = chosen[m];
      if (m > n && b && a.pole !== b.pole && bracesConflict(a.line, b.line, clearance)) found.push([a, b]);
    }
  });
  return found;
}

interface Group {
  readonly poles: readonly number[];
  /** What it cost when last solved, poles without braces included. */
  readonly cost: number;
  /** What it costs at least, as far as it was solved; that holds when more is asked of it. */
  readonly lower: number;
  readonly exact: boolean;
}

/** Poles joined into groups: each group known by one of its poles. */
class Groups {
  private readonly of: number[];
  private readonly parts = new Map<number, Group[]>();
  private readonly whole = new Map<number, Group>();

  constructor(own: readonly (Pair | null)[]) {
    this.of = own.map((_, i) => i);
    own.forEach((pair, i) =>
      this.whole.set(i, { poles: [i], cost: pair?.cost ?? 0, lower: pair?.cost ?? 0, exact: true }),
    );
  }

  /** Joins the groups of two poles, or marks the one that holds both to be solved again. */
  join(a: number, b: number): void {
    const keep = this.of[a] ?? a;
    const gone = this.of[b] ?? b;
    const parts = this.open(keep);
    if (keep === gone) return;
    for (const part of this.open(gone)) {
      parts.push(part);
      for (const pole of part.poles) this.of[pole] = keep;
    }
    this.parts.delete(gone);
  }

  /** False for two groups of which one is to be solved again as it is: joined later, it brings a better bound along. */
  mayJoin(a: number, b: number): boolean {
    const [one, other] = [this.of[a] ?? a, this.of[b] ?? b];
    return one === other || (!this.parts.has(one) && !this.parts.has(other));
  }

  private open(group: number): Group[] {
    const parts = this.parts.get(group) ?? [];
    const whole = this.whole.get(group);
    if (whole) parts.push(whole);
    this.whole.delete(group);
    this.parts.set(group, parts);
    return parts;
  }

  /** Groups to be solved again, as the parts that they were joined from. */
  opened(): readonly (readonly [number, readonly Group[]])[] {
    return [...this.parts];
  }

  close(group: number, poles: readonly number[], solved: Pick<Solved, 'cost' | 'lower' | 'exact'>): void {
    this.parts.delete(group);
    this.whole.set(group, { poles, cost: solved.cost, lower: solved.lower, exact: solved.exact });
  }

  all(): readonly Group[] {
    return [...this.whole.values()];
  }
}

/** Places the poles of the groups still open one after another, clear of all others: the search ends here. */
function finish(poles: readonly PoleBraces[], pairs: (Pair | null)[], groups: Groups, clearance: number): void {
  for (const [group, joined] of groups.opened()) {
    const indices = joined.flatMap((part) => part.poles);
    for (const i of indices) pairs[i] = null;
    const fixed = poles.flatMap((pole, i) =>
      (pairs[i]?.braces ?? []).map((brace): BraceLine => ({ from: pole.at, foot: brace.foot })),
    );
    const open = indices.flatMap((i) => poles[i] ?? []);
    const found = placeInTurn(open, fixed, clearance);
    indices.forEach((i, n) => (pairs[i] = found[n] ?? null));
    const cost = open.reduce((sum, pole, n) => sum + (found[n]?.cost ?? (pole.own() ? UNBRACED : 0)), 0);
    groups.close(group, indices, { cost, lower: joined.reduce((sum, part) => sum + part.lower, 0), exact: false });
  }
}

/** Places the braces of every pole; `poles` in an order that does not depend on the drawing's. */
export function placeBraces(poles: readonly PoleBraces[], clearance: number, bound: SearchBound): Placed {
  const own = poles.map((pole) => pole.own());
  const pairs: (Pair | null)[] = [...own];
  const relevant = poles.map((): [number | null, number | null] => [null, null]);
  const groups = new Groups(own);
  const member = (index: number): Member[] => {
    const [pole, pair, which] = [poles[index], own[index], relevant[index]];
    return pole && pair && which ? [{ index, pole, own: pair, relevant: which }] : [];
  };
  let spent = 0;
  for (let round = 0; ; round += 1) {
    const met = conflicts(poles, pairs, clearance);
    if (spent > bound.inAll) {
      for (const [a, b] of met) groups.join(a.pole, b.pole);
      finish(poles, pairs, groups, clearance);
      break;
    }
    for (const [a, b] of met) {
      if (!groups.mayJoin(a.pole, b.pole)) continue;
      for (const { pole, which } of [a, b]) {
        const marks = relevant[pole];
        if (marks && marks[which] === null) marks[which] = round;
      }
      groups.join(a.pole, b.pole);
    }
    const opened = groups.opened();
    if (opened.length === 0) break;
    for (const [group, joined] of opened) {
      const parts = joined.map(({ poles: indices, lower }): Part => ({ members: indices.flatMap(member), lower }));
      const indices = joined.flatMap((part) => part.poles);
      const solved = solveGroup(parts, clearance, bound);
      spent += solved.spent;
      for (const i of indices) pairs[i] = solved.pairs.get(i) ?? null;
      groups.close(group, indices, solved);
    }
  }
  const all = groups.all();
  return {
    pairs,
    groups: all.map((group) => group.poles),
    bounded: all.filter((group) => !group.exact).map((group) => group.poles),
    gap: all.reduce((sum, group) => sum + group.cost - group.lower, 0),
  };
}
