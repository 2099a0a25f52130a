/** SVG path data of figure shapes, in pixels from the figure's own origin, y down. */
import type { Shape } from '../../model/figures/figure';
import type { Vec } from '../../model/geometry/point';

const at = (value: number) => Math.round(value * 100) / 100;

function polyline(points: readonly Vec[], scale: number): string {
  return points.map((point, i) => `${i === 0 ? 'M' : 'L'}${at(point.x * scale)} ${at(-point.y * scale)}`).join('');
}

/** The path of everything that is outline: polygons, lines, boxes, arcs. Texts, dots and dimensions have none. */
export function pathOf(shape: Shape, scale: number): string | null {
  switch (shape.kind) {
    case 'polygon':
      return `${polyline(shape.points, scale)}Z`;
    case 'lines':
      return shape.lines.map((line) => polyline(line, scale)).join('');
    case 'boxes':
      return shape.boxes
        .map(([x, y, width, height]) => {
          const top = at(-(y + height) * scale);
          return `M${at(x * scale)} ${top}h${at(width * scale)}v${at(height * scale)}h${at(-width * scale)}Z`;
        })
        .join('');
    case 'arc': {
      const point = (degrees: number) => ({
        x: shape.centre.x + shape.radius * Math.cos((degrees * Math.PI) / 180),
        y: shape.centre.y + shape.radius * Math.sin((degrees * Math.PI) / 180),
      });
      const sweep = (((shape.to - shape.from) % 360) + 360) % 360;
      const radius = at(shape.radius * scale);
      const end = point(shape.to);
      // Counter-clockwise with y up is the negative sweep of SVG, whose y points down.
      return `${polyline([point(shape.from)], scale)}A${radius} ${radius} 0 ${sweep > 180 ? 1 : 0} 0 ${at(end.x * scale)} ${at(-end.y * scale)}`;
    }
    default:
      return null;
  }
}
