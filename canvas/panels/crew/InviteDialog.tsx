import { Controller } from 'react-hook-form';
import { z } from 'zod';
import { ROLES, roleSchema } from '../../../model/contracts/common';
import { ApiError } from '../../client/api';
import { errorWords } from '../../client/errorWords';
import { useInvite } from '../../client/invitations';
import { Button } from '../../ui/Button';
import { Caution } from '../../ui/Caution';
import { Dialog } from '../../ui/Dialog';
import { FormField } from '../../ui/FormField';
import { toast } from '../../ui/toasts';
import { Txt } from '../../ui/Txt';
import { useCheckedForm } from '../../ui/useCheckedForm';
import { useWords } from '../../ui/words';
import { emailField } from '../auth/checks';
import { RoleList } from './RoleList';

/** Asks for an address and a role, and sends the invitation by mail. */
export function InviteDialog({ siteId, onClose }: { siteId: string; onClose: () => void }) {
  const t = useWords();
  const invite = useInvite(siteId);

  const form = useCheckedForm({
    schema: () => z.object({ email: emailField(t), role: roleSchema }),
    initial: { email: '', role: 'mason' },
    onSend: ({ email, role }) =>
      invite
        .mutateAsync({ email, role })
        .then(() => {
          toast(t('crew.sent', { email }));
          onClose();
        })
        // Shown below, from the mutation.
        .catch(() => {}),
  });

  const already = invite.error instanceof ApiError && invite.error.code === 'alreadyThere';
  return (
    <Dialog
      open
      title={t('crew.inviteTitle')}
      onClose={onClose}
      actions={
        <>
          <Button label={t('common.cancel')} onPress={onClose} />
          <Button kind="filled" label={t('crew.send')} busy={invite.isPending} onPress={form.send} />
        </>
      }
    >
      <Txt tone="soft">{t('crew.inviteText')}</Txt>
      <FormField
        form={form}
        name="email"
        label={t('crew.email')}
        inputMode="email"
        autoComplete="off"
        autoCapitalize="none"
        autoFocus
      />
      <Controller
        control={form.control}
        name="role"
        render={({ field }) => (
          <RoleList label={t('crew.role')} roles={ROLES} value={field.value} onChange={field.onChange} />
        )}
      />
      {invite.isError ? <Caution text={already ? t('crew.already') : errorWords(t, invite.error)} /> : null}
    </Dialog>
  );
}
