/** The pairs of braces that one pole may have, found in order of their cost. */
import type { Candidate, Heading } from './candidates';
import type { Pair, PoleBraces } from './poleBraces';

/**
 * The cheapest pair, or null; `refuse` takes candidates out. Headings are in order of cost and no pair costs less than its
 * two headings at the best reach, so the search ends as soon as they alone reach the best found, and only what may still
 * be part of the best is tried against the ground. Most poles end at the very first pair.
 */
export function cheapestPair(braces: PoleBraces, refuse?: (candidate: Candidate) => boolean): Pair | null {
  const quick = braces.straightPair();
  if (quick && !(refuse && quick.braces.some(refuse))) return quick;
  const first = braces.headings(0);
  const second = braces.headings(1);
  const reach = braces.leastReachCost;
  const leastSecond = (second[0]?.cost ?? Infinity) + reach;
  const known: (Candidate | null | undefined)[] = [];
  const bestSecond = (j: number) => (known[j] === undefined ? (known[j] = braces.best(1, j, refuse)) : known[j]);
  let best: Pair | null = null;
  let least = Infinity;
  for (let i = 0; i < first.length; i += 1) {
    const a = first[i] as Heading;
    if (a.cost + reach + leastSecond >= least) break;
    const candidateA = braces.best(0, i, refuse);
    if (!candidateA) continue;
    for (let j = 0; j < second.length; j += 1) {
      const b = second[j] as Heading;
      const floor = candidateA.cost + b.cost + reach;
      if (floor >= least) break;
      const angle = braces.angleCost(a, b);
      if (floor + angle >= least) continue;
      const candidateB = bestSecond(j);
      if (!candidateB) continue;
      const cost = candidateA.cost + candidateB.cost + angle;
      if (cost >= least) continue;
      least = cost;
      best = { cost, braces: [candidateA, candidateB] };
    }
  }
  return best;
}

/** A candidate and the least that a pair with it costs. */
export interface Ranked {
  readonly candidate: Candidate;
  readonly cost: number;
}

/** Every candidate for brace `which` that a pair of at most `most` can have, with what that pair costs, cheapest first. */
export function rankedBy(braces: PoleBraces, which: 0 | 1, most: number): readonly Ranked[] {
  const found: Ranked[] = [];
  for (const candidate of braces.upTo(which, most)) {
    if (candidate.cost > most) break;
    const cost = candidate.cost + braces.partnerCost(which, candidate.heading);
    if (cost <= most) found.push({ candidate, cost });
  }
  return found.sort((a, b) => a.cost - b.cost);
}

/** Every candidate for brace `which` that stands with `first` as the other, with what their pair costs, cheapest first. */
export function rankedWith(braces: PoleBraces, first: Candidate, which: 0 | 1, most: number): readonly Ranked[] {
  const headings = braces.headings(which);
  const own = braces.headings(which === 0 ? 1 : 0)[first.heading];
  const found: Ranked[] = [];
  if (!own) return found;
  for (const candidate of braces.upTo(which, most - first.cost)) {
    if (first.cost + candidate.cost > most) break;
    const angle = braces.angleFrom(which === 0 ? 1 : 0, own, headings[candidate.heading] as Heading);
    const cost = first.cost + candidate.cost + angle;
    if (cost <= most) found.push({ candidate, cost });
  }
  return found.sort((a, b) => a.cost - b.cost);
}

/** The pair that one brace given makes with its best partner. */
export function pairWith(braces: PoleBraces, given: Candidate, which: 0 | 1): Pair | null {
  const own = braces.headings(which)[given.heading];
  const partner = own ? braces.partnerOf(which, own) : null;
  if (!partner) return null;
  const cost = given.cost + partner.cost;
  return { cost, braces: which === 0 ? [given, partner.candidate] : [partner.candidate, given] };
}

/** Two candidates of one pole as a pair. */
export function pairOf(braces: PoleBraces, pair: readonly [Candidate, Candidate]): Pair {
  const [a, b] = [braces.headings(0)[pair[0].heading], braces.headings(1)[pair[1].heading]];
  const angle = a && b ? braces.angleCost(a, b) : Infinity;
  return { cost: pair[0].cost + pair[1].cost + angle, braces: pair };
}
