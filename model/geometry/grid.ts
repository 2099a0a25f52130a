/** A uniform grid over boxes: finds what lies near a place in time that does not grow with the whole building. */
import { joinBoxes, type Box } from './box';

export interface Grid {
  /** Indices of the boxes that meet `box`, each once, in rising order. */
  readonly find: (box: Box) => readonly number[];
}

interface Cells {
  readonly box: Box;
  readonly size: number;
  readonly columns: number;
  readonly rows: number;
}

/** About one cell for each box, square, and never so many in a row that a long thin building costs more than its length. */
function planCells(boxes: readonly Box[]): Cells | null {
  const first = boxes[0];
  if (!first) return null;
  let box = first;
  for (const other of boxes) box = joinBoxes(box, other);
  const width = box.maxX - box.minX;
  const height = box.maxY - box.minY;
  const size = Math.max(Math.sqrt((width * height) / boxes.length), Math.max(width, height) / (2 * boxes.length), 1);
  return { box, size, columns: Math.floor(width / size) + 1, rows: Math.floor(height / size) + 1 };
}

/** Builds the grid once; `find` then answers for any box. */
export function gridOf(boxes: readonly Box[]): Grid {
  const cells = planCells(boxes);
  if (!cells) return { find: () => [] };
  const { size, columns, rows } = cells;
  const column = (x: number): number => Math.min(columns - 1, Math.max(0, Math.floor((x - cells.box.minX) / size)));
  const row = (y: number): number => Math.min(rows - 1, Math.max(0, Math.floor((y - cells.box.minY) / size)));

  const visit = (box: Box, cell: (index: number) => void): void => {
    const lastColumn = column(box.maxX);
    const lastRow = row(box.maxY);
    for (let r = row(box.minY); r <= lastRow; r++) {
      for (let c = column(box.minX); c <= lastColumn; c++) cell(r * columns + c);
    }
  };

  // Cells' members one after another in one array; starts[i] to starts[i + 1] are those of cell i.
  const starts = new Uint32Array(columns * rows + 1);
  for (const box of boxes) visit(box, (i) => (starts[i + 1] = (starts[i + 1] ?? 0) + 1));
  for (let i = 1; i < starts.length; i++) starts[i] = (starts[i] ?? 0) + (starts[i - 1] ?? 0);
  const members = new Uint32Array(starts[starts.length - 1] ?? 0);
  const filled = starts.slice();
  boxes.forEach((box, index) =>
    visit(box, (i) => {
      const slot = filled[i] ?? 0;
      members[slot] = index;
      filled[i] = slot + 1;
    }),
  );

  const stamps = new Uint32Array(boxes.length);
  let stamp = 0;
  const find = (box: Box): readonly number[] => {
    const { minX, minY, maxX, maxY } = cells.box;
    if (box.minX > maxX || box.maxX < minX || box.minY > maxY || box.maxY < minY) return [];
    stamp = stamp === 0xffffffff ? 1 : stamp + 1;
    if (stamp === 1) stamps.fill(0);
    const found: number[] = [];
    visit(box, (i) => {
      const end = starts[i + 1] ?? 0;
      for (let slot = starts[i] ?? 0; slot < end; slot++) {
        const index = members[slot] ?? 0;
        if (stamps[index] === stamp) continue;
        stamps[index] = stamp;
        const other = boxes[index];
        if (
          other &&
          other.minX <= box.maxX &&
          box.minX <= other.maxX &&
          other.minY <= box.maxY &&
          box.minY <= other.maxY
        )
          found.push(index);
      }
    });
    return found.sort((a, b) => a - b);
  };
  return { find };
}
