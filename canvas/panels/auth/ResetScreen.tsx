import { useLocalSearchParams, useRouter } from 'expo-router';
import { useState } from 'react';
import { View } from 'react-native';
import { z } from 'zod';
import { AuthError, resetPassword } from '../../client/session';
import { Button } from '../../ui/Button';
import { Caution } from '../../ui/Caution';
import { FormField } from '../../ui/FormField';
import { toast } from '../../ui/toasts';
import { Txt } from '../../ui/Txt';
import { useCheckedForm } from '../../ui/useCheckedForm';
import { useWords } from '../../ui/words';
import { AuthFrame } from './AuthFrame';
import { newPasswordField } from './checks';
import { PasswordField } from './PasswordField';
import { TextLink } from './TextLink';
import { useAuthProblem } from './useAuthProblem';

/** Where the link in the mail leads: `token` to choose a new password, or `error` where the link is too old. */
export function ResetScreen() {
  const t = useWords();
  const router = useRouter();
  const problem = useAuthProblem();
  const { token, error } = useLocalSearchParams<{ token?: string; error?: string }>();
  const [refused, setRefused] = useState<string | null>(null);
  const [old, setOld] = useState(false);

  const form = useCheckedForm({
    schema: () => z.object({ password: newPasswordField(t) }),
    initial: { password: '' },
    onSend: async ({ password }) => {
      setRefused(null);
      try {
        await resetPassword(token ?? '', password);
        toast(t('auth.reset.done'));
        router.replace('/sign-in');
      } catch (failure) {
        if (failure instanceof AuthError && failure.problem === 'oldLink') setOld(true);
        else setRefused(problem(failure));
      }
    },
  });

  if (old || error !== undefined || token === undefined)
    return (
      <AuthFrame title={t('auth.reset.oldTitle')}>
        <Txt size="large">{t('auth.reset.old')}</Txt>
        <TextLink href="/forgot" label={t('auth.reset.askAgain')} />
      </AuthFrame>
    );

  return (
    <AuthFrame title={t('auth.reset.title')}>
      <FormField
        form={form}
        as={PasswordField}
        name="password"
        label={t('auth.fields.newPassword')}
        hint={t('auth.fields.passwordHint')}
        autoComplete="new-password"
      />
      {refused ? (
        <View role="alert">
          <Caution text={refused} />
        </View>
      ) : null}
      <Button kind="filled" label={t('auth.reset.action')} busy={form.busy} onPress={form.send} />
    </AuthFrame>
  );
}
