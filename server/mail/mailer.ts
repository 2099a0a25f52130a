import { createTransport } from 'nodemailer';
import type { Logger } from 'pino';
import type { Letter } from './letters';

export interface Mailer {
  /** Sends and waits until the mail server has taken it. */
  readonly send: (letter: Letter) => Promise<void>;
  /** Sends without anyone waiting; a failure is logged. */
  readonly sendLater: (letter: Letter) => void;
  /** Waits for what is being sent, then lets go of the mail server. */
  readonly close: () => Promise<void>;
}

/** Sends by SMTP to the server at `url`. */
export function createMailer(options: { readonly url: string; readonly from: string; readonly log: Logger }): Mailer {
  const transport = createTransport({ url: options.url, connectionTimeout: 10_000, socketTimeout: 20_000 });
  const underWay = new Set<Promise<void>>();

  async function send(letter: Letter): Promise<void> {
    await transport.sendMail({ from: options.from, to: letter.to, subject: letter.subject, text: letter.text });
  }
  function sendLater(letter: Letter): void {
    const sending = send(letter)
      .catch((error: unknown) => options.log.error({ err: error }, 'a mail could not be sent'))
      .finally(() => underWay.delete(sending));
    underWay.add(sending);
  }
  async function close(): Promise<void> {
    await Promise.all(underWay);
    transport.close();
  }
  return { send, sendLater, close };
}
