import { useState } from 'react';
import { View } from 'react-native';
import type { Ticks } from '../../../model/length/ticks';
import { space } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { Txt } from '../../ui/Txt';
import { useWords } from '../../ui/words';
import { ElevationView } from '../elevation/ElevationView';
import { PoleView } from '../pole/PoleView';
import { useDraft, useDraftActions, useSolved } from '../workspace/workspace';

/** The open wall from outside, following the plan while it is drawn. */
export function WallBeside({ title = true }: { title?: boolean }) {
  const t = useWords();
  const { drawing, setOut } = useSolved();
  const actions = useDraftActions();
  const runId = useDraft((state) => state.openRunId);
  const poleId = useDraft((state) => state.openPoleId);
  const [course, setCourse] = useState<number | null>(null);
  const run = runId === null ? undefined : setOut.walls.runById.get(runId);
  if (!run) return <Quiet text={t('plan.inspector.nothing')} />;
  return (
    <View style={{ flex: 1, minHeight: 0 }}>
      {title ? (
        <Txt weight="semibold" tone="soft" style={{ paddingHorizontal: space.l, paddingTop: space.m }}>
          {t('plan.wallBeside', { name: run.name })}
        </Txt>
      ) : null}
      <ElevationView
        drawing={drawing}
        setOut={setOut}
        runId={run.runId}
        selectedCourse={course}
        poleId={poleId}
        onPickCourse={setCourse}
        onPickPole={(id) => actions.openPole(id)}
      />
    </View>
  );
}

/** The open pole with its marks; the open wall's first pole where none was opened. */
export function PoleBeside() {
  const t = useWords();
  const { colours } = useTheme();
  const { drawing, setOut } = useSolved();
  const openPoleId = useDraft((state) => state.openPoleId);
  const openRunId = useDraft((state) => state.openRunId);
  const [height, setHeight] = useState<Ticks | null>(null);
  const run = openRunId === null ? undefined : setOut.walls.runById.get(openRunId);
  const poleId = openPoleId ?? run?.ends[0].cornerId ?? null;
  const marks = setOut.marks.poles.find((pole) => pole.poleId === poleId);
  if (!marks) return <Quiet text={t('plan.inspector.nothing')} />;
  return (
    <View style={{ flex: 1, minHeight: 0, backgroundColor: colours.surface }}>
      <Txt weight="semibold" tone="soft" style={{ paddingHorizontal: space.l, paddingTop: space.m }}>
        {t('plan.inspector.pole', { letter: marks.letter })}
      </Txt>
      <PoleView drawing={drawing} marks={marks} selectedHeight={height} onPick={(mark) => setHeight(mark.height)} />
    </View>
  );
}

function Quiet({ text }: { text: string }) {
  return (
    <Txt tone="soft" style={{ padding: space.l }}>
      {text}
    </Txt>
  );
}
