import { z } from 'zod';
import type { Site } from '../../../model/contracts/sites';
import { errorWords } from '../../client/errorWords';
import { useRenameSite } from '../../client/sites';
import { Button } from '../../ui/Button';
import { Caution } from '../../ui/Caution';
import { Dialog } from '../../ui/Dialog';
import { FormField } from '../../ui/FormField';
import { toast } from '../../ui/toasts';
import { useCheckedForm } from '../../ui/useCheckedForm';
import { useWords } from '../../ui/words';
import { siteNameField } from '../sites/siteNameField';

export function RenameSiteDialog({ site, onClose }: { site: Site; onClose: () => void }) {
  const t = useWords();
  const rename = useRenameSite(site.id);

  const form = useCheckedForm({
    schema: () => z.object({ name: siteNameField(t) }),
    initial: { name: site.name },
    onSend: ({ name }) =>
      rename
        .mutateAsync({ name })
        .then(() => {
          toast(t('sites.rename.done', { name }));
          onClose();
        })
        // Shown below, from the mutation.
        .catch(() => {}),
  });

  return (
    <Dialog
      open
      title={t('sites.rename.title')}
      onClose={onClose}
      actions={
        <>
          <Button label={t('common.cancel')} onPress={onClose} />
          <Button kind="filled" label={t('sites.rename.action')} busy={rename.isPending} onPress={form.send} />
        </>
      }
    >
      <FormField form={form} name="name" label={t('sites.newSite.name')} autoFocus maxLength={80} />
      {rename.isError ? <Caution text={errorWords(t, rename.error)} /> : null}
    </Dialog>
  );
}
