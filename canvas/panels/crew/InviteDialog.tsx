import { Controller, useForm } from 'react-hook-form';
import { ROLES, type Role } from '../../../model/contracts/common';
import { ApiError } from '../../client/api';
import { errorWords } from '../../client/errorWords';
import { useInvite } from '../../client/invitations';
import { Button } from '../../ui/Button';
import { Caution } from '../../ui/Caution';
import { Dialog } from '../../ui/Dialog';
import { Field } from '../../ui/Field';
import { toast } from '../../ui/toasts';
import { Txt } from '../../ui/Txt';
import { useWords } from '../../ui/words';
import { checkEmail } from '../auth/checks';
import { RoleList } from './RoleList';

/** Asks for an address and a role, and sends the invitation by mail. */
export function InviteDialog({ siteId, onClose }: { siteId: string; onClose: () => void }) {
  const t = useWords();
  const invite = useInvite(siteId);
  const { control, handleSubmit } = useForm<{ email: string; role: Role }>({
    defaultValues: { email: '', role: 'mason' },
  });

  const submit = handleSubmit(({ email, role }) =>
    invite
      .mutateAsync({ email: email.trim(), role })
      .then(() => {
        toast(t('crew.sent', { email: email.trim() }));
        onClose();
      })
      // Shown below, from the mutation.
      .catch(() => {}),
  );

  const already = invite.error instanceof ApiError && invite.error.code === 'alreadyThere';
  return (
    <Dialog
      open
      title={t('crew.inviteTitle')}
      onClose={onClose}
      actions={
        <>
          <Button label={t('common.cancel')} onPress={onClose} />
          <Button kind="filled" label={t('crew.send')} busy={invite.isPending} onPress={() => void submit()} />
        </>
      }
    >
      <Txt tone="soft">{t('crew.inviteText')}</Txt>
      <Controller
        control={control}
        name="email"
        rules={{ validate: (value) => checkEmail(t, value) }}
        render={({ field, fieldState }) => (
          <Field
            ref={field.ref}
            label={t('crew.email')}
            value={field.value}
            onChangeText={field.onChange}
            onBlur={field.onBlur}
            error={fieldState.error?.message}
            inputMode="email"
            autoComplete="off"
            autoCapitalize="none"
            autoFocus
            onSubmitEditing={() => void submit()}
          />
        )}
      />
      <Controller
        control={control}
        name="role"
        render={({ field }) => (
          <RoleList label={t('crew.role')} roles={ROLES} value={field.value} onChange={field.onChange} />
        )}
      />
      {invite.isError ? <Caution text={already ? t('crew.already') : errorWords(t, invite.error)} /> : null}
    </Dialog>
  );
}
