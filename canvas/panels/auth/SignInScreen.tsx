import { useState } from 'react';
import { View } from 'react-native';
import { z } from 'zod';
import { signIn } from '../../client/session';
import { Button } from '../../ui/Button';
import { Caution } from '../../ui/Caution';
import { FormField } from '../../ui/FormField';
import { space } from '../../ui/tokens';
import { Txt } from '../../ui/Txt';
import { useCheckedForm } from '../../ui/useCheckedForm';
import { useWords } from '../../ui/words';
import { AuthFrame } from './AuthFrame';
import { emailField, passwordField } from './checks';
import { LocalHints } from './LocalHints';
import { PasswordField } from './PasswordField';
import { TextLink } from './TextLink';
import { useAuthProblem } from './useAuthProblem';

export function SignInScreen() {
  const t = useWords();
  const problem = useAuthProblem();
  const [refused, setRefused] = useState<string | null>(null);

  const form = useCheckedForm({
    schema: () => z.object({ email: emailField(t), password: passwordField(t) }),
    initial: { email: '', password: '' },
    onSend: async ({ email, password }) => {
      setRefused(null);
      try {
        await signIn(email, password);
      } catch (error) {
        setRefused(problem(error));
      }
    },
  });

  return (
    <AuthFrame title={t('auth.signIn.title')}>
      <FormField
        form={form}
        name="email"
        label={t('auth.fields.email')}
        inputMode="email"
        autoComplete="email"
        autoCapitalize="none"
      />
      <FormField
        form={form}
        as={PasswordField}
        name="password"
        label={t('auth.fields.password')}
        autoComplete="current-password"
      />
      {refused ? (
        <View role="alert">
          <Caution text={refused} />
        </View>
      ) : null}
      <Button kind="filled" label={t('auth.signIn.action')} busy={form.busy} onPress={form.send} />
      <View>
        <TextLink href="/forgot" label={t('auth.signIn.forgot')} />
        <View style={{ flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', columnGap: space.s }}>
          <Txt tone="soft" size="large">
            {t('auth.signIn.noAccount')}
          </Txt>
          <TextLink href="/sign-up" label={t('auth.signIn.toSignUp')} />
        </View>
      </View>
      <LocalHints />
    </AuthFrame>
  );
}
