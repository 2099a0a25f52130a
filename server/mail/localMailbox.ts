/** A mail server for one machine: it takes every mail, sends none, and keeps the last hundred in memory. */
import { randomUUID } from 'node:crypto';
import type { AddressInfo } from 'node:net';
import { simpleParser } from 'mailparser';
import { SMTPServer } from 'smtp-server';
import type { LocalMessage } from '../../model/contracts/mail';

const MOST_MESSAGES = 100;

export interface LocalMailbox {
  /** Where the mailer sends to. */
  readonly url: string;
  /** The newest first. */
  readonly messages: () => readonly LocalMessage[];
  readonly close: () => Promise<void>;
}

function findLinks(text: string): string[] {
  return text.match(/https?:\/\/[^\s<>"]+/g) ?? [];
}

/** Listens on a free port of the loopback. */
export async function openLocalMailbox(): Promise<LocalMailbox> {
  const kept: LocalMessage[] = [];
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['AUTH', 'STARTTLS'],
    disableReverseLookup: true,
    size: 1_000_000,
    onData(stream, session, callback) {
      simpleParser(stream).then((mail) => {
        const text = mail.text ?? '';
        kept.unshift({
          id: randomUUID(),
          to: session.envelope.rcptTo.map((recipient) => recipient.address).join(', '),
          subject: mail.subject ?? '',
          text,
          links: findLinks(text),
          at: new Date().toISOString(),
        });
        kept.length = Math.min(kept.length, MOST_MESSAGES);
        callback();
      }, callback);
    },
  });
  // A client that drops its connection is no reason to stop.
  server.on('error', () => undefined);
  await new Promise<void>((resolve, reject) => {
    server.server.once('error', reject);
    server.listen(0, '127.0.0.1', resolve);
  });
  const { port } = server.server.address() as AddressInfo;
  return {
    url: `smtp://127.0.0.1:${port}`,
    messages: () => kept,
    close: () => new Promise((resolve) => server.close(() => resolve())),
  };
}
