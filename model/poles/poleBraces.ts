/** The two braces of one pole: where each can stand, worked out when first asked for. */
import type { PoleKit } from '../drawing/schema';
import type { PlanPoint } from '../geometry/point';
import { cross, dot } from '../geometry/vec';
import {
  headingsAt,
  idealsAt,
  OVER_WAY,
  reachesWithin,
  straightHeadings,
  type Candidate,
  type CandidateOptions,
  type Heading,
  type Reach,
  type ReachLimits,
} from './candidates';
import { Nearby } from './nearby';
import type { Ground } from './obstacles';
import { stepFrom } from './plane';
import { cheapestPair } from './pairs';
import type { Seat } from './seats';

export interface Pair {
  readonly cost: number;
  readonly braces: readonly [Candidate, Candidate];
}

export interface AngleLimits {
  /** Least and most angle between the two braces in plan, in degrees. */
  readonly least: number;
  readonly most: number;
}

/** A right angle is best; the square of the degrees away from it counts. */
const BEST_ANGLE = 90;
/** Angles come from whole degrees of turn: what floating point adds must not refuse one on the limit. */
const ANGLE_SLACK = 1e-6;

export interface PoleSite {
  readonly poleId: string;
  readonly seat: Seat;
  readonly at: PlanPoint;
  readonly kit: PoleKit;
  readonly reach: ReachLimits;
  readonly limits: AngleLimits;
  readonly options: CandidateOptions;
}

/** What is known so far of one brace: each heading's candidates by reach, worked out when first asked for. */
interface BraceFan {
  readonly headings: readonly Heading[];
  /** By heading and reach: null where none can stand there. */
  readonly tried: (Candidate | null | undefined)[];
  /** By heading: the cheapest candidate. */
  readonly best: (Candidate | null | undefined)[];
  /** By heading: the least that a brace of the other fan adds to it, angle included. */
  readonly partner: (number | undefined)[];
  /** Every candidate up to a cost, cheapest first. */
  listed: { readonly most: number; readonly candidates: readonly Candidate[] } | null;
}

/** The two braces of one pole. */
export class PoleBraces {
  private readonly ideals: ReturnType<typeof idealsAt>;
  private readonly reaches: readonly Reach[];
  private readonly nearby: Nearby;
  /** Signed degrees from each ideal bearing of the first brace to each of the second. */
  private readonly between: readonly (readonly number[])[];
  private known: readonly [BraceFan, BraceFan] | null = null;
  private cheapest: Pair | null | undefined;

  constructor(
    readonly site: PoleSite,
    ground: Ground,
  ) {
    this.ideals = idealsAt(site.seat);
    this.reaches = reachesWithin(site.kit, site.reach, site.options);
    const longest = this.reaches.reduce((most, { reach }) => Math.max(most, reach), 0);
    this.nearby = new Nearby(site.at, site.poleId, site.kit, ground, longest);
    this.between = this.ideals[0].map((a) =>
      this.ideals[1].map((b) => (Math.atan2(cross(a.bearing, b.bearing), dot(a.bearing, b.bearing)) * 180) / Math.PI),
    );
  }

  get poleId(): string {
    return this.site.poleId;
  }

  get at(): PlanPoint {
    return this.site.at;
  }

  private fans(): readonly [BraceFan, BraceFan] {
    if (this.known) return this.known;
    const [first = [], second = []] = headingsAt(this.ideals, this.site.seat, this.site.options);
    const fan = (headings: readonly Heading[]): BraceFan => ({
      headings,
      tried: [],

      best: [],
      partner: [],
      listed: null,
    });
    return (this.known = [fan(first), fan(second)]);
  }

  headings(which: 0 | 1): readonly Heading[] {
    return this.fans()[which].headings;
  }

  /** The least that any reach costs. */
  get leastReachCost(): number {
    return this.reaches[0]?.cost ?? Infinity;
  }

  private stand(heading: Heading, index: number, { reach, cost }: Reach): Candidate | null {
    const foot = stepFrom(this.site.at, [heading.direction, reach]);
    const over = this.nearby.over(foot);
    if (!over) return null;
    const { runId, direction, alongFace } = heading;
    const turned = Math.abs(heading.turn);
    const whole = heading.cost + cost + OVER_WAY * over.length;
    return { heading: index, runId, foot, direction, reach, turned, alongFace, over, cost: whole };
  }

  /** Its cheapest pair, with nothing of other poles' in the way. */
  own(): Pair | null {
    return this.cheapest === undefined ? (this.cheapest = cheapestPair(this)) : this.cheapest;
  }

  get longestReach(): number {
    return this.reaches.reduce((most, { reach }) => Math.max(most, reach), 0);
  }

  /** The candidate of a heading at one of the reaches; null where it can't stand. */
  standing(which: 0 | 1, index: number, r: number): Candidate | null {
    const fan = this.fans()[which];
    const heading = fan.headings[index];
    const reach = this.reaches[r];
    if (!heading || !reach) return null;
    const slot = index * this.reaches.length + r;
    const found = fan.tried[slot];
    if (found !== undefined) return found;
    return (fan.tried[slot] = this.stand(heading, index, reach));
  }

  /** The cheapest candidate of a heading that `refuse` lets stand. */
  best(which: 0 | 1, index: number, refuse?: (candidate: Candidate) => boolean): Candidate | null {
    const fan = this.fans()[which];
    const known = refuse ? undefined : fan.best[index];
    if (known !== undefined) return known;
    let best: Candidate | null = null;
    const base = fan.headings[index]?.cost ?? Infinity;
    for (let r = 0; r < this.reaches.length; r += 1) {
      if (best && base + (this.reaches[r]?.cost ?? Infinity) >= best.cost) break;
      const candidate = this.standing(which, index, r);
      if (candidate && (!best || candidate.cost < best.cost) && !refuse?.(candidate)) best = candidate;
    }
    if (!refuse) fan.best[index] = best;
    return best;
  }

  /** Candidates, cheapest first: every one that costs no more than `most`, and perhaps dearer ones after them. */
  upTo(which: 0 | 1, most: number): readonly Candidate[] {
    const fan = this.fans()[which];
    if (fan.listed && fan.listed.most >= most) return fan.listed.candidates;
    const found: Candidate[] = [];
    fan.headings.forEach(({ cost }, index) => {
      for (let r = 0; r < this.reaches.length; r += 1) {
        if (cost + (this.reaches[r]?.cost ?? 0) > most) break;
        const candidate = this.standing(which, index, r);
        if (candidate && candidate.cost <= most) found.push(candidate);
      }
    });
    const candidates = found.sort((a, b) => a.cost - b.cost);
    fan.listed = { most, candidates };
    return candidates;
  }

  /** What the angle between a heading of the first brace and one of the second costs; Infinity outside the limits. */
  angleCost(first: Heading, second: Heading, limits: AngleLimits = this.site.limits): number {
    const apart = Math.abs((this.between[first.ideal]?.[second.ideal] ?? 0) + second.turn - first.turn);
    const round = apart % 360;
    const angle = round > 180 ? 360 - round : round;
    if (angle < limits.least - ANGLE_SLACK || angle > limits.most + ANGLE_SLACK) return Infinity;
    const off = Math.round(angle) - BEST_ANGLE;
    return off * off;
  }

  /** The same from whichever brace `which` is. */
  angleFrom(which: 0 | 1, own: Heading, other: Heading): number {
    return which === 0 ? this.angleCost(own, other) : this.angleCost(other, own);
  }

  /** The least that a brace of the other fan adds to any candidate of this heading, angle included. */
  partnerCost(which: 0 | 1, index: number): number {
    const fan = this.fans()[which];
    const known = fan.partner[index];
    if (known !== undefined) return known;
    const own = fan.headings[index];
    const found = own ? this.partnerOf(which, own) : null;
    return (fan.partner[index] = found ? found.cost : Infinity);
  }

  /** The candidate of the other fan that goes best with a heading, and what it adds. */
  partnerOf(which: 0 | 1, own: Heading): { readonly candidate: Candidate; readonly cost: number } | null {
    const others = which === 0 ? 1 : 0;
    let best: Candidate | null = null;
    let least = Infinity;
    const headings = this.headings(others);
    for (let i = 0; i < headings.length; i += 1) {
      const heading = headings[i] as Heading;
      if (heading.cost + this.leastReachCost >= least) break;
      const angle = this.angleFrom(which, own, heading);
      if (heading.cost + this.leastReachCost + angle >= least) continue;
      const candidate = this.best(others, i);
      if (!candidate || candidate.cost + angle >= least) continue;
      best = candidate;
      least = candidate.cost + angle;
    }
    return best && { candidate: best, cost: least };
  }

  /** Both braces straight and square to one another, where nothing is in their way: no pair can cost less. */
  straightPair(): Pair | null {
    const headings = straightHeadings(this.ideals, this.site.seat);
    const reach = this.reaches[0];
    if (!headings || !reach || this.angleCost(...headings) !== 0) return null;
    const first = this.stand(headings[0], 0, reach);
    const second = first && first.over.length === 0 ? this.stand(headings[1], 0, reach) : null;
    if (!first || !second || second.over.length > 0) return null;
    return { cost: first.cost + second.cost, braces: [first, second] };
  }
}
