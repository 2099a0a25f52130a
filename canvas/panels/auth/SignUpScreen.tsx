import { useState } from 'react';
import { Controller, useForm } from 'react-hook-form';
import { View } from 'react-native';
import { signUp } from '../../client/session';
import { Button } from '../../ui/Button';
import { Caution } from '../../ui/Caution';
import { Field } from '../../ui/Field';
import { space } from '../../ui/tokens';
import { Txt } from '../../ui/Txt';
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
  const { control, handleSubmit, formState } = useForm({ defaultValues: { name: '', email: '', password: '' } });

  const submit = handleSubmit(async ({ name, email, password }) => {
    setRefused(null);
    try {
      await signUp(name, email, password);
    } catch (error) {
      setRefused(problem(error));
    }
  });

  return (
    <AuthFrame title={t('auth.signUp.title')}>
      <Controller
        control={control}
        name="name"
        rules={{ validate: (value) => value.trim() !== '' || t('auth.problems.nameNeeded') }}
        render={({ field, fieldState }) => (
          <Field
            ref={field.ref}
            label={t('auth.fields.name')}
            hint={t('auth.fields.nameHint')}
            value={field.value}
            onChangeText={field.onChange}
            onBlur={field.onBlur}
            error={fieldState.error?.message}
            autoComplete="name"
            maxLength={80}
            onSubmitEditing={() => void submit()}
          />
        )}
      />
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
        rules={{ validate: (value) => checkNewPassword(t, value) }}
        render={({ field, fieldState }) => (
          <PasswordField
            ref={field.ref}
            label={t('auth.fields.password')}
            hint={t('auth.fields.passwordHint')}
            value={field.value}
            onChangeText={field.onChange}
            onBlur={field.onBlur}
            error={fieldState.error?.message}
            autoComplete="new-password"
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
        label={t('auth.signUp.action')}
        busy={formState.isSubmitting}
        onPress={() => void submit()}
      />
      <View style={{ flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', columnGap: space.s }}>
        <Txt tone="soft" size="large">
          {t('auth.signUp.haveAccount')}
        </Txt>
        <TextLink href="/sign-in" label={t('auth.signUp.toSignIn')} />
      </View>
    </AuthFrame>
  );
}
