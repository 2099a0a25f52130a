/** The plan as bare lines, for the small picture of a site. */
import type { PlanPoint } from '../geometry/point';
import type { Drawing } from './schema';

/**
 * Lines from corner to corner that together show every wall run once, as few as a simple walk makes. A closed outline
 * ends on the point that it starts from.
 */
export function drawingOutlines(drawing: Drawing): PlanPoint[][] {
  const places = new Map(drawing.corners.map(({ id, x, y }) => [id, { x, y }]));
  const ends = new Map<string, { readonly to: string; readonly run: number }[]>();
  const open = (from: string, to: string, run: number): void => {
    const list = ends.get(from);
    if (list) list.push({ to, run });
    else ends.set(from, [{ to, run }]);
  };
  drawing.runs.forEach((run, i) => {
    open(run.from, run.to, i);
    open(run.to, run.from, i);
  });
  const drawn = new Set<number>();
  const walk = (start: string): PlanPoint[] => {
    const line: PlanPoint[] = [];
    let at = start;
    for (;;) {
      const place = places.get(at);
      if (place) line.push(place);
      const list = ends.get(at) ?? [];
      let next = list.pop();
      while (next && drawn.has(next.run)) next = list.pop();
      if (!next) return line;
      drawn.add(next.run);
      at = next.to;
    }
  };
  // Lines start from loose ends and tees, so that what is left is closed.
  const odd = drawing.corners.filter((corner) => (ends.get(corner.id)?.length ?? 0) % 2 === 1);
  const starts = [...odd, ...drawing.corners].map((corner) => corner.id);
  const lines: PlanPoint[][] = [];
  for (const start of starts) {
    let line = walk(start);
    while (line.length > 1) {
      lines.push(line);
      line = walk(start);
    }
  }
  return lines;
}
