import type { DraftRow } from '../../db/queries/drafts';
import type { Draft } from '../../model/contracts/drawings';

export function draftAnswer(draft: DraftRow): Draft {
  return { ...draft, changedAt: draft.changedAt.toISOString() };
}
