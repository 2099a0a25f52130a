/**
 * The smallest set of things that keeps a pole from having two braces. Every two places that keep the angle rule are
 * refused by something; a set that refuses one of each two is a cause, and the smallest such set is found by deepening:
 * none, one thing, two things and so on, each time taking a pair still free and trying each thing that refuses it.
 */
import type { ThingRef } from '../things';
import { headingsAt, idealsAt, reachesWithin, type Heading } from './candidates';
import type { Nearby } from './nearby';
import { stepFrom } from './plane';
import type { PoleBraces } from './poleBraces';

/** Headings of one brace that the same things refuse. */
interface Alike {
  readonly headings: Heading[];
  /** For each of its places, the things that refuse it, by number; a place is open where none of them counts. */
  readonly refusers: readonly (readonly number[])[];
}

/** Work still allowed, counted in places and pairs looked at. */
export interface Budget {
  left: number;
}

export interface Culprits {
  readonly things: readonly ThingRef[];
  /** False where the work ran out: no thing of the set can be spared, but a smaller set may be missed. */
  readonly smallest: boolean;
}

/** A cause of more things than this is no help: the search for a smaller one stops. */
const DEEPEST = 6;

const keyOf = (thing: ThingRef): string => `${thing.kind} ${thing.id}`;

/** The sets that hold no other: what refuses one of those refuses the rest as well. */
function leastSets(sets: readonly (readonly number[])[]): readonly (readonly number[])[] {
  const sorted = [...sets].sort((a, b) => a.length - b.length || (a.join() < b.join() ? -1 : 1));
  const kept: (readonly number[])[] = [];
  for (const set of sorted) if (!kept.some((other) => other.every((thing) => set.includes(thing)))) kept.push(set);
  return kept;
}

interface Refusals {
  readonly things: readonly ThingRef[];
  readonly alike: readonly (readonly Alike[])[];
}

/** What refuses every place of both braces; what the walls of the pole's own corner refuse is left out, for it is given. */
function refusalsOf(braces: PoleBraces, nearby: Nearby, budget: Budget): Refusals {
  const { seat, at, kit, reach, options } = braces.site;
  const own = new Set(seat.faces.map((face) => keyOf({ kind: 'run', id: face.runId })));
  const numbers = new Map<string, number>();
  const things: ThingRef[] = [];
  const numberOf = (thing: ThingRef): number => {
    const known = numbers.get(keyOf(thing));
    if (known !== undefined) return known;
    numbers.set(keyOf(thing), things.length);
    return things.push(thing) - 1;
  };
  const reaches = reachesWithin(kit, reach, options);
  const alike = headingsAt(idealsAt(seat), seat, options).map((headings) => {
    const groups = new Map<string, Alike>();
    for (const heading of headings) {
      const sets = new Map<string, readonly number[]>();
      for (const each of reaches) {
        budget.left -= 1;
        const refusing = nearby.refusers(stepFrom(at, [heading.direction, each.reach]));
        if (refusing.some((thing) => own.has(keyOf(thing)))) continue;
        const set = [...new Set(refusing.map(numberOf))].sort((a, b) => a - b);
        sets.set(set.join(), set);
      }
      if (sets.size === 0) continue;
      const least = leastSets([...sets.values()]);
      const key = least.join(';');
      const group = groups.get(key);
      if (group) group.headings.push(heading);
      else groups.set(key, { headings: [heading], refusers: least });
    }
    return [...groups.values()];
  });
  return { things, alike };
}

/** The pairs of places that keep the angle rule, each as the things that refuse either; only those that hold no other. */
function pairsRefused(
  braces: PoleBraces,
  [first = [], second = []]: Refusals['alike'],
  budget: Budget,
): readonly (readonly number[])[] {
  const found = new Map<string, number[]>();
  for (const a of first)
    for (const b of second) {
      budget.left -= a.headings.length;
      const meet = a.headings.some((p) => b.headings.some((q) => braces.angleCost(p, q) < Infinity));
      if (!meet) continue;
      for (const p of a.refusers)
        for (const q of b.refusers) {
          const union = [...new Set([...p, ...q])].sort((x, y) => x - y);
          found.set(union.join(), union);
        }
    }
  return leastSets([...found.values()]);
}

/** A hitting set of at most `most` things, or null; the pairs in order of how few things refuse them. */
function hit(pairs: readonly (readonly number[])[], chosen: Set<number>, most: number, budget: Budget): boolean {
  budget.left -= pairs.length;
  const open = pairs.find((refusers) => !refusers.some((thing) => chosen.has(thing)));
  if (!open) return true;
  if (chosen.size >= most || budget.left < 0) return false;
  for (const thing of open) {
    chosen.add(thing);
    if (hit(pairs, chosen, most, budget)) return true;
    chosen.delete(thing);
  }
  return false;
}

/** Takes away, one after another, every thing that the others make up for. */
function spare(pairs: readonly (readonly number[])[], all: Iterable<number>): Set<number> {
  const chosen = new Set(all);
  for (const thing of [...chosen]) {
    chosen.delete(thing);
    if (pairs.some((refusers) => !refusers.some((each) => chosen.has(each)))) chosen.add(thing);
  }
  return chosen;
}

/**
 * The smallest set of things that alone leaves a pole without two braces, the walls of its own corner given; an empty set
 * where those walls are enough. Null where the pole can be braced.
 */
export function culpritsOf(braces: PoleBraces, nearby: Nearby, budget: Budget): Culprits | null {
  const { things, alike } = refusalsOf(braces, nearby, budget);
  const pairs = pairsRefused(braces, alike, budget);
  if (pairs.some((refusers) => refusers.length === 0)) return null;
  const named = (chosen: ReadonlySet<number>): ThingRef[] => [...chosen].flatMap((number) => things[number] ?? []);
  for (let most = 0; most <= DEEPEST && budget.left > 0; most += 1) {
    const chosen = new Set<number>();
    if (hit(pairs, chosen, most, budget)) return { things: named(chosen), smallest: true };
  }
  return { things: named(spare(pairs, things.keys())), smallest: false };
}
