import { roundTicks, type Ticks } from '../length/ticks';

/**
 * How far a rectangle leans: its far side lies this much along the side `along`, positive where the first diagonal is
 * the longer. From (l + s)² + w² and (l − s)² + w² the diagonals' squares differ by 4 l s (Pythagoras), for a figure whose
 * opposite sides are alike. Zero for a side of no length.
 */
export function rectangleLean(along: Ticks, diagonal: Ticks, other: Ticks): Ticks {
  return along === 0 ? roundTicks(0) : roundTicks(((diagonal - other) * (diagonal + other)) / (4 * along));
}
