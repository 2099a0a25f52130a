/** The survey of the foundation as it is saved and sent: readings measured down from one level line. */
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

export const surveySchema = z
  .strictObject({
    version: z.literal(1),
    method: z.literal('measureDown'),
    readings: z.array(readingSchema).max(2000),
  })
  .superRefine((survey, context) => {
    const seen = new Set<string>();
    survey.readings.forEach((reading, i) => {
      if (seen.has(reading.id))
        context.addIssue({ code: 'custom', path: ['readings', i, 'id'], message: 'this id is used twice' });
      seen.add(reading.id);
    });
  });

export type Survey = z.infer<typeof surveySchema>;
export type Station = z.infer<typeof stationSchema>;
export type Reading = z.infer<typeof readingSchema>;

export const EMPTY_SURVEY: Survey = { version: 1, method: 'measureDown', readings: [] };
