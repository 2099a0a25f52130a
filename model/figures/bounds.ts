/** The box around shapes, and around anything placed beside them. */
import { ticks } from '../length/ticks';
import type { Vec } from '../geometry/point';
import type { Box, LabelScale, Shape, Tape } from './figure';
import { dimensionQuad, textQuad } from './text';

interface BoundsMaker {
  add(point: Vec): void;
  addAll(points: readonly Vec[]): void;
  /** The box, grown by `margin`; a box of `margin` around the origin where nothing was added. */
  box(margin: number): Box;
}

function makeBounds(): BoundsMaker {
  let left = Infinity;
  let bottom = Infinity;
  let right = -Infinity;
  let top = -Infinity;
  function add(point: Vec): void {
    if (point.x < left) left = point.x;
    if (point.x > right) right = point.x;
    if (point.y < bottom) bottom = point.y;
    if (point.y > top) top = point.y;
  }
  return {
    add,
    addAll(points) {
      for (const point of points) add(point);
    },
    box(margin) {
      if (left > right) {
        left = bottom = right = top = 0;
      }
      return {
        left: ticks(Math.floor(left - margin)),
        bottom: ticks(Math.floor(bottom - margin)),
        right: ticks(Math.ceil(right + margin)),
        top: ticks(Math.ceil(top + margin)),
      };
    },
  };
}

/** The box around every shape, texts and dimensions at their size in this scale included. */
export function boundsOf(shapes: readonly Shape[], scale: LabelScale, tape: Tape): Box {
  const bounds = makeBounds();
  for (const shape of shapes) {
    switch (shape.kind) {
      case 'polygon':
        bounds.addAll(shape.points);
        break;
      case 'lines':
        for (const line of shape.lines) bounds.addAll(line);
        break;
      case 'boxes':
        for (const [x, y, width, height] of shape.boxes) {
          bounds.add({ x, y });
          bounds.add({ x: x + width, y: y + height });
        }
        break;
      case 'arc': {
        const sweep = (((shape.to - shape.from) % 360) + 360) % 360;
        for (let part = 0; part <= 8; part += 1) {
          const angle = ((shape.from + (sweep * part) / 8) * Math.PI) / 180;
          bounds.add({
            x: shape.centre.x + shape.radius * Math.cos(angle),
            y: shape.centre.y + shape.radius * Math.sin(angle),
          });
        }
        break;
      }
      case 'dot': {
        const radius = scale.textHeight.small * (shape.size === 'large' ? 0.6 : 0.4);
        bounds.add({ x: shape.at.x - radius, y: shape.at.y - radius });
        bounds.add({ x: shape.at.x + radius, y: shape.at.y + radius });
        break;
      }
      case 'text':
        bounds.addAll(textQuad(shape, scale, tape));
        break;
      case 'dimension':
        bounds.add(shape.from);
        bounds.add(shape.to);
        bounds.addAll(dimensionQuad(shape, scale, tape));
        break;
    }
  }
  return bounds.box(0);
}
