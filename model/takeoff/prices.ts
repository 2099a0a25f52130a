/** What the takeoff costs at the site's own prices: waste added, rounded up to whole packs. */
import type { Drawing } from '../drawing/schema';
import type { Takeoff } from './types';

/** What is bought. Units are bought by wall type, lintels by size, everything else in one kind. */
export type Bought = 'unit' | 'mortar' | 'concrete' | 'bar' | 'poleStock' | 'brace' | 'lineBlock' | 'line' | 'lintel';

/** How one kind is bought; the site's own, never a default of ours. */
export interface Price {
  /** Price of one pack in the smallest coin of the site's money, a whole number. */
  readonly perPack: number;
  /** How much is in a pack: a count, cubic millimetres for mortar and concrete, ticks for line. Above zero. */
  readonly pack: number;
  /** Percent added for breakage and loss before rounding up. */
  readonly waste: number;
}

export interface Prices {
  readonly units: Readonly<Record<string, Price>>;
  readonly kinds: Readonly<Partial<Record<Exclude<Bought, 'unit'>, Price>>>;
}

export interface CostLine {
  readonly kind: Bought;
  /** The wall type of units; null otherwise. */
  readonly wallTypeId: string | null;
  /** As the takeoff counts it, in the pack's measure. */
  readonly net: number;
  readonly withWaste: number;
  /** Whole packs; null where the site has no price for it. */
  readonly packs: number | null;
  /** Bought beyond what is needed, as a percent of the net: waste and the rest of the last pack. */
  readonly overPercent: number | null;
  readonly cost: number | null;
}

export interface Costs {
  readonly lines: readonly CostLine[];
  /** Of the lines that have a price. */
  readonly total: number;
  /** Lines that are wanted and have no price, so that the total is not taken for the whole. */
  readonly unpriced: number;
}

/** A part of a pack so small that it is what adding volumes left over, not something to buy a pack for. */
const HAIR = 1e-9;

function lineFor(kind: Bought, wallTypeId: string | null, net: number, price: Price | undefined): CostLine {
  if (!price || !(price.pack > 0))
    return { kind, wallTypeId, net, withWaste: net, packs: null, overPercent: null, cost: null };
  const withWaste = (net * (100 + price.waste)) / 100;
  const packs = Math.ceil(withWaste / price.pack - HAIR);
  const overPercent = net > 0 ? (100 * (packs * price.pack - net)) / net : 0;
  return { kind, wallTypeId, net, withWaste, packs, overPercent, cost: packs * price.perPack };
}

function unitsByWallType(drawing: Drawing, takeoff: Takeoff): Map<string, number> {
  const typeOf = new Map(drawing.runs.map((run) => [run.id, run.wallTypeId]));
  const units = new Map<string, number>(drawing.wallTypes.map((type) => [type.id, 0]));
  for (const { runId, count } of takeoff.unitsByRun) {
    const type = typeOf.get(runId);
    if (type !== undefined) units.set(type, (units.get(type) ?? 0) + count.total);
  }
  return units;
}

/**
 * The costs of a takeoff. A kind that the building does not need has no line. Each line is rounded up by itself, once:
 * all mortar is one kind, the bar of all beams is bought together by the stock length.
 */
export function priceTakeoff(drawing: Drawing, takeoff: Takeoff, prices: Prices): Costs {
  const { mortar, beams, poles, lintels } = takeoff;
  const wanted: readonly (readonly [Exclude<Bought, 'unit'>, number])[] = [
    ['mortar', mortar.bedding + mortar.bed + mortar.head],
    ['lintel', lintels.reduce((sum, lintel) => sum + lintel.count, 0)],
    ['concrete', beams.reduce((sum, beam) => sum + beam.concrete, 0)],
    ['bar', beams.reduce((sum, beam) => sum + beam.stock.reduce((count, plan) => count + plan.count, 0), 0)],
    ['poleStock', poles.stock.length],
    ['brace', poles.braces],
    ['line', poles.line],
    ['lineBlock', poles.lineBlocks],
  ];
  const lines = [
    ...[...unitsByWallType(drawing, takeoff)].map(([id, net]) => lineFor('unit', id, net, prices.units[id])),
    ...wanted.map(([kind, net]) => lineFor(kind, null, net, prices.kinds[kind])),
  ].filter((line) => line.net > 0);
  return {
    lines,
    total: lines.reduce((sum, line) => sum + (line.cost ?? 0), 0),
    unpriced: lines.filter((line) => line.cost === null).length,
  };
}
