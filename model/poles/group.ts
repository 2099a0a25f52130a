/** The cheapest placing of a group of poles whose braces compete for the same ground. */
import { distance } from '../geometry/vec';
import type { Candidate } from './candidates';
import { bracesConflict } from './clearance';
import { placeInTurn } from './inTurn';
import { pairOf, pairWith, rankedBy, rankedWith, type Ranked } from './pairs';
import type { Pair, PoleBraces } from './poleBraces';

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

export const USUAL_BOUND: SearchBound = { most: 3_000_000, inAll: 3_000_000 };

export interface Solved {
  readonly pairs: ReadonlyMap<number, Pair>;
  /** Total, with `UNBRACED` for each pole left without a pair. */
  readonly cost: number;
  /** What any placing costs at least; the cost itself where it is exact. */
  readonly lower: number;
  /** False where the bound was reached. */
  readonly exact: boolean;
  readonly spent: number;
}

/** Dearer than any pair: a pole is left without braces only where the others leave it no way at all. */
export const UNBRACED = 1_000_000;
/** Slack over the lower bound within which a group is first searched; it grows until an answer lies within it. */
const FIRST_SLACK = 16;
const SLACK_GROWS = 2;

type Spend = () => boolean;

/** One relevant brace whose place is to be chosen. */
interface Choice {
  readonly member: Member;
  readonly which: 0 | 1;
  readonly part: number;
  /** Place of its member among all. */
  readonly of: number;
  /** Where among the choices the member's other brace is chosen, when it is chosen before this one. */
  readonly after: number | null;
  /** Earlier choices whose braces can come near this one's. */
  readonly rivals: readonly number[];
  /** Each candidate that may serve, with the least that a pair with it costs, cheapest first. */
  readonly ranked: readonly Ranked[];
  /** The same, given where the member's other brace is: cheapest pair with it first. */
  readonly beside: (first: Candidate) => readonly Ranked[];
}

/** Partners of each first candidate, listed once when first asked for. */
function partners(member: Member, which: 0 | 1, most: number): Choice['beside'] {
  const known = new Map<Candidate, readonly Ranked[]>();
  return (first) => {
    let list = known.get(first);
    if (!list) known.set(first, (list = rankedWith(member.pole, first, which, most)));
    return list;
  };
}

/** The relevant braces in the order in which they met, so that those in each other's way are chosen one after another. */
function choicesOf(parts: readonly Part[], slack: number, clearance: number, spend: Spend): Choice[] {
  const members = parts.flatMap((part) => part.members);
  const place = new Map(members.map((member, i) => [member, i]));
  const wanted = parts.flatMap(({ members: own, lower }, part) =>
    own.flatMap((member) => {
      const most = Math.min(UNBRACED - 1, slack + lower - (ownSum(own) - member.own.cost));
      return ([0, 1] as const).flatMap((which) => {
        const round = member.relevant[which];
        return round === null ? [] : [{ member, which, part, most, round }];
      });
    }),
  );
  wanted.sort((a, b) => a.round - b.round);
  const firsts = new Map<Member, number>();
  const longest = (pole: PoleBraces) => pole.longestReach + 1;
  const choices: Choice[] = [];
  wanted.forEach(({ member, which, part, most }, i) => {
    const after = firsts.get(member) ?? null;
    if (after === null) firsts.set(member, i);
    const ranked = rankedBy(member.pole, which, most);
    for (let n = 0; n < ranked.length && spend(); n += 1);
    const rivals = choices.flatMap((other, n) => {
      if (other.member === member) return [];
      const room = longest(member.pole) + longest(other.member.pole) + clearance;
      return distance(member.pole.at, other.member.pole.at) <= room ? [n] : [];
    });
    const beside = partners(member, which, most);
    choices.push({ member, which, part, of: place.get(member) ?? 0, after, rivals, ranked, beside });
  });
  return choices;
}

function ownSum(members: readonly Member[]): number {
  return members.reduce((sum, member) => sum + member.own.cost, 0);
}

interface Best {
  cost: number;
  /** What was chosen for each choice; null where its pole goes unbraced. */
  chosen: readonly (Candidate | null)[] | null;
}

interface Descent {
  readonly parts: readonly Part[];
  readonly choices: readonly Choice[];
  readonly clearance: number;
  readonly mayLeave: boolean;
  readonly spend: Spend;
}

/**
 * Depth first, one brace at a time. A branch ends when the least that its whole placing can cost reaches the best found:
 * each pole costs at least the best pair that keeps what is chosen of it, and each part at least its lower bound.
 */
function descend({ parts, choices, clearance, mayLeave, spend }: Descent, best: Best): void {
  const sums = parts.map(({ members }) => ownSum(members));
  const lowers = parts.map(({ lower }) => lower);
  const costs = parts.flatMap(({ members }) => members.map((member) => member.own.cost));
  const chosen: (Candidate | null)[] = choices.map(() => null);
  let floor = sums.reduce((sum, own, p) => sum + Math.max(own, lowers[p] ?? 0), 0);
  /** What the whole costs at least when the sum of one part changes. */
  const withChange = (part: number, change: number): number => {
    const [sum, lower] = [sums[part] ?? 0, lowers[part] ?? 0];
    return floor - Math.max(lower, sum) + Math.max(lower, sum + change);
  };
  const isClear = (choice: Choice, candidate: Candidate): boolean => {
    const line = { from: choice.member.pole.at, foot: candidate.foot };
    for (const n of choice.rivals) {
      const other = chosen[n];
      const from = choices[n]?.member.pole.at;
      if (other && from && bracesConflict({ from, foot: other.foot }, line, clearance)) return false;
    }
    return true;
  };
  const take = (depth: number, choice: Choice, candidate: Candidate | null, cost: number): void => {
    const before = costs[choice.of] ?? 0;
    const floorBefore = floor;
    const sumBefore = sums[choice.part] ?? 0;
    floor = withChange(choice.part, cost - before);
    sums[choice.part] = sumBefore + cost - before;
    costs[choice.of] = cost;
    chosen[depth] = candidate;
    step(depth + 1);
    chosen[depth] = null;
    costs[choice.of] = before;
    sums[choice.part] = sumBefore;
    floor = floorBefore;
  };
  const step = (depth: number): void => {
    const choice = choices[depth];
    if (!choice) {
      if (floor < best.cost) {
        best.cost = floor;
        best.chosen = [...chosen];
      }
      return;
    }
    const held = costs[choice.of] ?? 0;
    const first = choice.after === null ? null : (chosen[choice.after] ?? null);
    if (choice.after !== null && !first) return take(depth, choice, null, held);
    for (const { candidate, cost } of first ? choice.beside(first) : choice.ranked) {
      if (withChange(choice.part, cost - held) >= best.cost) break;
      if (!spend()) return;
      if (isClear(choice, candidate)) take(depth, choice, candidate, cost);
    }
    if (mayLeave && choice.after === null && withChange(choice.part, UNBRACED - held) < best.cost)
      take(depth, choice, null, UNBRACED);
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
  let spent = 0;
  const spend = () => (spent += 1) <= bound.most;
  for (let slack = FIRST_SLACK; ; slack *= SLACK_GROWS) {
    const mayLeave = slack >= UNBRACED || floor >= UNBRACED;
    const choices = choicesOf(parts, mayLeave ? UNBRACED : slack, clearance, spend);
    const best: Best = { cost: mayLeave ? Infinity : floor + slack + 1, chosen: null };
    descend({ parts, choices, clearance, mayLeave, spend }, best);
    const exact = spent <= bound.most;
    // Everything within the slack before this one was looked at.
    const lower = exact ? best.cost : floor + (slack === FIRST_SLACK ? 0 : slack / SLACK_GROWS + 1);
    if (best.chosen) return solved(parts, choices, best.chosen, best.cost, Math.min(lower, best.cost), exact, spent);
    if (!exact || mayLeave) return settle(parts, clearance, lower, spent);
  }
}

function solved(
  parts: readonly Part[],
  choices: readonly Choice[],
  chosen: readonly (Candidate | null)[],
  cost: number,
  lower: number,
  exact: boolean,
  spent: number,
): Solved {
  const pairs = new Map<number, Pair>();
  for (const { members } of parts) for (const member of members) pairs.set(member.index, member.own);
  choices.forEach(({ member, which, after }, i) => {
    const candidate = chosen[i];
    const first = after === null ? null : chosen[after];
    if (!candidate) pairs.delete(member.index);
    else if (first) pairs.set(member.index, pairOf(member.pole, which === 0 ? [candidate, first] : [first, candidate]));
    else {
      const pair = pairWith(member.pole, candidate, which);
      if (pair) pairs.set(member.index, pair);
    }
  });
  return { pairs, cost, lower, exact, spent };
}

/** One pole after another, each with the cheapest pair that keeps clear of those already placed. */
function settle(parts: readonly Part[], clearance: number, lower: number, spent: number): Solved {
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
  return { pairs, cost, lower: Math.min(lower, cost), exact: false, spent };
}
