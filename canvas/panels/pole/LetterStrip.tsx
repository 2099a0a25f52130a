import { Pressable, ScrollView, View } from 'react-native';
import type { StoryPole } from '../../../model/poles/types';
import { Letter } from '../../ui/Letter';
import { space, touch } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { useWords } from '../../ui/words';

export interface LetterStripProps {
  readonly poles: readonly StoryPole[];
  readonly poleId: string;
  readonly onPick: (poleId: string) => void;
}

/** All poles by letter, side by side. */
export function LetterStrip({ poles, poleId, onPick }: LetterStripProps) {
  const t = useWords();
  const { colours, strokes } = useTheme();
  return (
    <View style={{ backgroundColor: colours.surface, borderBottomWidth: strokes.hair, borderColor: colours.rule }}>
      <ScrollView horizontal showsHorizontalScrollIndicator={false}>
        <View role="group" aria-label={t('poles.pick')} style={{ flexDirection: 'row', paddingHorizontal: space.s }}>
          {poles.map((pole) => (
            <Pressable
              key={pole.id}
              role="button"
              aria-label={t('poles.pole', { letter: pole.letter })}
              {...({ 'aria-pressed': pole.id === poleId } as object)}
              onPress={() => onPick(pole.id)}
              style={{ minWidth: touch, height: touch + 4, alignItems: 'center', justifyContent: 'center' }}
            >
              <Letter letter={pole.letter} selected={pole.id === poleId} size={34} />
            </Pressable>
          ))}
        </View>
      </ScrollView>
    </View>
  );
}
