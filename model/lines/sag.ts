import { roundTicks, TICKS_PER_MM, type Ticks } from '../length/ticks';

const TICKS_PER_METRE = 1000 * TICKS_PER_MM;

/**
 * Sag of a taut line at mid-span, in ticks as a float: s = w L² / (8 T), the parabola of statics for a line pulled far
 * harder than it weighs. `weight` in millinewtons per metre, `pull` in newtons (above zero), `span` in ticks.
 */
export function sagExact(span: number, weight: number, pull: number): number {
  const metres = span / TICKS_PER_METRE;
  return ((weight / 1000) * metres * metres * TICKS_PER_METRE) / (8 * pull);
}

/** The pull, in newtons, that holds the sag to `sag` without a trig: T = w L² / (8 s). Null where no pull does: a sag of nothing. */
export function pullFor(span: number, weight: number, sag: number): number | null {
  return sag > 0 ? sagExact(span, weight, 1) / sag : null;
}

/** The sag, rounded once to ticks. */
export function sagOf(span: Ticks, weight: number, pull: number): Ticks {
  return roundTicks(sagExact(span, weight, pull));
}
