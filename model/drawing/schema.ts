/** The drawing as it is saved and sent: every field, its limits, and the integrity that a contract can hold. */
import { z } from 'zod';
import { TICKS_PER_MM, type Ticks } from '../length/ticks';
import type { PlanPoint } from '../geometry/point';
import { RULE_IDS, type RuleId } from '../rules/ids';

/** Coordinates and lengths stay within 2 km of the origin. */
export const MAX_COORDINATE = 2_000_000 * TICKS_PER_MM;
const MAX_SIZE = 200_000 * TICKS_PER_MM;

const whole = (least: number, most: number) => z.number().int().min(least).max(most) as unknown as z.ZodType<Ticks>;

export const ticksSchema = whole(-MAX_COORDINATE, MAX_COORDINATE);
/** A size: zero or more, 200 m at most. */
export const sizeSchema = whole(0, MAX_SIZE);
/** A size above zero, 200 m at most. */
export const positiveSizeSchema = whole(1, MAX_SIZE);
export const idSchema = z.string().regex(/^[A-Za-z0-9_-]{1,40}$/, 'an id has 1 to 40 letters, digits, - or _');
const nameSchema = z.string().trim().max(80);

export const planPointSchema: z.ZodType<PlanPoint> = z.strictObject({ x: ticksSchema, y: ticksSchema });

export const unitsSchema = z.enum(['imperial', 'metric']);

/** How a unit lies in the wall: along it, or across it. */
export const laidSchema = z.enum(['stretcher', 'header']);

const jointSchema = z
  .strictObject({ nominal: sizeSchema, least: sizeSchema, most: sizeSchema })
  .refine((j) => j.least <= j.nominal && j.nominal <= j.most, 'a joint needs least ≤ nominal ≤ most');

export const wallTypeSchema = z.strictObject({
  id: idSchema,
  name: nameSchema,
  unitName: nameSchema,
  mortarName: nameSchema,
  unit: z.strictObject({ length: positiveSizeSchema, width: positiveSizeSchema, height: positiveSizeSchema }),
  laid: laidSchema,
  headJoint: jointSchema,
  bedJoint: jointSchema,
  /** Mortar under the first course. */
  bedding: z
    .strictObject({ least: sizeSchema, most: sizeSchema })
    .refine((b) => b.least <= b.most, 'bedding needs least ≤ most'),
  /**
   * A thinner course, where the site allows one to each height that courses must meet: the least and most height of its
   * unit. Alike for a split unit that comes in one height, apart where units are ripped to fit. Absent: every course is whole.
   */
  thinCourse: z
    .strictObject({ least: positiveSizeSchema, most: positiveSizeSchema })
    .refine((thin) => thin.least <= thin.most, 'a thinner course needs least ≤ most')
    .optional(),
  /** Height of the first course's units, where they are others than the rest. */
  firstCourse: z.strictObject({ height: positiveSizeSchema }).optional(),
  /** Offset of each course over the one below, as a part of the unit's module. */
  bondOffset: z.enum(['half', 'third', 'quarter']),
  /** Least lap of a unit over the one below. */
  leastLap: sizeSchema,
  /** Shortest piece that may be laid. */
  leastPiece: sizeSchema,
});

export const cornerSchema = z.strictObject({
  id: idSchema,
  /** A, B, … Z, AA: stays with the corner for its life. */
  letter: z.string().regex(/^[A-Z]{1,3}$/, 'a corner is lettered A, B, C …'),
  x: ticksSchema,
  y: ticksSchema,
});

export const wallRunSchema = z.strictObject({ id: idSchema, from: idSchema, to: idSchema, wallTypeId: idSchema });

/** Room to keep free on both sides of a way through, while the work goes on. */
export const waySchema = z.strictObject({ used: z.boolean(), width: sizeSchema, depth: sizeSchema });
export const swingSchema = z.strictObject({
  /** Which jamb carries the hinges: the one nearer the run's first corner, or the far one. */
  hinge: z.enum(['near', 'far']),
  opens: z.enum(['in', 'out']),
});

const openingBase = {
  id: idSchema,
  runId: idSchema,
  /** Along the outside face from the run's first corner to the near jamb (masonry to masonry). */
  at: ticksSchema,
  /** Masonry opening, frame included. */
  width: positiveSizeSchema,
  /** Height of the masonry sill above the high point; 0 for a door. */
  sill: sizeSchema,
  /** Height of the top of the frame above the high point: the lintel's seat. */
  head: sizeSchema,
  frame: sizeSchema,
  lintel: z.strictObject({ depth: sizeSchema, bearing: sizeSchema }),
};
export const openingSchema = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('door'), ...openingBase, swing: swingSchema, way: waySchema }),
  z.strictObject({ kind: z.literal('window'), ...openingBase }),
  z.strictObject({ kind: z.literal('passage'), ...openingBase, way: waySchema }),
]);

export const keepClearSchema = z.strictObject({
  id: idSchema,
  name: nameSchema,
  points: z.array(planPointSchema).min(3).max(200),
});

/** A height that the course lines must meet. Openings bring their own sill and head; these are the others. */
export const controlHeightSchema = z.strictObject({
  id: idSchema,
  kind: z.enum(['sill', 'head', 'plate', 'named']),
  name: nameSchema,
  /** Above the high point of the foundation. */
  height: positiveSizeSchema,
  tolerance: sizeSchema,
  hold: z.enum(['hard', 'soft']),
  /** How much a miss of this height weighs against the others, when soft. */
  weight: z.number().int().min(1).max(100),
});

export const bondBeamSchema = z.strictObject({
  id: idSchema,
  name: nameSchema,
  /** Underside above the high point; it must fall on a course line. */
  soffit: positiveSizeSchema,
  depth: positiveSizeSchema,
  tolerance: sizeSchema,
  hold: z.enum(['hard', 'soft']),
  bars: z.strictObject({ count: z.number().int().min(0).max(12), diameter: sizeSchema, lap: sizeSchema }),
});

export const poleKitSchema = z.strictObject({
  /** Leg of the steel angle and its thickness. */
  leg: positiveSizeSchema,
  steel: positiveSizeSchema,
  stockLength: positiveSizeSchema,
  poleLength: positiveSizeSchema,
  /** How much of the foot is lapped on the foundation or bond beam. */
  footLap: sizeSchema,
  spacer: sizeSchema,
  /** Working clearance between pole and frame, and between braces. */
  clearance: sizeSchema,
  brace: z
    .strictObject({
      leastLeg: positiveSizeSchema,
      mostLeg: positiveSizeSchema,
      /** Height of the head fixing above the pole's foot. */
      fixing: positiveSizeSchema,
      /** Least head room under a brace over a way through. */
      headRoom: sizeSchema,
    })
    .refine((b) => b.leastLeg <= b.mostLeg, 'brace legs need least ≤ most'),
  lineBlock: sizeSchema,
  kerf: sizeSchema,
  /** Line weight in millinewtons per metre, and pull in newtons. */
  lineWeight: z.number().min(0).max(1000),
  linePull: z.number().min(1).max(10_000),
});

const ruleValuesSchema = z.partialRecord(
  z.enum(RULE_IDS as readonly [RuleId, ...RuleId[]]),
  z.number().min(0).max(1e9),
);

function findDuplicate(values: readonly string[]): number {
  const seen = new Set<string>();
  return values.findIndex((value) => seen.size === seen.add(value).size);
}

export const drawingSchema = z
  .strictObject({
    version: z.literal(1),
    units: unitsSchema,
    /** Marks are rounded to this step: 1/8, 1/16, 1/32 in or 1 mm. */
    tapeStep: z.union([
      z.literal(2032),
      z.literal(1016),
      z.literal(508),
      z.literal(640),
    ]) as unknown as z.ZodType<Ticks>,
    wallTypes: z.array(wallTypeSchema).min(1).max(8),
    corners: z.array(cornerSchema).max(6000),
    runs: z.array(wallRunSchema).max(6000),
    openings: z.array(openingSchema).max(6000),
    keepClears: z.array(keepClearSchema).max(200),
    boundary: z.array(planPointSchema).min(3).max(200).nullable(),
    controlHeights: z.array(controlHeightSchema).max(40),
    bondBeams: z.array(bondBeamSchema).max(10),
    poleKit: poleKitSchema,
    /** The site's own values for rules it has changed. */
    ruleValues: ruleValuesSchema,
  })
  .superRefine((drawing, context) => {
    const refuse = (path: (string | number)[], message: string) => context.addIssue({ code: 'custom', path, message });
    const lists = ['wallTypes', 'corners', 'runs', 'openings', 'keepClears', 'controlHeights', 'bondBeams'] as const;
    for (const list of lists) {
      const twice = findDuplicate(drawing[list].map((item) => item.id));
      if (twice >= 0) refuse([list, twice, 'id'], 'this id is used twice');
    }
    const twice = findDuplicate(drawing.corners.map((corner) => corner.letter));
    if (twice >= 0) refuse(['corners', twice, 'letter'], 'this letter is used twice');
    const corners = new Set(drawing.corners.map((corner) => corner.id));
    const types = new Set(drawing.wallTypes.map((type) => type.id));
    const runs = new Set(drawing.runs.map((run) => run.id));
    drawing.runs.forEach((run, i) => {
      if (!corners.has(run.from)) refuse(['runs', i, 'from'], 'no such corner');
      if (!corners.has(run.to)) refuse(['runs', i, 'to'], 'no such corner');
      if (run.from === run.to) refuse(['runs', i, 'to'], 'a wall run needs two corners');
      if (!types.has(run.wallTypeId)) refuse(['runs', i, 'wallTypeId'], 'no such wall type');
    });
    drawing.openings.forEach((opening, i) => {
      if (!runs.has(opening.runId)) refuse(['openings', i, 'runId'], 'no such wall run');
    });
  });

export type Drawing = z.infer<typeof drawingSchema>;
export type Units = z.infer<typeof unitsSchema>;
export type WallType = z.infer<typeof wallTypeSchema>;
export type Corner = z.infer<typeof cornerSchema>;
export type WallRun = z.infer<typeof wallRunSchema>;
export type Opening = z.infer<typeof openingSchema>;
export type Door = Extract<Opening, { kind: 'door' }>;
export type Passage = Extract<Opening, { kind: 'passage' }>;
export type WayThrough = z.infer<typeof waySchema>;
export type KeepClear = z.infer<typeof keepClearSchema>;
export type ControlHeight = z.infer<typeof controlHeightSchema>;
export type BondBeam = z.infer<typeof bondBeamSchema>;
export type PoleKit = z.infer<typeof poleKitSchema>;
