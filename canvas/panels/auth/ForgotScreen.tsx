import { useState } from 'react';
import { Controller, useForm } from 'react-hook-form';
import { View } from 'react-native';
import { requestReset } from '../../client/session';
import { Button } from '../../ui/Button';
import { Caution } from '../../ui/Caution';
import { Field } from '../../ui/Field';
import { Txt } from '../../ui/Txt';
import { useWords } from '../../ui/words';
import { AuthFrame } from './AuthFrame';
import { checkEmail } from './checks';
import { LocalHints } from './LocalHints';
import { TextLink } from './TextLink';
import { useAuthProblem } from './useAuthProblem';

export function ForgotScreen() {
  const t = useWords();
  const problem = useAuthProblem();
  const [refused, setRefused] = useState<string | null>(null);
  const [sentTo, setSentTo] = useState<string | null>(null);
  const { control, handleSubmit, formState } = useForm({ defaultValues: { email: '' } });

  const submit = handleSubmit(async ({ email }) => {
    setRefused(null);
    try {
      await requestReset(email);
      setSentTo(email.trim());
    } catch (error) {
      setRefused(problem(error));
    }
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
      {refused ? (
        <View role="alert">
          <Caution text={refused} />
        </View>
      ) : null}
      <Button
        kind="filled"
        label={t('auth.forgot.action')}
        busy={formState.isSubmitting}
        onPress={() => void submit()}
      />
      <TextLink href="/sign-in" label={t('auth.forgot.back')} />
    </AuthFrame>
  );
}
