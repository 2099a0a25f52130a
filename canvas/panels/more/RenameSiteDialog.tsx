import { Controller, useForm } from 'react-hook-form';
import type { Site } from '../../../model/contracts/sites';
import { errorWords } from '../../client/errorWords';
import { useRenameSite } from '../../client/sites';
import { Button } from '../../ui/Button';
import { Caution } from '../../ui/Caution';
import { Dialog } from '../../ui/Dialog';
import { Field } from '../../ui/Field';
import { toast } from '../../ui/toasts';
import { useWords } from '../../ui/words';
import { checkSiteName } from '../sites/checkSiteName';

export function RenameSiteDialog({ site, onClose }: { site: Site; onClose: () => void }) {
  const t = useWords();
  const rename = useRenameSite(site.id);
  const { control, handleSubmit } = useForm({ defaultValues: { name: site.name } });

  const submit = handleSubmit(({ name }) =>
    rename
      .mutateAsync({ name: name.trim() })
      .then(() => {
        toast(t('sites.rename.done', { name: name.trim() }));
        onClose();
      })
      // Shown below, from the mutation.
      .catch(() => {}),
  );

  return (
    <Dialog
      open
      title={t('sites.rename.title')}
      onClose={onClose}
      actions={
        <>
          <Button label={t('common.cancel')} onPress={onClose} />
          <Button
            kind="filled"
            label={t('sites.rename.action')}
            busy={rename.isPending}
            onPress={() => void submit()}
          />
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
      {rename.isError ? <Caution text={errorWords(t, rename.error)} /> : null}
    </Dialog>
  );
}
