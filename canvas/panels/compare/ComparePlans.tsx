import { useCallback, useState } from 'react';
import { View } from 'react-native';
import type { ComparedState } from '../../../model/compare/compare';
import type { Box, LabelScale } from '../../../model/figures/figure';
import { overlayFigure } from '../../../model/figures/overlay';
import { planFigure } from '../../../model/figures/plan';
import type { PlanNote } from '../../../model/figures/planContext';
import type { ThingRef } from '../../../model/things';
import { FigureFrame } from '../../figures/FigureFrame';
import { space } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { Txt } from '../../ui/Txt';
import { useWords } from '../../ui/words';
import type { Camera } from '../../viewport/camera';
import type { Compared } from './comparedStates';

export type Side = 'before' | 'after' | 'both' | 'overlay';

interface Props {
  readonly compared: Compared;
  readonly names: { readonly before: string; readonly after: string };
  readonly side: Side;
}

function planOf(
  state: ComparedState,
  differing: readonly ThingRef[],
  notes: readonly PlanNote[],
  scale: LabelScale,
  within: Box | null,
) {
  return planFigure(state.drawing, state.setOut, {
    selection: null,
    scale,
    differing,
    notes,
    dimensions: true,
    cautions: false,
    within,
  });
}

/** Both plans at one scale and in one place; moving one moves the other. */
export function ComparePlans({ compared, names, side }: Props) {
  const t = useWords();
  const { colours, strokes } = useTheme();
  const [camera, setCamera] = useState<Camera | null>(null);
  const { before, after, comparison, notesBefore, notesAfter } = compared;
  const makeBefore = useCallback(
    (scale: LabelScale, within: Box | null) => planOf(before, comparison.differingBefore, notesBefore, scale, within),
    [before, comparison, notesBefore],
  );
  const makeAfter = useCallback(
    (scale: LabelScale, within: Box | null) => planOf(after, comparison.differingAfter, notesAfter, scale, within),
    [after, comparison, notesAfter],
  );
  const makeOverlay = useCallback(
    (scale: LabelScale, within: Box | null) => overlayFigure(makeBefore(scale, within), makeAfter(scale, within)),
    [makeBefore, makeAfter],
  );
  const shared = { camera, onCamera: setCamera };
  const frame = (which: 'before' | 'after' | 'overlay') => {
    const name = which === 'overlay' ? `${names.before}, ${names.after}` : names[which];
    return (
      <View
        key={which}
        style={{
          flex: 1,
          minWidth: 0,
          borderRightWidth: which === 'before' ? strokes.hair : 0,
          borderColor: colours.rule,
        }}
      >
        <Txt size="small" tone="soft" weight="semibold" style={{ padding: space.m, paddingBottom: 0 }}>
          {name}
        </Txt>
        <FigureFrame
          make={which === 'before' ? makeBefore : which === 'after' ? makeAfter : makeOverlay}
          alongside={which === 'before' ? makeAfter : makeBefore}
          of={which}
          labels="inView"
          shared={shared}
          label={t('revisions.compare.figure', { name })}
        />
      </View>
    );
  };
  return (
    <View style={{ flex: 1, minHeight: 0, flexDirection: 'row' }}>
      {side === 'both' ? [frame('before'), frame('after')] : frame(side)}
    </View>
  );
}
