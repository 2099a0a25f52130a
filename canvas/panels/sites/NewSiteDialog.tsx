import { useRouter } from 'expo-router';
import type { Units } from '../../../model/drawing/schema';
import { errorWords } from '../../client/errorWords';
import { useAddSite } from '../../client/sites';
import { Button } from '../../ui/Button';
import { Caution } from '../../ui/Caution';
import { Choice } from '../../ui/Choice';
import { Dialog } from '../../ui/Dialog';
import { Field } from '../../ui/Field';
import { useForm } from '../../ui/useForm';
import { useWords } from '../../ui/words';
import { checkSiteName } from './checkSiteName';

export function NewSiteDialog({ onClose }: { onClose: () => void }) {
  const t = useWords();
  const router = useRouter();
  const add = useAddSite();

  const form = useForm<{ name: string; units: Units }>({
    initial: { name: '', units: 'imperial' },
    checks: {
      name: (value) => checkSiteName(t, value),
    },
    onSubmit: ({ name, units }) =>
      add
        .mutateAsync({ name: name.trim(), units })
        .then((site) => {
          onClose();
          router.push({ pathname: '/sites/[siteId]/plan', params: { siteId: site.id } });
        })
        // Shown below, from the mutation.
        .catch(() => {}),
  });

  return (
    <Dialog
      open
      title={t('sites.newSite.title')}
      onClose={onClose}
      actions={
        <>
          <Button label={t('common.cancel')} onPress={onClose} />
          <Button kind="filled" label={t('sites.newSite.action')} busy={add.isPending} onPress={form.submit} />
        </>
      }
    >
      <Field
        {...form.field('name')}
        label={t('sites.newSite.name')}
        hint={t('sites.newSite.nameHint')}
        autoFocus
        maxLength={80}
      />
      <Choice
        label={t('sites.newSite.units')}
        value={form.values.units}
        onChange={(units) => form.set('units', units)}
        options={[
          { value: 'imperial', label: t('common.units.imperial') },
          { value: 'metric', label: t('common.units.metric') },
        ]}
      />
      {add.isError ? <Caution text={errorWords(t, add.error)} /> : null}
    </Dialog>
  );
}
