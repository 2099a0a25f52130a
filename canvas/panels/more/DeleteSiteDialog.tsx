import { useRouter } from 'expo-router';
import { useState } from 'react';
import type { Site } from '../../../model/contracts/sites';
import { errorWords } from '../../client/errorWords';
import { useDeleteSite } from '../../client/sites';
import { Button } from '../../ui/Button';
import { Caution } from '../../ui/Caution';
import { Dialog } from '../../ui/Dialog';
import { Field } from '../../ui/Field';
import { toast } from '../../ui/toasts';
import { useWords } from '../../ui/words';

/** Deleting a whole site: its name has to be typed, because nothing brings it back. */
export function DeleteSiteDialog({ site, onClose }: { site: Site; onClose: () => void }) {
  const t = useWords();
  const router = useRouter();
  const remove = useDeleteSite(site.id);
  const [typed, setTyped] = useState('');
  const same = typed.trim().toLowerCase() === site.name.trim().toLowerCase();

  async function go() {
    try {
      await remove.mutateAsync();
      toast(t('sites.remove.done', { name: site.name }));
      router.replace('/');
    } catch {
      // Shown below, from the mutation.
    }
  }

  return (
    <Dialog
      open
      title={t('sites.remove.title', { name: site.name })}
      onClose={onClose}
      actions={
        <>
          <Button label={t('common.cancel')} onPress={onClose} />
          <Button
            kind="filled"
            tone="caution"
            label={t('sites.remove.action')}
            disabled={!same}
            busy={remove.isPending}
            onPress={() => void go()}
          />
        </>
      }
    >
      <Caution text={t('sites.remove.text')} />
      <Field label={t('sites.remove.confirm')} value={typed} onChangeText={setTyped} autoComplete="off" autoFocus />
      {remove.isError ? <Caution text={errorWords(t, remove.error)} /> : null}
    </Dialog>
  );
}
