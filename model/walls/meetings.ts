/** How the runs at one corner meet: where each side of each run ends, whatever the angles and thicknesses. */
import type { Corner } from '../drawing/schema';
import { compareBearings } from '../geometry/orientation';
import type { Vec } from '../geometry/point';
import { meetLines } from '../geometry/segment';
import { add, cross, dot, length, negate, perp, scale } from '../geometry/vec';
import type { ReadyRun } from './runs';
import type { CornerKind, EndKind } from './types';

/** A mitre longer than this many thicknesses is no corner that units can turn. */
const MITRE_MOST = 4;
/** Sine under which two directions count as one line: the mitre then moves less than a tick at any thickness. */
const PARALLEL = 1e-6;
/** Two runs this near to one line meet straight (cosine of 179.95°). */
const STRAIGHT = -Math.cos((0.05 * Math.PI) / 180);
/** Two of several runs this near to one line are the bar that the others stop against (cosine of 150°). */
const BAR = -Math.cos(Math.PI / 6);

/** A run seen from one of its corners, looking away from it. */
export interface Ray {
  readonly ready: ReadyRun;
  /** Whether this corner is the run's first. */
  readonly first: boolean;
  readonly direction: Vec;
  /** Distance from the reference line to the wall's left and right side. */
  readonly left: number;
  readonly right: number;
}

/** Where one ray's sides end, from the corner, in floating point. */
export interface RayEnd {
  readonly ray: Ray;
  readonly left: Vec;
  readonly right: Vec;
  /** A point that fills the middle where three or more runs meet and none goes through. */
  readonly middle: Vec | null;
  readonly kind: EndKind;
  /** How far along the ray other runs' bodies reach: an opening starts beyond it. */
  readonly clear: number;
}

export interface CornerMeeting {
  readonly kind: CornerKind;
  /** Degrees through the body; null unless two runs meet. */
  readonly angle: number | null;
  /** Counter-clockwise by bearing. */
  readonly ends: readonly RayEnd[];
  /** A mitre was longer than can be turned. */
  readonly tooSharp: boolean;
}

/** A run as a ray from its first or its second corner. */
export function rayOf(ready: ReadyRun, first: boolean): Ray {
  return first
    ? { ready, first, direction: ready.direction, left: ready.thickness, right: 0 }
    : { ready, first, direction: negate(ready.direction), left: 0, right: ready.thickness };
}

function far(ray: Ray): Corner {
  return ray.first ? ray.ready.to : ray.ready.from;
}

/** Orders rays counter-clockwise from +x, exactly; rays in one line by their runs' ids. */
export function sortRays(at: Corner, rays: readonly Ray[]): readonly Ray[] {
  return [...rays].sort((p, q) => {
    const a = far(p);
    const b = far(q);
    const turn = compareBearings(a.x - at.x, a.y - at.y, b.x - at.x, b.y - at.y);
    return turn !== 0 ? turn : p.ready.run.id < q.ready.run.id ? -1 : 1;
  });
}

function squareLeft(ray: Ray): Vec {
  return scale(perp(ray.direction), ray.left);
}

function squareRight(ray: Ray): Vec {
  return scale(perp(ray.direction), 0 - ray.right);
}

interface Wedge {
  readonly left: Vec;
  readonly right: Vec;
  readonly tooSharp: boolean;
}

/** Where the left side of `a` meets the right side of `b`, the next ray round; each ends square where they can't meet. */
function wedge(a: Ray, b: Ray): Wedge {
  const left = squareLeft(a);
  const right = squareRight(b);
  const square = { left, right, tooSharp: false };
  const facing = dot(a.direction, b.direction);
  if (Math.abs(cross(a.direction, b.direction)) < PARALLEL) return { ...square, tooSharp: facing > 0 };
  const at = meetLines(left, a.direction, right, b.direction);
  if (!at) return square;
  // Past a half turn the long mitre is a step between two thicknesses in nearly one line: the ends stay square.
  const most = MITRE_MOST * Math.max(a.ready.thickness, b.ready.thickness);
  if (length(at) > most) return { ...square, tooSharp: facing > 0 };
  return { left: at, right: at, tooSharp: false };
}

function turnedAngle(from: Vec, to: Vec): number {
  const degrees = (Math.atan2(cross(from, to), dot(from, to)) * 180) / Math.PI;
  return degrees < 0 ? degrees + 360 : degrees;
}

/** Degrees between two rays through the body; where their bodies lie on both sides, the smaller angle. */
function bodyAngle(a: Ray, b: Ray): number {
  const turn = turnedAngle(a.direction, b.direction);
  if (a.left > 0 && b.right > 0) return turn;
  if (b.left > 0 && a.right > 0) return 360 - turn;
  return Math.min(turn, 360 - turn);
}

interface Bar {
  readonly pair: readonly [Ray, Ray];
  readonly straight: number;
  readonly thickness: number;
  readonly id: string;
}

/** The two rays nearest to one line that the others stop against: the thicker pair, then the lower id, where two pairs are. */
function findBar(rays: readonly Ray[]): Bar | null {
  let best: Bar | null = null;
  for (const [i, a] of rays.entries()) {
    for (const b of rays.slice(i + 1)) {
      const facing = dot(a.direction, b.direction);
      if (facing > BAR) continue;
      const bar: Bar = {
        pair: [a, b],
        // Within the tick's reach two pairs are equally straight.
        straight: facing < STRAIGHT ? -1 : facing,
        thickness: a.ready.thickness + b.ready.thickness,
        id: a.ready.run.id < b.ready.run.id ? a.ready.run.id : b.ready.run.id,
      };
      if (!best || isBetterBar(bar, best)) best = bar;
    }
  }
  return best;
}

function isBetterBar(a: Bar, b: Bar): boolean {
  if (a.straight !== b.straight) return a.straight < b.straight;
  return a.thickness !== b.thickness ? a.thickness > b.thickness : a.id < b.id;
}

function meetTwo(a: Ray, b: Ray): CornerMeeting {
  const ab = wedge(a, b);
  const ba = wedge(b, a);
  const angle = bodyAngle(a, b);
  const kind = dot(a.direction, b.direction) < STRAIGHT ? 'straight' : angle < 180 ? 'outside' : 'reentrant';
  const end = (ray: Ray, left: Vec, right: Vec): RayEnd => ({
    ray,
    left,
    right,
    middle: null,
    kind,
    clear: Math.max(0, dot(left, ray.direction), dot(right, ray.direction)),
  });
  return {
    kind,
    angle,
    ends: [end(a, ab.left, ba.right), end(b, ba.left, ab.right)],
    tooSharp: ab.tooSharp || ba.tooSharp,
  };
}

function meetMany(rays: readonly Ray[]): CornerMeeting {
  const bar = findBar(rays)?.pair ?? null;
  const lefts = new Map<Ray, Vec>();
  const rights = new Map<Ray, Vec>();
  let tooSharp = false;
  const join = (a: Ray, b: Ray): void => {
    const met = wedge(a, b);
    lefts.set(a, met.left);
    rights.set(b, met.right);
    tooSharp ||= met.tooSharp;
  };
  rays.forEach((ray, i) => join(ray, rays[(i + 1) % rays.length] ?? ray));
  if (bar) {
    // The bar goes through as if nothing stopped against it.
    join(bar[0], bar[1]);
    join(bar[1], bar[0]);
  }
  const corners = [...lefts.values()];
  const middle = bar ? null : scale(corners.reduce(add, { x: 0, y: 0 }), 1 / corners.length);
  const isBar = (ray: Ray): boolean => bar !== null && (ray === bar[0] || ray === bar[1]);
  const tee = rays.length === 3;
  const ends = rays.map((ray): RayEnd => {
    const left = lefts.get(ray) ?? squareLeft(ray);
    const right = rights.get(ray) ?? squareRight(ray);
    const reach = rays.flatMap((other) => {
      if (other === ray || (isBar(other) && isBar(ray))) return [];
      return [lefts.get(other), rights.get(other)].map((point) => (point ? dot(point, ray.direction) : 0));
    });
    return {
      ray,
      left,
      right,
      middle,
      kind: !tee ? 'cross' : isBar(ray) ? 'teeBar' : 'teeStem',
      clear: Math.max(0, dot(left, ray.direction), dot(right, ray.direction), ...reach),
    };
  });
  return { kind: tee ? 'tee' : 'cross', angle: null, ends, tooSharp };
}

/** How the rays at a corner meet; `rays` in the order of `sortRays`. */
export function meetAtCorner(rays: readonly Ray[]): CornerMeeting {
  const [a, b] = rays;
  if (!a) return { kind: 'alone', angle: null, ends: [], tooSharp: false };
  if (!b) {
    const end: RayEnd = { ray: a, left: squareLeft(a), right: squareRight(a), middle: null, kind: 'free', clear: 0 };
    return { kind: 'free', angle: null, ends: [end], tooSharp: false };
  }
  return rays.length === 2 ? meetTwo(a, b) : meetMany(rays);
}
