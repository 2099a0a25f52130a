/** Buildings for the figures' tests: corners in feet, runs round them, openings by run. */
import { defaultTapeStep, newDrawing, newOpening, type OpeningKind } from '../../../model/drawing/defaults';
import { letterAt } from '../../../model/drawing/letters';
import { drawingSchema, type Drawing, type Opening, type Units } from '../../../model/drawing/schema';
import { EMPTY_SURVEY, surveySchema, type Survey } from '../../../model/drawing/surveySchema';
import { feet, inches, mm, type Ticks } from '../../../model/length/ticks';

export interface SceneOpening {
  readonly run: number;
  readonly kind: OpeningKind;
  readonly at: Ticks;
  readonly change?: Partial<Omit<Extract<Opening, { kind: 'door' }>, 'kind'>>;
}

/** A loop (or, open, a chain) of runs through the points. */
export function loopOf(
  points: readonly (readonly [Ticks, Ticks])[],
  openings: readonly SceneOpening[] = [],
  { units = 'imperial', open = false }: { units?: Units; open?: boolean } = {},
): Drawing {
  const drawing = newDrawing(units);
  const corners = points.map(([x, y], i) => ({ id: `c${i}`, letter: letterAt(i), x, y }));
  const count = open ? points.length - 1 : points.length;
  const runs = Array.from({ length: count }, (_, i) => ({
    id: `r${i}`,
    from: `c${i}`,
    to: `c${(i + 1) % points.length}`,
    wallTypeId: 'wall',
  }));
  return drawingSchema.parse({
    ...drawing,
    tapeStep: defaultTapeStep(units),
    corners,
    runs,
    openings: openings.map((opening, i) => ({
      ...newOpening(units, opening.kind, { id: `o${i}`, runId: `r${opening.run}`, at: opening.at }),
      ...opening.change,
    })),
  });
}

/**
 * ```
 * F──────E
 * │      │   ┌ 24 × 18 ft, a door at A and one beside D,
 * │      D───C   windows in three walls
 * │          │
 * A──────────B
 * ```
 */
export function toolStore(): Drawing {
  return loopOf(
    [
      [feet(0), feet(0)],
      [feet(24), feet(0)],
      [feet(24), feet(12)],
      [feet(14), feet(12)],
      [feet(14), feet(18)],
      [feet(0), feet(18)],
    ],
    [
      { run: 0, kind: 'door', at: inches(18) },
      { run: 0, kind: 'window', at: feet(13) },
      { run: 1, kind: 'window', at: feet(4, 6) },
      { run: 2, kind: 'door', at: feet(3, 6) },
      { run: 4, kind: 'window', at: feet(5, 6) },
      { run: 5, kind: 'window', at: feet(8) },
    ],
  );
}

export function slantedStudio(): Drawing {
  return loopOf(
    [
      [mm(0), mm(0)],
      [mm(6000), mm(1500)],
      [mm(4500), mm(6200)],
      [mm(-1500), mm(4700)],
    ],
    [
      { run: 0, kind: 'door', at: mm(2500) },
      { run: 2, kind: 'window', at: mm(2000) },
      { run: 3, kind: 'passage', at: mm(1500) },
    ],
    { units: 'metric' },
  );
}

/** Two walls meeting at a corner, both ends free. */
export function yardWall(): Drawing {
  return loopOf(
    [
      [feet(0), feet(10)],
      [feet(0), feet(0)],
      [feet(16), feet(0)],
    ],
    [],
    { open: true },
  );
}

/** A row of rectangular rooms, `count` of them, 2 ft apart: a building of 4 × count runs. */
export function rowOfRooms(count: number): Drawing {
  const single = loopOf([]);
  const corners: Drawing['corners'] = [];
  const runs: Drawing['runs'] = [];
  for (let room = 0; room < count; room += 1) {
    const x = feet(room * 18);
    (
      [
        [0, 0],
        [16, 0],
        [16, 12],
        [0, 12],
      ] as const
    ).forEach(([dx, dy], i) => {
      const place = room * 4 + i;
      corners.push({ id: `c${place}`, letter: letterAt(place), x: (x + feet(dx)) as Ticks, y: feet(dy) });
      runs.push({ id: `r${place}`, from: `c${place}`, to: `c${room * 4 + ((i + 1) % 4)}`, wallTypeId: 'wall' });
    });
  }
  return { ...single, corners, runs };
}

/** Readings at the corners, in eighths of an inch below 48 in. */
export function readingsAt(drawing: Drawing, eighths: readonly number[]): Survey {
  return surveySchema.parse({
    ...EMPTY_SURVEY,
    readings: drawing.corners.slice(0, eighths.length).map((corner, i) => ({
      id: `s${i}`,
      station: { kind: 'corner', cornerId: corner.id },
      down: inches(48 + (eighths[i] ?? 0) / 8),
    })),
  });
}
