/** An independent look at a figure's texts: the boxes they cover, worked out here and overlapped by a geometry library. */
import Coordinate from 'jsts/org/locationtech/jts/geom/Coordinate.js';
import GeometryFactory from 'jsts/org/locationtech/jts/geom/GeometryFactory.js';
import OverlayOp from 'jsts/org/locationtech/jts/operation/overlay/OverlayOp.js';
import type { Figure, LabelScale } from '../../../model/figures/figure';
import type { Vec } from '../../../model/geometry/point';

const factory = new GeometryFactory();

function polygon(points: readonly Vec[]) {
  const ring = [...points, points[0]].map((point) => new Coordinate(point?.x, point?.y));
  return factory.createPolygon(ring);
}

/** Area that two convex or simple shapes share, in square ticks. */
export function sharedArea(a: readonly Vec[], b: readonly Vec[]): number {
  return OverlayOp.intersection(polygon(a), polygon(b)).getArea();
}

export interface CoveredText {
  readonly what: string;
  readonly points: readonly Vec[];
}

function box(at: Vec, width: number, height: number, turn: number): Vec[] {
  const angle = (turn * Math.PI) / 180;
  const along = { x: Math.cos(angle), y: Math.sin(angle) };
  const up = { x: -along.y, y: along.x };
  return (
    [
      [-1, -1],
      [1, -1],
      [1, 1],
      [-1, 1],
    ] as const
  ).map(([i, j]) => ({
    x: at.x + (along.x * i * width) / 2 + (up.x * j * height) / 2,
    y: at.y + (along.y * i * width) / 2 + (up.y * j * height) / 2,
  }));
}

/** What every text in the figure covers at least: letters in their frames, dimensions at five characters. */
export function coveredTexts(figure: Figure, scale: LabelScale): CoveredText[] {
  return figure.shapes.flatMap((shape): CoveredText[] => {
    if (shape.kind === 'dimension') {
      const height = scale.textHeight.dimension;
      return [
        {
          what: `dimension ${shape.length}`,
          points: box(shape.textAt, 4 * scale.advance * height, height, shape.turn),
        },
      ];
    }
    if (shape.kind !== 'text' || shape.anchor !== 'middle') return [];
    const letters = shape.text.kind === 'literal' ? shape.text.text.length : 4;
    const height = scale.textHeight[shape.size];
    const grow = shape.framed ? 1.45 : 1;
    const width = Math.max(letters * scale.advance * height, shape.framed ? height * 1.45 : 0);
    return [{ what: `text ${JSON.stringify(shape.text)}`, points: box(shape.at, width, height * grow, shape.turn) }];
  });
}
