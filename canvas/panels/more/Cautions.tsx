import { View } from 'react-native';
import { Caution } from '../../ui/Caution';
import { space } from '../../ui/tokens';
import { Txt } from '../../ui/Txt';
import { useLayout } from '../../ui/useLayout';
import { useWords } from '../../ui/words';

const each = ['accessZone', 'wind', 'powerLines', 'lifting', 'silica', 'eyes', 'bars'] as const;

/** What can hurt someone in this work, and who decides on the structure: the same words as on every printed sheet. */
export function Cautions() {
  const t = useWords();
  const phone = useLayout().name === 'phone';
  return (
    <View style={{ gap: space.s, paddingHorizontal: phone ? space.l : 0 }}>
      <Txt weight="semibold">{t('common.cautions.codes')}</Txt>
      {each.map((name) => (
        <Caution key={name} text={t(`common.cautions.${name}`)} />
      ))}
    </View>
  );
}
