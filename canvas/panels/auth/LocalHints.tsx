import { View } from 'react-native';
import { useSettings } from '../../client/settings';
import { space } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { useWords } from '../../ui/words';
import { TextLink } from './TextLink';

/** On a server that sends no mail: where to read what it would have sent. */
export function LocalHints() {
  const t = useWords();
  const { colours, strokes } = useTheme();
  const { data } = useSettings();
  if (!data?.localMail) return null;
  return (
    <View style={{ paddingTop: space.s, borderTopWidth: strokes.hair, borderColor: colours.rule }}>
      <TextLink href="/mail" label={t('auth.mail.openMailbox')} />
    </View>
  );
}
