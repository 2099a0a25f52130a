/** Braces for poles one after another, where there are too many ways to try them all: quick, clear, and often not the least. */
import { boxAround, boxOfSegment, inflate } from '../geometry/box';
import { gridOf } from '../geometry/grid';
import { bracesConflict, type BraceLine } from './clearance';
import { cheapestPair } from './pairs';
import type { Pair, PoleBraces } from './poleBraces';

/** Orders tried, each with the poles first that the last one left without braces. */
const ORDERS = 6;
/** Times that every pole may choose again among what the others leave. */
const PASSES = 2;

interface Neighbours {
  /** For each pole, the others whose braces can come near its own. */
  readonly poles: readonly (readonly number[])[];
  /** For each pole, the lines that stay. */
  readonly fixed: readonly (readonly BraceLine[])[];
}

function neighboursOf(poles: readonly PoleBraces[], fixed: readonly BraceLine[], clearance: number): Neighbours {
  const boxes = poles.map((pole) => boxAround(pole.at, pole.longestReach + clearance + 1));
  const grid = gridOf(boxes);
  const lines = gridOf(fixed.map((line) => inflate(boxOfSegment(line.from, line.foot), clearance)));
  return {
    poles: boxes.map((box, i) => grid.find(box).filter((j) => j !== i)),
    fixed: boxes.map((box) => lines.find(box).flatMap((n) => fixed[n] ?? [])),
  };
}

class Turns {
  readonly pairs: (Pair | null)[];

  constructor(
    private readonly poles: readonly PoleBraces[],
    private readonly neighbours: Neighbours,
    private readonly clearance: number,
  ) {
    this.pairs = poles.map(() => null);
  }

  private linesOf(i: number): BraceLine[] {
    const pole = this.poles[i];
    return pole ? (this.pairs[i]?.braces ?? []).map((brace) => ({ from: pole.at, foot: brace.foot })) : [];
  }

  /** The cheapest pair of a pole that keeps clear of the others as they stand, but for one. */
  cheapest(i: number, without = -1): Pair | null {
    const pole = this.poles[i];
    if (!pole) return null;
    const others = (this.neighbours.poles[i] ?? []).flatMap((j) => (j === without ? [] : this.linesOf(j)));
    const lines = [...others, ...(this.neighbours.fixed[i] ?? [])];
    if (lines.length === 0) return pole.own();
    return cheapestPair(pole, (candidate) => {
      const line = { from: pole.at, foot: candidate.foot };
      return lines.some((other) => bracesConflict(line, other, this.clearance));
    });
  }

  /** Gives a pole without braces its own by letting one neighbour that is in its way choose again. */
  makeRoom(i: number): boolean {
    for (const j of this.neighbours.poles[i] ?? []) {
      const before = this.pairs[j] ?? null;
      const own = before && this.cheapest(i, j);
      if (!own) continue;
      this.pairs[i] = own;
      this.pairs[j] = null;
      this.pairs[j] = this.cheapest(j);
      if (this.pairs[j]) return true;
      this.pairs[i] = null;
      this.pairs[j] = before;
    }
    return false;
  }

  get left(): readonly number[] {
    return this.pairs.flatMap((pair, i) => (pair === null && this.poles[i]?.own() ? [i] : []));
  }

  get cost(): number {
    return this.pairs.reduce((sum, pair) => sum + (pair?.cost ?? 0), 0);
  }
}

/** Pairs for poles in turn, each the cheapest that keeps clear of `fixed` and of the others; null where none does. */
export function placeInTurn(
  poles: readonly PoleBraces[],
  fixed: readonly BraceLine[],
  clearance: number,
): readonly (Pair | null)[] {
  const neighbours = neighboursOf(poles, fixed, clearance);
  let order = poles.map((_, i) => i);
  let best: Turns | null = null;
  for (let round = 0; round < ORDERS; round += 1) {
    const turns: Turns = new Turns(poles, neighbours, clearance);
    for (const i of order) turns.pairs[i] = turns.cheapest(i);
    for (const i of turns.left) turns.makeRoom(i);
    const [left, leastLeft] = [turns.left, best?.left.length ?? Infinity];
    if (left.length < leastLeft || (left.length === leastLeft && turns.cost < (best?.cost ?? 0))) best = turns;
    if (left.length === 0) break;
    order = [...left, ...order.filter((i) => !left.includes(i))];
  }
  for (let pass = 0; best && pass < PASSES; pass += 1)
    for (const i of order) {
      const pair = best.cheapest(i);
      if (pair && pair.cost < (best.pairs[i]?.cost ?? Infinity)) best.pairs[i] = pair;
    }
  return best?.pairs ?? [];
}
