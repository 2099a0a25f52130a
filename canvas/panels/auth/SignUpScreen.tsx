import { useState } from 'react';
import { View } from 'react-native';
import { signUp } from '../../client/session';
import { Button } from '../../ui/Button';
import { Caution } from '../../ui/Caution';
import { Field } from '../../ui/Field';
import { space } from '../../ui/tokens';
import { Txt } from '../../ui/Txt';
import { useForm } from '../../ui/useForm';
import { useWords } from '../../ui/words';
import { AuthFrame } from './AuthFrame';
import { checkEmail, checkNewPassword } from './checks';
import { PasswordField } from './PasswordField';
import { TextLink } from './TextLink';
import { useAuthProblem } from './useAuthProblem';

export function SignUpScreen() {
  const t = useWords();
  const problem = useAuthProblem();
  const [refused, setRefused] = useState<string | null>(null);

  const form = useForm({
    initial: { name: '', email: '', password: '' },
    checks: {
      name: (value) => value.trim() !== '' || t('auth.problems.nameNeeded'),
      email: (value) => checkEmail(t, value),
      password: (value) => checkNewPassword(t, value),
    },
    onSubmit: async ({ name, email, password }) => {
      setRefused(null);
      try {
        await signUp(name, email, password);
      } catch (error) {
        setRefused(problem(error));
      }
    },
  });

  return (
    <AuthFrame title={t('auth.signUp.title')}>
      <Field
        {...form.field('name')}
        label={t('auth.fields.name')}
        hint={t('auth.fields.nameHint')}
        autoComplete="name"
        maxLength={80}
      />
      <Field
        {...form.field('email')}
        label={t('auth.fields.email')}
        inputMode="email"
        autoComplete="email"
        autoCapitalize="none"
      />
      <PasswordField
        {...form.field('password')}
        label={t('auth.fields.password')}
        hint={t('auth.fields.passwordHint')}
        autoComplete="new-password"
      />
      {refused ? (
        <View role="alert">
          <Caution text={refused} />
        </View>
      ) : null}
      <Button kind="filled" label={t('auth.signUp.action')} busy={form.busy} onPress={form.submit} />
      <View style={{ flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', columnGap: space.s }}>
        <Txt tone="soft" size="large">
          {t('auth.signUp.haveAccount')}
        </Txt>
        <TextLink href="/sign-in" label={t('auth.signUp.toSignIn')} />
      </View>
    </AuthFrame>
  );
}
