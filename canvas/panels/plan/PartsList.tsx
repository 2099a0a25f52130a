import { useState } from 'react';
import { Pressable, ScrollView, View, type ViewStyle } from 'react-native';
import type { ThingRef } from '../../../model/things';
import { nameThing } from '../../../model/words/naming';
import { space } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { Txt } from '../../ui/Txt';
import { say, useWords } from '../../ui/words';
import { useDraft, useDraftActions } from '../workspace/workspace';

/**
 * The drawing by keyboard: every corner, run, opening and area as a button, out of sight until one has the focus. Arrows
 * then move what is selected.
 */
export function PartsList() {
  const t = useWords();
  const { colours, strokes } = useTheme();
  const actions = useDraftActions();
  const drawing = useDraft((state) => state.drawing);
  const selection = useDraft((state) => state.selection);
  const [focused, setFocused] = useState(false);
  const things: ThingRef[] = [
    ...drawing.corners.map(({ id }): ThingRef => ({ kind: 'corner', id })),
    ...drawing.runs.map(({ id }): ThingRef => ({ kind: 'run', id })),
    ...drawing.openings.map(({ id }): ThingRef => ({ kind: 'opening', id })),
    ...drawing.keepClears.map(({ id }): ThingRef => ({ kind: 'keepClear', id })),
  ];
  return (
    <View
      role="navigation"
      aria-label={t('plan.parts')}
      style={
        focused
          ? [shown, { backgroundColor: colours.surface, borderColor: colours.rule, borderWidth: strokes.hair }]
          : hidden
      }
    >
      <ScrollView>
        {things.map((thing) => (
          <Pressable
            key={`${thing.kind} ${thing.id}`}
            role="button"
            {...({ 'aria-pressed': selection?.kind === thing.kind && selection.id === thing.id } as object)}
            onFocus={() => setFocused(true)}
            onBlur={() => setFocused(false)}
            onPress={() => actions.select(thing)}
            style={{ paddingHorizontal: space.m, minHeight: 32, justifyContent: 'center' }}
          >
            <Txt>{nameThing(thing, drawing, say)}</Txt>
          </Pressable>
        ))}
      </ScrollView>
    </View>
  );
}

const shown: ViewStyle = { position: 'absolute', left: space.s, top: space.s, maxHeight: 320, width: 220, zIndex: 2 };
const hidden = {
  position: 'absolute',
  left: 0,
  top: 0,
  width: 1,
  height: 1,
  overflow: 'hidden',
  clipPath: 'inset(50%)',
} as unknown as ViewStyle;
