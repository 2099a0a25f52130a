/** Messages caught by the local mailbox, in local mode only. */
import { z } from 'zod';
import { whenSchema } from './common';

export const localMessageSchema = z.strictObject({
  id: z.string(),
  to: z.string(),
  subject: z.string(),
  text: z.string(),
  /** Links found in the text, in order. */
  links: z.array(z.string()),
  at: whenSchema,
});
export const localMailSchema = z.strictObject({ messages: z.array(localMessageSchema) });
export type LocalMessage = z.infer<typeof localMessageSchema>;

/** What the client must know of the server it talks to. */
export const settingsSchema = z.strictObject({ localMail: z.boolean(), demo: z.boolean() });

/** The server and its database answer. */
export const healthSchema = z.strictObject({ ok: z.literal(true) });
