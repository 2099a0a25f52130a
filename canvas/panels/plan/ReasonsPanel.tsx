import { Pressable, View } from 'react-native';
import type { Reason } from '../../../model/reasons';
import { nameThing } from '../../../model/words/naming';
import { wordReason } from '../../../model/words/wordReason';
import type { PressState } from '../../ui/Button';
import { Caution } from '../../ui/Caution';
import { space } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { Txt } from '../../ui/Txt';
import { say, useWords } from '../../ui/words';
import { useDraftActions, useSolved } from '../workspace/workspace';
import { writerOf } from './tapeOf';

const GRAVEST_FIRST: Readonly<Record<Reason['weight'], number>> = { blocked: 0, warning: 1, note: 2 };
/** More than this nobody reads; mending the first ones mends many of the others. */
const SHOWN = 100;

/** Everything that doesn't fit or is worth knowing, gravest first; each leads to its thing. */
export function ReasonsPanel({ onPicked }: { onPicked?: () => void }) {
  const t = useWords();
  const { colours, strokes } = useTheme();
  const actions = useDraftActions();
  const { drawing, survey, setOut } = useSolved();
  const write = writerOf(drawing);
  const sorted = [...setOut.reasons].sort((a, b) => GRAVEST_FIRST[a.weight] - GRAVEST_FIRST[b.weight]);
  if (sorted.length === 0) return <Txt tone="soft">{t('plan.allFits')}</Txt>;
  return (
    <View role="list">
      {sorted.slice(0, SHOWN).map((reason, i) => (
        <View role="listitem" key={`${reason.code} ${reason.thing.id} ${i}`}>
          <Pressable
            role="button"
            onPress={() => {
              actions.select(
                reason.thing.kind === 'brace'
                  ? { kind: 'pole', id: reason.thing.id.replace(/\.\d+$/, '') }
                  : reason.thing,
              );
              onPicked?.();
            }}
            style={({ pressed, hovered }: PressState) => ({
              gap: space.xs,
              paddingVertical: space.m,
              borderBottomWidth: strokes.hair,
              borderColor: colours.rule,
              backgroundColor: pressed || hovered ? colours.hover : 'transparent',
            })}
          >
            <Txt size="small" tone="soft">
              {nameThing(reason.thing, drawing, say, { survey })}
            </Txt>
            <Caution bare weight={reason.weight} text={wordReason(reason, drawing, say, write, survey)} />
          </Pressable>
        </View>
      ))}
    </View>
  );
}
