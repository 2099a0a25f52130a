/** `POST /api/solve`: a drawing and a survey in, the whole set-out out (maps as objects by id). */
import { z } from 'zod';
import { drawingSchema } from '../drawing/schema';
import { surveySchema } from '../drawing/surveySchema';

export const solveRequestSchema = z.strictObject({ drawing: drawingSchema, survey: surveySchema });
export type SolveRequest = z.infer<typeof solveRequestSchema>;

const thingSchema = z.object({ kind: z.string(), id: z.string() });

/** A reason as it is sent; the codes are listed in the model. */
export const reasonSchema = z.looseObject({
  code: z.string(),
  weight: z.enum(['blocked', 'warning', 'note']),
  thing: thingSchema,
});

const partSchema = z.looseObject({ reasons: z.array(reasonSchema) });

/** The set-out part by part; every map of the model is an object by id. */
export const setOutSchema = z.strictObject({
  walls: partSchema,
  ground: partSchema,
  coursing: partSchema,
  bond: partSchema,
  poles: partSchema,
  marks: partSchema,
  lines: partSchema,
  takeoff: z.looseObject({}),
  reasons: z.array(reasonSchema),
});

export type SetOutAnswer = z.infer<typeof setOutSchema>;
