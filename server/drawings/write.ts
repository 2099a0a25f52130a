import { createHash } from 'node:crypto';
import type { Write, WriteKind } from '../../db/queries/writes';
import { Failure } from '../http/failure';
import { word } from '../words';

/** A write as the queries want it; what was asked goes in as a hash, so that the same id can't stand for two things. */
export function asWrite(asked: {
  readonly siteId: string;
  readonly userId: string;
  readonly kind: WriteKind;
  readonly writeId: string;
  readonly content: unknown;
}): Write {
  const { content, ...write } = asked;
  return { ...write, asked: createHash('sha256').update(JSON.stringify(content)).digest('hex') };
}

export function writeIdReused(): Failure {
  return new Failure('badInput', word('server.writeIdReused'), { field: 'writeId' });
}
