import { useState } from 'react';
import type { DraftConflict } from '../../store/draftStore';
import { Button } from '../../ui/Button';
import { Banner } from '../../ui/States';
import { useWords } from '../../ui/words';
import { ConflictDialog } from '../shell/lazyScreens';
import { useDraft, useWorkspace } from './workspace';

/** Asks, wherever in the site the person is, which version to go on with when two were saved at once. */
export function ConflictWatch() {
  const conflicts = useDraft((state) => state.conflicts);
  const { resolve } = useWorkspace();
  const t = useWords();
  const [put, putOff] = useState<DraftConflict | null>(null);
  const clash = conflicts[0];
  if (!clash) return null;
  if (put?.conflict.theirs === clash.conflict.theirs)
    return (
      <Banner
        icon="warning"
        tone="caution"
        text={t('plan.conflict.put')}
        action={<Button label={t('plan.conflict.resolve')} onPress={() => putOff(null)} />}
      />
    );
  return <ConflictDialog clash={clash} onChoose={(choice) => resolve(clash, choice)} onLater={() => putOff(clash)} />;
}
