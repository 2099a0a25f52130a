/** `POST /api/solve`: a drawing and a survey in, the whole set-out out (maps as objects by id). */
import { z } from 'zod';
import { drawingSchema } from '../drawing/schema';
import { surveySchema } from '../drawing/surveySchema';

export const solveRequestSchema = z.strictObject({ drawing: drawingSchema, survey: surveySchema });
export type SolveRequest = z.infer<typeof solveRequestSchema>;
