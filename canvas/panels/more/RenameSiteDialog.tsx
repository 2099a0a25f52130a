import type { Site } from '../../../model/contracts/sites';
import { errorWords } from '../../client/errorWords';
import { useRenameSite } from '../../client/sites';
import { Button } from '../../ui/Button';
import { Caution } from '../../ui/Caution';
import { Dialog } from '../../ui/Dialog';
import { Field } from '../../ui/Field';
import { toast } from '../../ui/toasts';
import { useForm } from '../../ui/useForm';
import { useWords } from '../../ui/words';
import { checkSiteName } from '../sites/checkSiteName';

export function RenameSiteDialog({ site, onClose }: { site: Site; onClose: () => void }) {
  const t = useWords();
  const rename = useRenameSite(site.id);

  const form = useForm({
    initial: { name: site.name },
    checks: {
      name: (value) => checkSiteName(t, value),
    },
    onSubmit: ({ name }) =>
      rename
        .mutateAsync({ name: name.trim() })
        .then(() => {
          toast(t('sites.rename.done', { name: name.trim() }));
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
          <Button kind="filled" label={t('sites.rename.action')} busy={rename.isPending} onPress={form.submit} />
        </>
      }
    >
      <Field {...form.field('name')} label={t('sites.newSite.name')} autoFocus maxLength={80} />
      {rename.isError ? <Caution text={errorWords(t, rename.error)} /> : null}
    </Dialog>
  );
}
