import { useState } from 'react';
import { View } from 'react-native';
import { Field, type FieldProps } from '../../ui/Field';
import { Button } from '../../ui/Button';
import { useWords } from '../../ui/words';

/** A password, hidden until asked to be shown: on a phone with dusty hands it is mistyped more often than overlooked. */
export function PasswordField(props: Omit<FieldProps, 'secureTextEntry'>) {
  const t = useWords();
  const [shown, setShown] = useState(false);
  return (
    <View>
      <Field {...props} secureTextEntry={!shown} autoCapitalize="none" autoCorrect={false} />
      <Button
        kind="quiet"
        size="body"
        label={shown ? t('auth.fields.hide') : t('auth.fields.show')}
        onPress={() => setShown(!shown)}
        style={{ alignSelf: 'flex-start', paddingHorizontal: 0 }}
      />
    </View>
  );
}
