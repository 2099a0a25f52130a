/** Poles and their braces in plan. */
import type { PlanPoint } from '../geometry/point';
import { roundTicks } from '../length/ticks';
import type { StoryPole } from '../poles/types';
import type { Emphasis } from './figure';
import type { PlanContext } from './planContext';

/** A pole's leg is never drawn shorter than this part of a small text's height. */
const LEAST_LEG = 0.85;

/** The section, grown about its heel until it can be seen at this scale. */
function readableSection(context: PlanContext, pole: StoryPole): PlanPoint[] {
  const least = context.options.scale.textHeight.small * LEAST_LEG;
  const grow = Math.max(1, least / Math.max(1, context.drawing.poleKit.leg));
  return pole.section.map((point) => ({
    x: roundTicks(pole.at.x + (point.x - pole.at.x) * grow),
    y: roundTicks(pole.at.y + (point.y - pole.at.y) * grow),
  }));
}

/** A pole is selected by itself, by its corner, or by one of its braces. */
function emphasisOfPole(context: PlanContext, pole: StoryPole): Emphasis {
  const { selection } = context.options;
  if (selection?.kind === 'corner' && selection.id === pole.cornerId) return 'selected';
  if (selection?.kind === 'brace' && pole.braces.some((brace) => brace.id === selection.id)) return 'selected';
  return context.emphasisOf('pole', pole.id);
}

export function drawPoles(context: PlanContext): void {
  const { poles } = context.setOut.poles;
  const { small } = context.options.scale.textHeight;
  const emphases = new Map(poles.map((pole) => [pole.id, emphasisOfPole(context, pole)]));
  for (const pole of poles) {
    for (const brace of pole.braces) {
      const own = context.emphasisOf('brace', brace.id);
      const whole = emphases.get(pole.id) ?? 'plain';
      const emphasis = own === 'plain' ? whole : own;
      const thing = { kind: 'brace', id: brace.id } as const;
      context.shapes.push({ kind: 'lines', role: 'brace', thing, emphasis, lines: [[pole.at, brace.foot]] });
      context.obstacles.push({ points: [pole.at, brace.foot], weight: 9 });
    }
  }
  for (const pole of poles) {
    const emphasis = emphases.get(pole.id) ?? 'plain';
    for (const brace of pole.braces) {
      const size = emphasis === 'selected' ? 'large' : 'small';
      const thing = { kind: 'brace', id: brace.id } as const;
      const braceEmphasis = context.emphasisOf('brace', brace.id);
      context.shapes.push({
        kind: 'dot',
        role: 'foot',
        thing,
        emphasis: braceEmphasis === 'plain' ? emphasis : braceEmphasis,
        at: brace.foot,
        size,
      });
      context.obstacles.push({ points: squareAround(brace.foot, small * 0.6), weight: 14 });
    }
    const points = readableSection(context, pole);
    const thing = { kind: 'pole', id: pole.id } as const;
    if (points.length >= 3) context.shapes.push({ kind: 'polygon', role: 'pole', thing, emphasis, points });
    context.obstacles.push({ points: squareAround(pole.at, small * 0.6), weight: 14 });
  }
}

function squareAround(at: PlanPoint, half: number): { x: number; y: number }[] {
  return [
    { x: at.x - half, y: at.y - half },
    { x: at.x + half, y: at.y - half },
    { x: at.x + half, y: at.y + half },
    { x: at.x - half, y: at.y + half },
  ];
}
