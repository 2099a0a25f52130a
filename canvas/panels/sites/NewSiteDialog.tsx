import { useRouter } from 'expo-router';
import { Controller, useForm } from 'react-hook-form';
import type { Units } from '../../../model/drawing/schema';
import { errorWords } from '../../client/errorWords';
import { useAddSite } from '../../client/sites';
import { Button } from '../../ui/Button';
import { Caution } from '../../ui/Caution';
import { Choice } from '../../ui/Choice';
import { Dialog } from '../../ui/Dialog';
import { Field } from '../../ui/Field';
import { useWords } from '../../ui/words';
import { checkSiteName } from './checkSiteName';

export function NewSiteDialog({ open, onClose }: { open: boolean; onClose: () => void }) {
  const t = useWords();
  const router = useRouter();
  const add = useAddSite();
  const { control, handleSubmit, reset } = useForm<{ name: string; units: Units }>({
    defaultValues: { name: '', units: 'imperial' },
  });

  function close() {
    reset();
    add.reset();
    onClose();
  }

  const submit = handleSubmit(({ name, units }) =>
    add
      .mutateAsync({ name: name.trim(), units })
      .then((site) => {
        close();
        router.push({ pathname: '/sites/[siteId]/plan', params: { siteId: site.id } });
      })
      // Shown below, from the mutation.
      .catch(() => {}),
  );

  return (
    <Dialog
      open={open}
      title={t('sites.newSite.title')}
      onClose={close}
      actions={
        <>
          <Button label={t('common.cancel')} onPress={close} />
          <Button kind="filled" label={t('sites.newSite.action')} busy={add.isPending} onPress={() => void submit()} />
        </>
      }
    >
      <Controller
        control={control}
        name="name"
        rules={{ validate: (value) => checkSiteName(t, value) }}
        render={({ field, fieldState }) => (
          <Field
            ref={field.ref}
            label={t('sites.newSite.name')}
            hint={t('sites.newSite.nameHint')}
            value={field.value}
            onChangeText={field.onChange}
            onBlur={field.onBlur}
            error={fieldState.error?.message}
            autoFocus
            maxLength={80}
            onSubmitEditing={() => void submit()}
          />
        )}
      />
      <Controller
        control={control}
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
