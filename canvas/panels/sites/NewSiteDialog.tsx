import { useRouter } from 'expo-router';
import { Controller } from 'react-hook-form';
import { z } from 'zod';
import { unitsSchema } from '../../../model/drawing/schema';
import { errorWords } from '../../client/errorWords';
import { useAddSite } from '../../client/sites';
import { Button } from '../../ui/Button';
import { Caution } from '../../ui/Caution';
import { Choice } from '../../ui/Choice';
import { Dialog } from '../../ui/Dialog';
import { FormField } from '../../ui/FormField';
import { useCheckedForm } from '../../ui/useCheckedForm';
import { useWords } from '../../ui/words';
import { siteNameField } from './siteNameField';

export function NewSiteDialog({ onClose }: { onClose: () => void }) {
  const t = useWords();
  const router = useRouter();
  const add = useAddSite();

  const form = useCheckedForm({
    schema: () => z.object({ name: siteNameField(t), units: unitsSchema }),
    initial: { name: '', units: 'imperial' },
    onSend: ({ name, units }) =>
      add
        .mutateAsync({ name, units })
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
          <Button kind="filled" label={t('sites.newSite.action')} busy={add.isPending} onPress={form.send} />
        </>
      }
    >
      <FormField
        form={form}
        name="name"
        label={t('sites.newSite.name')}
        hint={t('sites.newSite.nameHint')}
        autoFocus
        maxLength={80}
      />
      <Controller
        control={form.control}
        name="units"
        render={({ field }) => (
          <Choice
            label={t('sites.newSite.units')}
            value={field.value}
            onChange={field.onChange}
            options={[
              { value: 'imperial', label: t('common.units.imperial') },
              { value: 'metric', label: t('common.units.metric') },
            ]}
          />
        )}
      />
      {add.isError ? <Caution text={errorWords(t, add.error)} /> : null}
    </Dialog>
  );
}
