import { useRouter } from 'expo-router';
import { may } from '../../../model/contracts/common';
import { useDraft as useFetchedDraft } from '../../client/drafts';
import { useRevisions } from '../../client/revisions';
import { Button } from '../../ui/Button';
import { useLayout } from '../../ui/useLayout';
import { useWords } from '../../ui/words';
import { useDraft, useWorkspace } from '../workspace/workspace';

/** On a phone, where the draft has left its revision: what differs, one tap from the plan. */
export function CompareDraft() {
  const phone = useLayout().name === 'phone';
  const { of } = useWorkspace();
  return phone && of.kind === 'draft' ? <CompareButton quiet /> : null;
}

/** In a wider plan's header: saving the next revision, and comparing where the draft has left the last one. */
export function RevisionButtons() {
  const t = useWords();
  const router = useRouter();
  const layout = useLayout().name;
  const { siteId, of } = useWorkspace();
  const maySave = useDraft((state) => may(state.role, 'saveRevision'));
  const drawn = useDraft((state) => state.drawing.runs.length > 0);
  const newest = useRevisions(siteId).data?.[0]?.number ?? 0;
  const changed = useChanged(siteId);
  if (layout === 'phone' || of.kind !== 'draft') return null;
  return (
    <>
      {layout === 'wide' ? <CompareButton /> : null}
      {maySave && drawn && (newest === 0 || changed) ? (
        <Button
          label={t('plan.saveRevision', { number: newest + 1 })}
          onPress={() => router.push({ pathname: '/sites/[siteId]/revisions', params: { siteId, save: 'yes' } })}
        />
      ) : null}
    </>
  );
}

/** Whether the draft is no longer as its revision is: what the server knows, and what was done here since. */
function useChanged(siteId: string): boolean {
  const fetched = useFetchedDraft(siteId).data;
  const done = useDraft((state) => state.history.past.length > 0);
  return done || (fetched?.changedSince ?? false);
}

function CompareButton({ quiet = false }: { quiet?: boolean }) {
  const t = useWords();
  const router = useRouter();
  const { siteId, of } = useWorkspace();
  const changed = useChanged(siteId);
  const before = of.kind === 'draft' ? of.afterRevision : null;
  if (before === null || !changed) return null;
  return (
    <Button
      label={t('plan.compareDraft', { number: before })}
      kind={quiet ? 'quiet' : 'outline'}
      onPress={() =>
        router.push({
          pathname: '/sites/[siteId]/revisions/compare',
          params: { siteId, before: String(before), after: 'draft' },
        })
      }
      style={quiet ? { justifyContent: 'flex-start', paddingHorizontal: 0 } : undefined}
    />
  );
}
