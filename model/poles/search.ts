/**
 * Braces for all poles at once, at the least total cost.
 *
 * Every pole first takes its own cheapest pair. Where braces of different poles come too near one another, those poles
 * become one group, which is solved again, exactly, by branch and bound over the pairs of its poles with only the group's
 * own conflicts in force; and again, merging groups, until no conflict is left.
 *
 * That the result is the least for the whole site: let G1 … Gk be the final groups. In any placing of all poles without
 * conflicts, the poles of Gi have no conflict among themselves, so they cost at least the optimum of Gi alone, and the
 * whole costs at least the sum of the optima. The placing found has no conflict and costs exactly that sum. Most
 * buildings need no merging at all, so the work grows with the number of poles.
 */
import { boxOfSegment, inflate, joinBoxes, type Box } from '../geometry/box';
import { gridOf } from '../geometry/grid';
import { bracesConflict, type BraceLine } from './clearance';
import { cheapestPair, pairsUpTo, type Pair, type PoleBraces } from './pairs';

export interface SearchBound {
  /** Most pairs of braces looked at for one group before it settles for a placing that may not be the least. */
  readonly most: number;
}

export const USUAL_BOUND: SearchBound = { most: 400_000 };

export interface Placed {
  readonly pairs: readonly (Pair | null)[];
  readonly groups: readonly (readonly number[])[];
  /** Groups that reached the bound: their placing is free of conflicts but may not be the least. */
  readonly bounded: readonly (readonly number[])[];
  /** Poles with a pair of their own, but none beside their neighbours', and those neighbours. */
  readonly crowded: readonly (readonly number[])[];
}

function linesOf(pole: PoleBraces, pair: Pair): readonly [BraceLine, BraceLine] {
  return [
    { from: pole.at, foot: pair.braces[0].foot },
    { from: pole.at, foot: pair.braces[1].foot },
  ];
}

function conflict(a: PoleBraces, pairA: Pair, b: PoleBraces, pairB: Pair, clearance: number): boolean {
  const linesB = linesOf(b, pairB);
  return linesOf(a, pairA).some((line) => linesB.some((other) => bracesConflict(line, other, clearance)));
}

interface Solved {
  readonly pairs: ReadonlyMap<number, Pair>;
  readonly whole: boolean;
  /** Poles left without a pair. */
  readonly left: readonly number[];
}

/** Slack over the sum of the poles' own optima within which a group is first searched; doubled until it holds an answer. */
const FIRST_SLACK = 16;

/**
 * The cheapest placing of one group. Within a slack over the sum of optima every pole has finitely many pairs, none dearer
 * than its own optimum + slack; depth first through them, cheapest first, leaving a branch when what is placed and the
 * optima of the rest reach the best found. An answer within the slack is the least; none doubles the slack.
 */
function solveGroup(
  members: readonly number[],
  poles: readonly PoleBraces[],
  own: readonly (Pair | null)[],
  clearance: number,
  bound: SearchBound,
): Solved {
  const ids = members.filter((i) => own[i]);
  const least = ids.map((i) => own[i]?.cost ?? 0);
  const rest = least.map((_, depth) => least.slice(depth).reduce((sum, cost) => sum + cost, 0));
  const floor = rest[0] ?? 0;
  let spent = 0;
  const spend = () => (spent += 1) <= bound.most;
  const dearest = ids.reduce((sum, i) => sum + dearestOf(poles[i]), 0);
  for (let slack = FIRST_SLACK; ; slack *= 2) {
    const options = ids.map((i, n) => {
      const pole = poles[i];
      return pole ? pairsUpTo(pole, (least[n] ?? 0) + slack, spend) : [];
    });
    let best: Pair[] | null = null;
    let bestCost = floor + slack + 1;
    const chosen: Pair[] = [];
    const descend = (depth: number, cost: number): void => {
      if (depth === ids.length) {
        best = [...chosen];
        bestCost = cost;
        return;
      }
      const pole = poles[ids[depth] ?? -1];
      if (!pole) return;
      for (const pair of options[depth] ?? []) {
        if (cost + pair.cost + (rest[depth + 1] ?? 0) >= bestCost) return;
        if (!spend()) return;
        const clear = chosen.every((other, n) => {
          const neighbour = poles[ids[n] ?? -1];
          return !neighbour || !conflict(pole, pair, neighbour, other, clearance);
        });
        if (!clear) continue;
        chosen.push(pair);
        descend(depth + 1, cost + pair.cost);
        chosen.pop();
      }
    };
    descend(0, 0);
    const within = spent <= bound.most;
    if (best && within)
      return { pairs: new Map(ids.map((i, n) => [i, (best as Pair[])[n] as Pair])), whole: true, left: [] };
    if (!within || slack > dearest) return settle(ids, poles, own, clearance, within);
  }
}

/** More than a pair's angle and the ways that it passes over can add. */
const DEAREST_EXTRA = 20_000;

/** More than any pair of the pole can cost over its optimum. */
function dearestOf(pole: PoleBraces | undefined): number {
  if (!pole) return 0;
  return pole.lists().reduce((sum, list) => sum + (list[list.length - 1]?.cost ?? 0), 0) + DEAREST_EXTRA;
}

/** One pole after another, each the cheapest pair beside those already placed: used where no exact answer was reached. */
function settle(
  ids: readonly number[],
  poles: readonly PoleBraces[],
  own: readonly (Pair | null)[],
  clearance: number,
  none: boolean,
): Solved {
  const pairs = new Map<number, Pair>();
  const left: number[] = [];
  for (const i of ids) {
    const pole = poles[i];
    const first = own[i];
    if (!pole || !first) continue;
    const clear = (pair: Pair) =>
      [...pairs].every(([j, other]) => {
        const neighbour = poles[j];
        return !neighbour || !conflict(pole, pair, neighbour, other, clearance);
      });
    let found = clear(first) ? first : null;
    for (let slack = 256; !found && slack <= 4096; slack *= 4) {
      let looked = 0;
      found = pairsUpTo(pole, first.cost + slack, () => (looked += 1) <= 200_000).find(clear) ?? null;
    }
    if (found) pairs.set(i, found);
    else left.push(i);
  }
  return { pairs, whole: none, left };
}

function reachBox(pole: PoleBraces, pair: Pair, clearance: number): Box {
  const [a, b] = linesOf(pole, pair);
  return inflate(joinBoxes(boxOfSegment(a.from, a.foot), boxOfSegment(b.from, b.foot)), clearance);
}

/** All pairs of poles whose chosen braces conflict. */
function conflicts(
  poles: readonly PoleBraces[],
  chosen: readonly (Pair | null)[],
  clearance: number,
): [number, number][] {
  const placed = poles.flatMap((pole, i) => {
    const pair = chosen[i];
    return pair ? [{ i, pole, pair, box: reachBox(pole, pair, clearance) }] : [];
  });
  const grid = gridOf(placed.map((each) => each.box));
  const found: [number, number][] = [];
  placed.forEach((a, n) => {
    for (const m of grid.find(a.box)) {
      const b = placed[m];
      if (m > n && b && conflict(a.pole, a.pair, b.pole, b.pair, clearance)) found.push([a.i, b.i]);
    }
  });
  return found;
}

/** Places the braces of every pole; `poles` in any order that does not depend on the drawing's. */
export function placeBraces(poles: readonly PoleBraces[], clearance: number, bound: SearchBound = USUAL_BOUND): Placed {
  const own = poles.map((pole) => cheapestPair(pole));
  const chosen: (Pair | null)[] = [...own];
  const groupOf = poles.map((_, i) => i);
  const members = new Map(poles.map((_, i) => [i, [i]]));
  const bounded = new Map<number, readonly number[]>();
  const crowded = new Map<number, readonly number[]>();
  for (;;) {
    const touched = new Set<number>();
    for (const [a, b] of conflicts(poles, chosen, clearance)) {
      const keep = groupOf[a] ?? a;
      const gone = groupOf[b] ?? b;
      touched.add(keep);
      if (keep === gone) continue;
      const moved = members.get(gone) ?? [];
      members.set(keep, [...(members.get(keep) ?? []), ...moved]);
      members.delete(gone);
      for (const i of moved) groupOf[i] = keep;
      touched.delete(gone);
      bounded.delete(gone);
      crowded.delete(gone);
    }
    if (touched.size === 0) break;
    for (const group of touched) {
      const list = [...(members.get(group) ?? [])].sort((a, b) => a - b);
      const solved = solveGroup(list, poles, own, clearance, bound);
      for (const i of list) chosen[i] = solved.pairs.get(i) ?? null;
      bounded.delete(group);
      crowded.delete(group);
      if (!solved.whole) bounded.set(group, list);
      if (solved.left.length > 0) crowded.set(group, solved.left);
    }
  }
  return {
    pairs: chosen,
    groups: [...members.values()],
    bounded: [...bounded.values()],
    crowded: [...crowded.values()],
  };
}
