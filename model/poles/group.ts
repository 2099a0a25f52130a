/** The cheapest placing of a group of poles whose braces compete for the same ground. */
import { bracesConflict, type BraceLine } from './clearance';
import { bestWith, pairsUpTo, type Pair, type PoleBraces } from './pairs';

/** Which of a pole's two braces have met another pole's: only those need keep clear of one another, until more do. */
export type Relevant = readonly [boolean, boolean];

export interface Member {
  /** Place in the list of all poles. */
  readonly index: number;
  readonly pole: PoleBraces;
  /** Its own cheapest pair, alone. */
  readonly own: Pair;
  readonly relevant: Relevant;
}

/** Members that were solved together before, and what they cost at least. */
export interface Part {
  readonly members: readonly Member[];
  readonly lower: number;
}

export interface SearchBound {
  /** Most steps (options made and pairs of options compared) for one group before it settles for less than the best. */
  readonly most: number;
}

export const USUAL_BOUND: SearchBound = { most: 1_000_000 };

export interface Solved {
  readonly pairs: ReadonlyMap<number, Pair>;
  /** Total, with `UNBRACED` for each pole left without a pair. */
  readonly cost: number;
  /** False where the bound was reached. */
  readonly exact: boolean;
}

/** Dearer than any pair: a pole is left without braces only where the others leave it no way at all. */
export const UNBRACED = 1_000_000;
/** Slack over the lower bound within which a group is first searched; it grows until an answer lies within it. */
const FIRST_SLACK = 16;
const SLACK_GROWS = 4;

interface Option {
  readonly pair: Pair | null;
  readonly cost: number;
  readonly lines: readonly BraceLine[];
}

type Spend = () => boolean;

/**
 * The options of one pole that cost no more than `most`, cheapest first. With one brace relevant there is one option for
 * each place of that brace, with the best partner: another partner would cost more and change nothing that is looked at.
 */
function optionsOf({ pole, own, relevant }: Member, most: number, spend: Spend): Option[] {
  const option = (pair: Pair): Option => ({
    pair,
    cost: pair.cost,
    lines: pair.braces.flatMap((brace, which) => (relevant[which] ? [{ from: pole.at, foot: brace.foot }] : [])),
  });
  if (relevant[0] && relevant[1]) return pairsUpTo(pole, most, spend).map(option);
  if (!relevant[0] && !relevant[1]) return [option(own)];
  const which = relevant[0] ? 0 : 1;
  const found: Option[] = [];
  for (const candidate of pole.lists()[which]) {
    if (candidate.cost > most || !spend()) break;
    const pair = bestWith(pole, candidate, which, most);
    if (pair) found.push(option(pair));
  }
  return found.sort((a, b) => a.cost - b.cost);
}

function areClear(a: Option, b: Option, clearance: number): boolean {
  return !a.lines.some((line) => b.lines.some((other) => bracesConflict(line, other, clearance)));
}

interface Best {
  cost: number;
  chosen: readonly Option[] | null;
}

/**
 * Depth first through the options, part by part. A branch ends when what is placed, and the least that the rest can cost,
 * reach the best found: the rest of a part costs at least its members' own optima, and the part at least its lower bound.
 */
function descend(
  parts: readonly Part[],
  options: ReadonlyMap<Member, readonly Option[]>,
  best: Best,
  clearance: number,
  spend: Spend,
): void {
  const order = parts.flatMap((part, p) =>
    part.members.map((member, m) => ({ member, p, left: ownSum(part.members.slice(m + 1)) })),
  );
  const later = parts.map((_, p) => parts.slice(p + 1).reduce((sum, part) => sum + part.lower, 0));
  const chosen: Option[] = [];
  const step = (depth: number, closed: number, within: number): void => {
    const at = order[depth];
    if (!at) {
      best.cost = closed + within;
      best.chosen = [...chosen];
      return;
    }
    const starts = order[depth - 1]?.p !== at.p;
    const before = starts ? closed + within : closed;
    const so = starts ? 0 : within;
    const lower = parts[at.p]?.lower ?? 0;
    for (const option of options.get(at.member) ?? []) {
      const part = Math.max(so + option.cost + at.left, lower);
      if (before + part + (later[at.p] ?? 0) >= best.cost) {
        if (so + option.cost + at.left >= lower) return;
        continue;
      }
      if (!spend()) return;
      if (!chosen.every((other) => areClear(option, other, clearance))) continue;
      chosen.push(option);
      step(depth + 1, before, so + option.cost);
      chosen.pop();
    }
  };
  step(0, 0, 0);
}

function ownSum(members: readonly Member[]): number {
  return members.reduce((sum, member) => sum + member.own.cost, 0);
}

/**
 * The cheapest placing of a group. Within a slack over the lower bound each member has finitely many options, since the
 * others cost at least their own parts of that bound. An answer within the slack is the least there is; none widens the
 * slack, and at last a pole may go unbraced. Where the bound on steps is reached, the best found so far is kept, or one
 * pole after another takes what is free.
 */
export function solveGroup(parts: readonly Part[], clearance: number, bound: SearchBound): Solved {
  const floor = parts.reduce((sum, part) => sum + part.lower, 0);
  let spent = 0;
  const spend = () => (spent += 1) <= bound.most;
  for (let slack = FIRST_SLACK; ; slack *= SLACK_GROWS) {
    const last = slack >= UNBRACED || floor >= UNBRACED;
    const options = new Map<Member, readonly Option[]>();
    for (const part of parts)
      for (const member of part.members) {
        const most = slack + part.lower - (ownSum(part.members) - member.own.cost);
        const list = optionsOf(member, Math.min(most, UNBRACED - 1), spend);
        if (last) list.push({ pair: null, cost: UNBRACED, lines: [] });
        options.set(member, list);
      }
    const best: Best = { cost: last ? Infinity : floor + slack + 1, chosen: null };
    descend(parts, options, best, clearance, spend);
    const exact = spent <= bound.most;
    if (best.chosen) return solved(parts, best.chosen, best.cost, exact);
    if (!exact || last) return settle(parts, clearance);
  }
}

function solved(parts: readonly Part[], chosen: readonly Option[], cost: number, exact: boolean): Solved {
  const pairs = new Map<number, Pair>();
  parts
    .flatMap((part) => part.members)
    .forEach((member, i) => {
      const pair = chosen[i]?.pair;
      if (pair) pairs.set(member.index, pair);
    });
  return { pairs, cost, exact };
}

/** Steps that one pole may take when poles are settled one after another. */
const SETTLE_STEPS = 20_000;

function settle(parts: readonly Part[], clearance: number): Solved {
  const pairs = new Map<number, Pair>();
  const placed: Option[] = [];
  let cost = 0;
  for (const member of parts.flatMap((part) => part.members)) {
    let steps = 0;
    const options = optionsOf(member, UNBRACED - 1, () => (steps += 1) <= SETTLE_STEPS);
    const free = options.find((option) => placed.every((other) => areClear(option, other, clearance)));
    cost += free?.cost ?? UNBRACED;
    if (!free?.pair) continue;
    placed.push(free);
    pairs.set(member.index, free.pair);
  }
  return { pairs, cost, exact: false };
}
