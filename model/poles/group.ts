/** The cheapest placing of a group of poles whose braces compete for the same ground. */
import { distance } from '../geometry/vec';
import type { Candidate } from './candidates';
import { bracesConflict, type BraceLine } from './clearance';
import { bestWith, cheapestPair, pairsWith, type Pair, type PoleBraces, type Ranked } from './pairs';

/**
 * When each of a pole's two braces first met another pole's, counted in rounds; null where it never did. Only braces that
 * have met need keep clear of one another, until more do.
 */
export type Relevant = readonly [number | null, number | null];

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
  /** Most steps (candidates looked at) for one group before it settles for less than the best. */
  readonly most: number;
  /** Most steps for the whole site: after them the poles still in conflict are placed one after another. */
  readonly inAll: number;
}

export const USUAL_BOUND: SearchBound = { most: 3_000_000, inAll: 9_000_000 };

export interface Solved {
  readonly pairs: ReadonlyMap<number, Pair>;
  /** Total, with `UNBRACED` for each pole left without a pair. */
  readonly cost: number;
  /** False where the bound was reached. */
  readonly exact: boolean;
  readonly spent: number;
}

/** Dearer than any pair: a pole is left without braces only where the others leave it no way at all. */
const UNBRACED = 1_000_000;
/** Slack over the lower bound within which a group is first searched; it grows until an answer lies within it. */
const FIRST_SLACK = 16;
const SLACK_GROWS = 2;

type Spend = () => boolean;

/** One relevant brace whose place is to be chosen. */
interface Choice {
  readonly member: Member;
  readonly which: 0 | 1;
  readonly part: number;
  /** Where among the choices the member's other brace is chosen, when it is chosen before this one. */
  readonly after: number | null;
  /** Each candidate that may serve, with the best pair it can be part of, cheapest first. */
  readonly ranked: readonly Ranked[];
  /** The same, given where the member's other brace is: cheapest pair with it first. */
  readonly beside: (first: Candidate) => readonly Ranked[];
}

function rank(member: Member, which: 0 | 1, most: number, spend: Spend): Ranked[] {
  const found: Ranked[] = [];
  for (const candidate of member.pole.lists()[which]) {
    if (candidate.cost > most || !spend()) break;
    const pair = bestWith(member.pole, candidate, which, most);
    if (pair) found.push({ candidate, pair });
  }
  return found.sort((a, b) => a.pair.cost - b.pair.cost);
}

/** Partners of each first candidate, listed once when first asked for. */
function partners(member: Member, which: 0 | 1, most: number): Choice['beside'] {
  const known = new Map<Candidate, readonly Ranked[]>();
  return (first) => {
    let list = known.get(first);
    if (!list) known.set(first, (list = pairsWith(member.pole, first, which, most)));
    return list;
  };
}

/** The relevant braces in the order in which they met, so that those in each other's way are chosen one after another. */
function choicesOf(parts: readonly Part[], slack: number, spend: Spend): Choice[] {
  const wanted = parts.flatMap(({ members, lower }, part) =>
    members.flatMap((member) => {
      const most = Math.min(UNBRACED - 1, slack + lower - (ownSum(members) - member.own.cost));
      return ([0, 1] as const).flatMap((which) => {
        const round = member.relevant[which];
        return round === null ? [] : [{ member, which, part, most, round }];
      });
    }),
  );
  wanted.sort((a, b) => a.round - b.round);
  const firsts = new Map<Member, number>();
  return wanted.map(({ member, which, part, most }, i) => {
    const after = firsts.get(member) ?? null;
    if (after === null) firsts.set(member, i);
    const ranked = rank(member, which, most, spend);
    return { member, which, part, after, ranked, beside: partners(member, which, most) };
  });
}

function ownSum(members: readonly Member[]): number {
  return members.reduce((sum, member) => sum + member.own.cost, 0);
}

/** Whether two candidates conflict, worked out once for each two. */
function conflictTable(clearance: number): (a: Member, p: Candidate, b: Member, q: Candidate) => boolean {
  const known = new Map<Candidate, Map<Candidate, boolean>>();
  return (a, p, b, q) => {
    let row = known.get(p);
    if (!row) known.set(p, (row = new Map()));
    let answer = row.get(q);
    if (answer === undefined) {
      answer = bracesConflict({ from: a.pole.at, foot: p.foot }, { from: b.pole.at, foot: q.foot }, clearance);
      row.set(q, answer);
    }
    return answer;
  };
}

interface Best {
  cost: number;
  pairs: ReadonlyMap<Member, Pair | null> | null;
}

interface Descent {
  readonly parts: readonly Part[];
  readonly choices: readonly Choice[];
  readonly mayLeave: boolean;
  readonly conflict: ReturnType<typeof conflictTable>;
  readonly spend: Spend;
}

/**
 * Depth first, one brace at a time. A branch ends when the least that its whole placing can cost reaches the best found:
 * each pole costs at least the best pair that keeps what is chosen of it, and each part at least its lower bound.
 */
function descend({ parts, choices, mayLeave, conflict, spend }: Descent, best: Best): void {
  const sums = parts.map(({ members }) => ownSum(members));
  const pairs = new Map<Member, Pair | null>(
    parts.flatMap(({ members }) => members.map((member) => [member, member.own])),
  );
  const chosen: (Candidate | null)[] = [];
  const total = (part: number, change: number): number =>
    parts.reduce((sum, { lower }, p) => sum + Math.max(lower, (sums[p] ?? 0) + (p === part ? change : 0)), 0);
  const costOf = (pair: Pair | null | undefined) => (pair ? pair.cost : UNBRACED);
  const isClear = (depth: number, choice: Choice, candidate: Candidate): boolean =>
    chosen.every((other, n) => {
      const earlier = choices[n];
      return (
        !other ||
        !earlier ||
        n >= depth ||
        earlier.member === choice.member ||
        !conflict(earlier.member, other, choice.member, candidate)
      );
    });
  const take = (depth: number, choice: Choice, candidate: Candidate | null, pair: Pair | null): void => {
    const before = pairs.get(choice.member) ?? null;
    const change = costOf(pair) - costOf(before);
    sums[choice.part] = (sums[choice.part] ?? 0) + change;
    pairs.set(choice.member, pair);
    chosen[depth] = candidate;
    step(depth + 1);
    chosen.length = depth;
    pairs.set(choice.member, before);
    sums[choice.part] = (sums[choice.part] ?? 0) - change;
  };
  const step = (depth: number): void => {
    const choice = choices[depth];
    if (!choice) {
      const cost = total(-1, 0);
      if (cost < best.cost) {
        best.cost = cost;
        best.pairs = new Map(pairs);
      }
      return;
    }
    const held = pairs.get(choice.member) ?? null;
    if (choice.after !== null && !held) return take(depth, choice, null, null);
    const first = choice.after === null ? null : (chosen[choice.after] ?? null);
    for (const { candidate, pair } of first ? choice.beside(first) : choice.ranked) {
      if (total(choice.part, pair.cost - costOf(held)) >= best.cost) break;
      if (!spend()) return;
      if (isClear(depth, choice, candidate)) take(depth, choice, candidate, pair);
    }
    if (mayLeave && choice.after === null && total(choice.part, UNBRACED - costOf(held)) < best.cost)
      take(depth, choice, null, null);
  };
  step(0);
}

/**
 * The cheapest placing of a group. Within a slack over the lower bound each pole has finitely many pairs, since the others
 * cost at least their own parts of that bound. An answer within the slack is the least there is; none widens the slack, and
 * at last a pole may go unbraced. Where the bound on steps is reached, the best found so far is kept, or one pole after
 * another takes what is free.
 */
export function solveGroup(parts: readonly Part[], clearance: number, bound: SearchBound): Solved {
  const floor = parts.reduce((sum, part) => sum + part.lower, 0);
  const conflict = conflictTable(clearance);
  let spent = 0;
  const spend = () => (spent += 1) <= bound.most;
  for (let slack = FIRST_SLACK; ; slack *= SLACK_GROWS) {
    const mayLeave = slack >= UNBRACED || floor >= UNBRACED;
    const choices = choicesOf(parts, mayLeave ? UNBRACED : slack, spend);
    const best: Best = { cost: mayLeave ? Infinity : floor + slack + 1, pairs: null };
    descend({ parts, choices, mayLeave, conflict, spend }, best);
    const exact = spent <= bound.most;
    if (best.pairs) return solved(best.pairs, best.cost, exact, spent);
    if (!exact || mayLeave) return settle(parts, clearance, spent);
  }
}

function solved(pairs: ReadonlyMap<Member, Pair | null>, cost: number, exact: boolean, spent: number): Solved {
  const byIndex = new Map<number, Pair>();
  for (const [member, pair] of pairs) if (pair) byIndex.set(member.index, pair);
  return { pairs: byIndex, cost, exact, spent };
}

/** One pole after another, each with the cheapest pair that keeps clear of those already placed. */
function settle(parts: readonly Part[], clearance: number, spent: number): Solved {
  const members = parts.flatMap((part) => part.members);
  const found = placeInTurn(
    members.map((member) => member.pole),
    [],
    clearance,
  );
  const pairs = new Map<number, Pair>();
  let cost = 0;
  members.forEach((member, i) => {
    const pair = found[i];
    cost += pair ? pair.cost : UNBRACED;
    if (pair) pairs.set(member.index, pair);
  });
  return { pairs, cost, exact: false, spent };
}

/** Pairs for poles in turn, each the cheapest that keeps clear of `fixed` and of those before it; null where none does. */
export function placeInTurn(
  poles: readonly PoleBraces[],
  fixed: readonly BraceLine[],
  clearance: number,
): readonly (Pair | null)[] {
  const placed = [...fixed];
  return poles.map((pole) => {
    const longest = pole.lists().reduce((most, list) => Math.max(most, ...list.map((each) => each.reach)), 0);
    const near = placed.filter(
      ({ from, foot }) => distance(from, pole.at) <= distance(from, foot) + longest + clearance + 1,
    );
    const over = (candidate: Candidate) => {
      const line = { from: pole.at, foot: candidate.foot };
      return near.some((other) => bracesConflict(line, other, clearance)) ? null : pole.over(candidate);
    };
    const pair = cheapestPair({ ...pole, over });
    if (pair) placed.push(...pair.braces.map((brace) => ({ from: pole.at, foot: brace.foot })));
    return pair;
  });
}
