import { useState } from 'react';
import { View } from 'react-native';
import { z } from 'zod';
import { requestReset } from '../../client/session';
import { Button } from '../../ui/Button';
import { Caution } from '../../ui/Caution';
import { FormField } from '../../ui/FormField';
import { Txt } from '../../ui/Txt';
import { useCheckedForm } from '../../ui/useCheckedForm';
import { useWords } from '../../ui/words';
import { AuthFrame } from './AuthFrame';
import { emailField } from './checks';
import { LocalHints } from './LocalHints';
import { TextLink } from './TextLink';
import { useAuthProblem } from './useAuthProblem';

export function ForgotScreen() {
  const t = useWords();
  const problem = useAuthProblem();
  const [refused, setRefused] = useState<string | null>(null);
  const [sentTo, setSentTo] = useState<string | null>(null);

  const form = useCheckedForm({
    schema: () => z.object({ email: emailField(t) }),
    initial: { email: '' },
    onSend: async ({ email }) => {
      setRefused(null);
      try {
        await requestReset(email);
        setSentTo(email);
      } catch (error) {
        setRefused(problem(error));
      }
    },
  });

  if (sentTo !== null)
    return (
      <AuthFrame title={t('auth.forgot.sentTitle')}>
        <View role="status">
          <Txt size="large">{t('auth.forgot.sent', { email: sentTo })}</Txt>
        </View>
        <TextLink href="/sign-in" label={t('auth.forgot.back')} />
        <LocalHints />
      </AuthFrame>
    );

  return (
    <AuthFrame title={t('auth.forgot.title')}>
      <Txt size="large" tone="soft">
        {t('auth.forgot.text')}
      </Txt>
      <FormField
        form={form}
        name="email"
        label={t('auth.fields.email')}
        inputMode="email"
        autoComplete="email"
        autoCapitalize="none"
      />
      {refused ? (
        <View role="alert">
          <Caution text={refused} />
        </View>
      ) : null}
      <Button kind="filled" label={t('auth.forgot.action')} busy={form.busy} onPress={form.send} />
      <TextLink href="/sign-in" label={t('auth.forgot.back')} />
    </AuthFrame>
  );
}
