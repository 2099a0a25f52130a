import { useCallback, useState } from 'react';
import { View } from 'react-native';
import type { ComparedState } from '../../../model/compare/compare';
import { elevationFigure } from '../../../model/figures/elevation';
import type { Figure, LabelScale } from '../../../model/figures/figure';
import { ticks } from '../../../model/length/ticks';
import type { ThingRef } from '../../../model/things';
import { FigureFrame } from '../../figures/FigureFrame';
import { Picker } from '../../ui/Picker';
import { space } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { Txt } from '../../ui/Txt';
import { useWords } from '../../ui/words';
import type { Camera } from '../../viewport/camera';
import type { Compared } from './comparedStates';

interface Props {
  readonly compared: Compared;
  readonly names: { readonly before: string; readonly after: string };
}

function wallOf(state: ComparedState, runId: string, differing: readonly ThingRef[], scale: LabelScale): Figure {
  const options = { scale, selectedCourse: null, poleId: null, differing };
  const { units, tapeStep } = state.drawing;
  const bounds = { left: ticks(0), bottom: ticks(0), right: ticks(0), top: ticks(0) };
  return (
    elevationFigure(state.drawing, state.setOut, runId, options) ?? {
      name: 'elevation',
      bounds,
      tape: { units, step: tapeStep },
      shapes: [],
    }
  );
}

/** The first wall where something differs: the run itself, or one with an opening that does. */
function firstDiffering(compared: Compared): string | null {
  const { after, before, comparison } = compared;
  const runOf = new Map([...before.drawing.openings, ...after.drawing.openings].map((each) => [each.id, each.runId]));
  for (const { thing } of comparison.changes) {
    if (thing.kind === 'run') return thing.id;
    if (thing.kind === 'opening') return runOf.get(thing.id) ?? null;
  }
  return after.setOut.walls.runs[0]?.runId ?? null;
}

/** One wall before, over the same wall after, at one scale and in one place. */
export function CompareWalls({ compared, names }: Props) {
  const t = useWords();
  const { colours, strokes } = useTheme();
  const { before, after, comparison } = compared;
  const [picked, setPicked] = useState<string | null>(null);
  const [moved, setMoved] = useState<{ runId: string; camera: Camera } | null>(null);
  const runId = picked ?? firstDiffering(compared) ?? '';
  const runs = new Map(
    [...before.setOut.walls.runs, ...after.setOut.walls.runs].map((run) => [run.runId, run.name] as const),
  );
  const makeBefore = useCallback(
    (scale: LabelScale) => wallOf(before, runId, comparison.differingBefore, scale),
    [before, runId, comparison],
  );
  const makeAfter = useCallback(
    (scale: LabelScale) => wallOf(after, runId, comparison.differingAfter, scale),
    [after, runId, comparison],
  );
  const shared = {
    camera: moved?.runId === runId ? moved.camera : null,
    onCamera: (camera: Camera) => setMoved({ runId, camera }),
  };
  const name = runs.get(runId) ?? '';
  return (
    <View style={{ flex: 1, minHeight: 0 }}>
      <View style={{ padding: space.m, alignItems: 'flex-start' }}>
        <Picker
          label={t('walls.pick')}
          hideLabel
          options={[...runs].map(([id, runName]) => ({ value: id, label: t('walls.run', { name: runName }) }))}
          value={runId}
          onChange={setPicked}
        />
      </View>
      {(['before', 'after'] as const).map((which) => (
        <View key={which} style={{ flex: 1, minHeight: 0, borderTopWidth: strokes.hair, borderColor: colours.rule }}>
          <Txt size="small" tone="soft" weight="semibold" style={{ padding: space.s, paddingBottom: 0 }}>
            {names[which]}
          </Txt>
          <FigureFrame
            make={which === 'before' ? makeBefore : makeAfter}
            alongside={which === 'before' ? makeAfter : makeBefore}
            of={`${which} ${runId}`}
            shared={shared}
            label={t('revisions.compare.figure', { name: `${t('walls.run', { name })}, ${names[which]}` })}
          />
        </View>
      ))}
    </View>
  );
}
