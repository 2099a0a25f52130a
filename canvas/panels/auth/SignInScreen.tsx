import { useState } from 'react';
import { View } from 'react-native';
import { signIn } from '../../client/session';
import { Button } from '../../ui/Button';
import { Caution } from '../../ui/Caution';
import { Field } from '../../ui/Field';
import { space } from '../../ui/tokens';
import { Txt } from '../../ui/Txt';
import { useForm } from '../../ui/useForm';
import { useWords } from '../../ui/words';
import { AuthFrame } from './AuthFrame';
import { checkEmail } from './checks';
import { LocalHints } from './LocalHints';
import { PasswordField } from './PasswordField';
import { TextLink } from './TextLink';
import { useAuthProblem } from './useAuthProblem';

export function SignInScreen() {
  const t = useWords();
  const problem = useAuthProblem();
  const [refused, setRefused] = useState<string | null>(null);

  const form = useForm({
    initial: { email: '', password: '' },
    checks: {
      email: (value) => checkEmail(t, value),
      password: (value) => value !== '' || t('auth.problems.passwordNeeded'),
    },
    onSubmit: async ({ email, password }) => {
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
      <Field
        {...form.field('email')}
        label={t('auth.fields.email')}
        inputMode="email"
        autoComplete="email"
        autoCapitalize="none"
      />
      <PasswordField {...form.field('password')} label={t('auth.fields.password')} autoComplete="current-password" />
      {refused ? (
        <View role="alert">
          <Caution text={refused} />
        </View>
      ) : null}
      <Button kind="filled" label={t('auth.signIn.action')} busy={form.busy} onPress={form.submit} />
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
