import { useState } from 'react';
import { Controller, useForm } from 'react-hook-form';
import { View } from 'react-native';
import { signIn } from '../../client/session';
import { Button } from '../../ui/Button';
import { Caution } from '../../ui/Caution';
import { Field } from '../../ui/Field';
import { space } from '../../ui/tokens';
import { Txt } from '../../ui/Txt';
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
  const { control, handleSubmit, formState } = useForm({ defaultValues: { email: '', password: '' } });

  const submit = handleSubmit(async ({ email, password }) => {
    setRefused(null);
    try {
      await signIn(email, password);
    } catch (error) {
      setRefused(problem(error));
    }
  });

  return (
    <AuthFrame title={t('auth.signIn.title')}>
      <Controller
        control={control}
        name="email"
        rules={{ validate: (value) => checkEmail(t, value) }}
        render={({ field, fieldState }) => (
          <Field
            ref={field.ref}
            label={t('auth.fields.email')}
            value={field.value}
            onChangeText={field.onChange}
            onBlur={field.onBlur}
            error={fieldState.error?.message}
            inputMode="email"
            autoComplete="email"
            autoCapitalize="none"
            onSubmitEditing={() => void submit()}
          />
        )}
      />
      <Controller
        control={control}
        name="password"
        rules={{ required: t('auth.problems.passwordNeeded') }}
        render={({ field, fieldState }) => (
          <PasswordField
            ref={field.ref}
            label={t('auth.fields.password')}
            value={field.value}
            onChangeText={field.onChange}
            onBlur={field.onBlur}
            error={fieldState.error?.message}
            autoComplete="current-password"
            onSubmitEditing={() => void submit()}
          />
        )}
      />
      {refused ? (
        <View role="alert">
          <Caution text={refused} />
        </View>
      ) : null}
      <Button
        kind="filled"
        label={t('auth.signIn.action')}
        busy={formState.isSubmitting}
        onPress={() => void submit()}
      />
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
