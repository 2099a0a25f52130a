import { worse } from '../../store/autosave';
import type { SaveStatus } from '../../store/saver';
import { useWords } from '../../ui/words';
import { useDraft, useWorkspace } from './workspace';

/** Where both parts of the draft stand, the worse of the two. */
export function useSaveStatus(): SaveStatus {
  return useDraft((state) => worse(state.drawingSave, state.surveySave));
}

/** For a header's second line: which drawing this is and whether it is saved. */
export function useDraftLine(): string {
  const t = useWords();
  const { of } = useWorkspace();
  const status = useSaveStatus();
  if (of.kind === 'revision') return t('plan.draft.revision', { number: of.number });
  const draft = of.afterRevision === null ? t('plan.draft.none') : t('plan.draft.after', { number: of.afterRevision });
  return t('plan.draft.line', { draft, state: t(`plan.save.${status}`) });
}
