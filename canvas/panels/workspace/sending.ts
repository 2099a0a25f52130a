/** Sends a part of the draft and says what became of it in the saver's terms. */
import type { QueryClient } from '@tanstack/react-query';
import type { Draft } from '../../../model/contracts/drawings';
import type { Drawing } from '../../../model/drawing/schema';
import type { Survey } from '../../../model/drawing/surveySchema';
import { ApiError } from '../../client/api';
import { draftQuery, saveDrawing, saveSurvey, StaleError } from '../../client/drafts';
import { newWriteId } from '../../client/writeId';
import type { AutosaveHost } from '../../store/autosave';
import type { Attempt, SendResult } from '../../store/saver';
import { keepLocal } from './localDrafts';

/** Codes after which the same request may yet go through. */
const COME_AGAIN: ReadonlySet<string> = new Set([
  'offline',
  'unavailable',
  'tooMany',
  'broken',
  'signedOut',
  'unreadable',
]);

async function attempt<T>(
  send: () => Promise<number>,
  theirsOf: (current: Draft) => { readonly theirs: T; readonly version: number },
): Promise<SendResult<T>> {
  try {
    return { kind: 'saved', version: await send() };
  } catch (error) {
    if (error instanceof StaleError) {
      const { current } = error.stale;
      return { kind: 'stale', ...theirsOf(current), by: current.changedBy, at: current.changedAt };
    }
    const comeAgain = !(error instanceof ApiError) || COME_AGAIN.has(error.code);
    return { kind: comeAgain ? 'offline' : 'refused' };
  }
}

export function autosaveHost(client: QueryClient, userId: string, siteId: string): AutosaveHost {
  /** The fetched draft stays what the server has, so that a screen opened later starts from it. */
  function remember(change: Partial<Draft>): void {
    client.setQueryData(draftQuery(siteId).queryKey, (draft) => draft && { ...draft, ...change, changedSince: true });
  }

  return {
    sendDrawing: ({ writeId, baseVersion, value }: Attempt<Drawing>) =>
      attempt<Drawing>(
        async () => {
          const version = await saveDrawing(siteId, { writeId, baseVersion, drawing: value });
          remember({ drawing: value, drawingVersion: version });
          return version;
        },
        (current) => ({ theirs: current.drawing, version: current.drawingVersion }),
      ),
    sendSurvey: ({ writeId, baseVersion, value }: Attempt<Survey>) =>
      attempt<Survey>(
        async () => {
          const version = await saveSurvey(siteId, { writeId, baseVersion, survey: value });
          remember({ survey: value, surveyVersion: version });
          return version;
        },
        (current) => ({ theirs: current.survey, version: current.surveyVersion }),
      ),
    keepDrawing: (copy) => keepLocal({ userId, siteId, part: 'drawing' }, copy),
    keepSurvey: (copy) => keepLocal({ userId, siteId, part: 'survey' }, copy),
    later(milliseconds, run) {
      const timer = setTimeout(run, milliseconds);
      return () => clearTimeout(timer);
    },
    newWriteId,
  };
}

/**
 * Puts their version aside on the server when mine is chosen over it. It is sent from a version older than theirs, which
 * the server always refuses and sets aside, as it did with mine.
 */
export async function setTheirsAside(
  siteId: string,
  theirs: { readonly part: 'drawing'; readonly value: Drawing } | { readonly part: 'survey'; readonly value: Survey },
  theirVersion: number,
): Promise<void> {
  const write = { writeId: newWriteId(), baseVersion: Math.max(0, theirVersion - 1) };
  try {
    if (theirs.part === 'drawing') await saveDrawing(siteId, { ...write, drawing: theirs.value });
    else await saveSurvey(siteId, { ...write, survey: theirs.value });
  } catch (error) {
    if (!(error instanceof StaleError)) throw error;
  }
}
