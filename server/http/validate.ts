import type { z } from 'zod';
import { word } from '../words';
import { Failure } from './failure';

/** Where in the input the first fault is, `drawing.runs.3.to`, and what is wrong there. */
function firstIssue(error: z.ZodError): { field: string; message: string } {
  const issue = error.issues[0];
  if (issue === undefined) return { field: 'body', message: word('server.badInput') };
  const path = issue.path.map(String);
  if (issue.code === 'unrecognized_keys') path.push(...issue.keys.slice(0, 1));
  return { field: path.join('.') || 'body', message: issue.message };
}

/** The input as its contract reads it. Throws `badInput` with the first field that is wrong. */
export function validateBody<S extends z.ZodType>(schema: S, input: unknown): z.output<S> {
  const read = schema.safeParse(input);
  if (read.success) return read.data;
  const { field, message } = firstIssue(read.error);
  throw new Failure('badInput', message, { field });
}
