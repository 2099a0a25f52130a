import { useState } from 'react';
import { View } from 'react-native';
import { z } from 'zod';
import { signUp } from '../../client/session';
import { Button } from '../../ui/Button';
import { Caution } from '../../ui/Caution';
import { FormField } from '../../ui/FormField';
import { space } from '../../ui/tokens';
import { Txt } from '../../ui/Txt';
import { useCheckedForm } from '../../ui/useCheckedForm';
import { useWords } from '../../ui/words';
import { AuthFrame } from './AuthFrame';
import { emailField, newPasswordField, personNameField } from './checks';
import { PasswordField } from './PasswordField';
import { TextLink } from './TextLink';
import { useAuthProblem } from './useAuthProblem';

export function SignUpScreen() {
  const t = useWords();
  const problem = useAuthProblem();
  const [refused, setRefused] = useState<string | null>(null);

  const form = useCheckedForm({
    schema: () => z.object({ name: personNameField(t), email: emailField(t), password: newPasswordField(t) }),
    initial: { name: '', email: '', password: '' },
    onSend: async ({ name, email, password }) => {
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
      <FormField
        form={form}
        name="name"
        label={t('auth.fields.name')}
        hint={t('auth.fields.nameHint')}
        autoComplete="name"
        maxLength={80}
      />
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
        hint={t('auth.fields.passwordHint')}
        autoComplete="new-password"
      />
      {refused ? (
        <View role="alert">
          <Caution text={refused} />
        </View>
      ) : null}
      <Button kind="filled" label={t('auth.signUp.action')} busy={form.busy} onPress={form.send} />
      <View style={{ flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', columnGap: space.s }}>
        <Txt tone="soft" size="large">
          {t('auth.signUp.haveAccount')}
        </Txt>
        <TextLink href="/sign-in" label={t('auth.signUp.toSignIn')} />
      </View>
    </AuthFrame>
  );
}
