/** The survey of the foundation as it is saved and sent: measured down from one level line, or read by rod from set-ups of a level. */
import { z } from 'zod';
import { idSchema, sizeSchema, ticksSchema } from './schema';

/** Where a reading was taken: at a corner, or along a run from its first corner. */
export const stationSchema = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('corner'), cornerId: idSchema }),
  z.strictObject({ kind: z.literal('run'), runId: idSchema, at: ticksSchema }),
]);

export const readingSchema = z.strictObject({
  id: idSchema,
  station: stationSchema,
  /** Measured down from the level line to the foundation. */
  down: sizeSchema,
});

function refuseTwice(readings: readonly { id: string }[], refuse: (index: number, message: string) => void): void {
  const seen = new Set<string>();
  readings.forEach(({ id }, i) => {
    if (seen.has(id)) refuse(i, 'this id is used twice');
    seen.add(id);
  });
}

export const measureDownSurveySchema = z
  .strictObject({
    version: z.literal(1),
    method: z.literal('measureDown'),
    readings: z.array(readingSchema).max(2000),
  })
  .superRefine((survey, context) =>
    refuseTwice(survey.readings, (i, message) =>
      context.addIssue({ code: 'custom', path: ['readings', i, 'id'], message }),
    ),
  );

/** A row of the level book: the rod read at a place through the level. */
export const rodReadingSchema = z.strictObject({
  id: idSchema,
  /** Where the rod stood; null on the benchmark, or on a turning point off the foundation. */
  station: stationSchema.nullable(),
  /** A backsight begins a set-up, a foresight ends it, and its point is the next backsight's. */
  sight: z.enum(['back', 'intermediate', 'fore']),
  rod: sizeSchema,
  /** From the level to the rod, where it was taken. */
  distance: sizeSchema.optional(),
});

/** Both pegs read from one place, with the distance to each. */
const pegSetUpSchema = z.strictObject({ a: sizeSchema, b: sizeSchema, toA: sizeSchema, toB: sizeSchema });
/** The two-peg check of a level: from midway between the pegs, then from near one of them. */
export const pegTestSchema = z.strictObject({ midway: pegSetUpSchema, near: pegSetUpSchema });

export const rodSurveySchema = z
  .strictObject({
    version: z.literal(1),
    method: z.literal('rod'),
    /** Where the first backsight is taken, and its height on any datum. */
    benchmark: z.strictObject({ name: z.string().trim().max(80), height: ticksSchema }),
    /** Known height of the last foresight's point: the benchmark's own for a loop. Null: the book does not close. */
    closing: ticksSchema.nullable(),
    /** Length of the levelling, where it was paced as a whole. Absent: the sum of the sights. */
    length: ticksSchema.refine((length) => length > 0, 'a length is above zero').optional(),
    /** How an accepted misclosure is shared out. */
    share: z.enum(['distance', 'setUps']),
    /** Height of the level line marked on the poles, on the benchmark's datum. Absent: the highest line of sight. */
    levelLine: ticksSchema.optional(),
    pegTest: pegTestSchema.optional(),
    readings: z.array(rodReadingSchema).max(2000),
  })
  .superRefine((survey, context) => {
    const refuse = (i: number, message: string, field: string) =>
      context.addIssue({ code: 'custom', path: ['readings', i, field], message });
    refuseTwice(survey.readings, (i, message) => refuse(i, message, 'id'));
    survey.readings.forEach(({ sight }, i) => {
      const before = survey.readings[i - 1]?.sight ?? 'fore';
      if (before === 'fore' && sight !== 'back') refuse(i, 'a set-up begins with a backsight', 'sight');
      if (before !== 'fore' && sight === 'back') refuse(i, 'the set-up before has no foresight', 'sight');
    });
  });

export const surveySchema = z.discriminatedUnion('method', [measureDownSurveySchema, rodSurveySchema]);

export type MeasureDownSurvey = z.infer<typeof measureDownSurveySchema>;
export type RodSurvey = z.infer<typeof rodSurveySchema>;
export type Survey = MeasureDownSurvey | RodSurvey;
export type Station = z.infer<typeof stationSchema>;
export type Reading = z.infer<typeof readingSchema>;
export type RodReading = z.infer<typeof rodReadingSchema>;
export type PegTest = z.infer<typeof pegTestSchema>;

export const EMPTY_SURVEY: MeasureDownSurvey = { version: 1, method: 'measureDown', readings: [] };
