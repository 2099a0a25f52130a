/**
 * Placing of labels by a search, not by a rule. Each label brings the places where it could stand, each with what that
 * place costs by itself; overlapping the drawing costs more, and overlapping another label is refused. Labels take
 * their best place in order of priority, then each is moved, the others standing, while that makes the whole cheaper.
 * The same input gives the same places. The work grows with the number of labels, by an index of cells.
 */
import type { Vec } from '../geometry/point';
import { overlapDepth } from '../geometry/polygon';
import { between } from '../geometry/vec';
import type { Box, Shape } from './figure';
import { CellIndex } from './cells';

/** Something drawn that a label should not cover; convex. */
export interface Obstacle {
  readonly points: readonly Vec[];
  readonly weight: number;
}

export interface Place {
  /** What the text covers, its clear space included. */
  readonly quad: readonly Vec[];
  /** Lines that come with it (a dimension's), kept off other labels, and at a lower price off the drawing. */
  readonly lines: readonly (readonly [Vec, Vec])[];
  readonly cost: number;
  readonly shapes: readonly Shape[];
}

export interface Label {
  /** Lower goes first. */
  readonly priority: number;
  readonly anchor: Vec;
  readonly places: readonly Place[];
  /** Above this cost it is left out. */
  readonly most: number;
}

export interface LabelField {
  readonly obstacles: readonly Obstacle[];
  /** Height of a label's text, in ticks: overlaps are measured by it. */
  readonly height: number;
  /** Labels whose anchor is inside stay inside. */
  readonly within: Box | null;
}

const LABEL_ON_LABEL = 1000;
const LINE_ON_LABEL = 40;
const LEAVES = 60;
const LINE_PART = 0.25;
const SWEEPS = 3;
/** Obstacles longer than this many cells are indexed in pieces. */
const PIECE_CELLS = 6;

interface Standing {
  readonly quad: readonly Vec[];
  readonly lines: readonly (readonly [Vec, Vec])[];
}

function holds(box: Box, point: Vec): boolean {
  return point.x >= box.left && point.x <= box.right && point.y >= box.bottom && point.y <= box.top;
}

/** A long obstacle in short pieces: a segment's or a four-sided strip's, so that a slanting one fills few cells. */
function piecesOf(obstacle: Obstacle, most: number): Obstacle[] {
  const [a, b, c, d] = obstacle.points;
  if (!a || !b) return [];
  const length = Math.hypot(b.x - a.x, b.y - a.y);
  const count = Math.ceil(length / most);
  if (!(count > 1) || (obstacle.points.length !== 2 && obstacle.points.length !== 4)) return [obstacle];
  return Array.from({ length: count }, (_, i) => {
    const [from, to] = [i / count, (i + 1) / count];
    const points =
      c && d
        ? [between(a, b, from), between(a, b, to), between(d, c, to), between(d, c, from)]
        : [between(a, b, from), between(a, b, to)];
    return { points, weight: obstacle.weight };
  });
}

/** One place chosen for each label, in the labels' order; null for those left out. */
export function placeLabels(labels: readonly Label[], field: LabelField): (Place | null)[] {
  const cell = Math.max(field.height * 3, spreadOf(labels, field) / 512, 1);
  const drawn = new CellIndex<Obstacle>(cell);
  for (const obstacle of field.obstacles)
    for (const piece of piecesOf(obstacle, cell * PIECE_CELLS)) drawn.add(piece.points, piece);
  const standing = new CellIndex<Standing>(cell);

  /** What covering the drawing costs; once it is over `most` it is no matter by how much. */
  function priceOf(part: readonly Vec[], factor: number, most: number): number {
    let price = 0;
    for (const obstacle of drawn.near(part)) {
      const depth = overlapDepth(part, obstacle.points);
      if (depth > 0) price += obstacle.weight * factor * (0.4 + 0.6 * Math.min(1, depth / field.height));
      if (price > most) break;
    }
    return price;
  }
  // What the drawing itself costs a place never changes: it is worked out once, as far as it was asked for.
  const fixedPrices = new Map<Place, { readonly price: number; readonly whole: boolean }>();
  function fixedPriceOf(label: Label, place: Place, most: number): number {
    const known = fixedPrices.get(place);
    if (known && (known.whole || known.price > most)) return known.price;
    let price = place.cost;
    const box = field.within;
    if (box && holds(box, label.anchor)) for (const point of place.quad) if (!holds(box, point)) price += LEAVES;
    price += priceOf(place.quad, 1, most - price);
    for (const line of place.lines) if (price <= most) price += priceOf(line, LINE_PART, most - price);
    fixedPrices.set(place, { price, whole: price <= most });
    return price;
  }
  function priceAmongLabels(place: Place): number {
    let price = 0;
    for (const other of standing.near(place.quad)) {
      if (overlapDepth(place.quad, other.quad) > 0) return LABEL_ON_LABEL;
      for (const line of other.lines) if (overlapDepth(place.quad, line) > 0) price += LINE_ON_LABEL;
    }
    for (const line of place.lines)
      for (const other of standing.near(line)) if (overlapDepth(line, other.quad) > 0) price += LINE_ON_LABEL;
    return price;
  }
  function bestOf(label: Label): Place | null {
    let best: Place | null = null;
    let least = Math.min(label.most, LABEL_ON_LABEL);
    for (const place of label.places) {
      if (place.cost >= least) continue;
      const fixed = fixedPriceOf(label, place, least);
      if (fixed >= least) continue;
      const price = fixed + priceAmongLabels(place);
      if (price < least) {
        least = price;
        best = place;
      }
    }
    return best;
  }
  function stand(place: Place): void {
    standing.add(place.quad, place);
    for (const line of place.lines) for (const piece of cutLine(line, cell * PIECE_CELLS)) standing.add(piece, place);
  }
  function lift(place: Place): void {
    standing.remove(place.quad, place);
    for (const line of place.lines)
      for (const piece of cutLine(line, cell * PIECE_CELLS)) standing.remove(piece, place);
  }

  const order = labels
    .map((_, i) => i)
    .sort((a, b) => (labels[a]?.priority ?? 0) - (labels[b]?.priority ?? 0) || a - b);
  const chosen: (Place | null)[] = labels.map(() => null);
  for (let sweep = 0; sweep < SWEEPS; sweep += 1) {
    let moved = false;
    for (const i of order) {
      const label = labels[i];
      if (!label) continue;
      const before = chosen[i] ?? null;
      if (before) lift(before);
      const place = bestOf(label);
      if (place) stand(place);
      if (place !== before) moved = true;
      chosen[i] = place;
    }
    if (!moved) break;
  }
  return chosen;
}

function cutLine(line: readonly [Vec, Vec], most: number): (readonly Vec[])[] {
  return piecesOf({ points: line, weight: 0 }, most).map((piece) => piece.points);
}

/** The larger side of the box around everything, so that cells stay few however small the text. */
function spreadOf(labels: readonly Label[], field: LabelField): number {
  let [left, right, bottom, top] = [Infinity, -Infinity, Infinity, -Infinity];
  const take = (point: Vec) => {
    left = Math.min(left, point.x);
    right = Math.max(right, point.x);
    bottom = Math.min(bottom, point.y);
    top = Math.max(top, point.y);
  };
  for (const label of labels) take(label.anchor);
  for (const obstacle of field.obstacles) obstacle.points.forEach(take);
  return left > right ? 0 : Math.max(right - left, top - bottom);
}
