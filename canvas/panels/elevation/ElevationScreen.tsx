import { useRouter } from 'expo-router';
import { useState } from 'react';
import { View } from 'react-native';
import { Button } from '../../ui/Button';
import { Header } from '../../ui/Header';
import { Picker } from '../../ui/Picker';
import { Empty } from '../../ui/States';
import { useTheme } from '../../ui/theme';
import { useLayout } from '../../ui/useLayout';
import { useWords } from '../../ui/words';
import { PageTitle } from '../shell/PageTitle';
import { useDraft, useDraftActions, useSolved, useWorkspace } from '../workspace/workspace';
import { useDraftLine } from '../workspace/useDraftLine';
import { ElevationView } from './ElevationView';
import { RunLedger } from './RunLedger';

/** The walls of a site, one at a time, from outside. */
export function ElevationScreen({ siteId }: { siteId: string }) {
  const t = useWords();
  const router = useRouter();
  const { colours } = useTheme();
  const layout = useLayout();
  const { siteName } = useWorkspace();
  const line = useDraftLine();
  const { drawing, setOut } = useSolved();
  const open = useDraft((state) => state.openRunId);
  const selection = useDraft((state) => state.selection);
  const actions = useDraftActions();
  const [course, setCourse] = useState<number | null>(null);
  const { runs } = setOut.walls;
  const wanted = open ?? (selection?.kind === 'run' ? selection.id : null);
  const index = Math.max(
    0,
    runs.findIndex((run) => run.runId === wanted),
  );
  const run = runs[index];
  const title = t('walls.title');

  if (!run)
    return (
      <View style={{ flex: 1, backgroundColor: colours.ground }}>
        <PageTitle title={`${title} · ${siteName}`} />
        <Header title={title} subtitle={line} />
        <Empty
          icon="walls"
          title={t('walls.noRuns')}
          text={t('walls.noRunsHelp')}
          action={
            <Button
              label={t('common.nav.plan')}
              onPress={() => router.push({ pathname: '/sites/[siteId]/plan', params: { siteId } })}
            />
          }
        />
      </View>
    );

  const courses = setOut.coursing.courses;
  const most = courses[courses.length - 1]?.number ?? 0;
  const selected = course !== null && course <= most ? course : null;
  function stepCourse(step: 1 | -1) {
    const next = (selected ?? (step === 1 ? 0 : most + 1)) + step;
    setCourse(next < 1 || next > most ? null : next);
  }
  function step(by: 1 | -1) {
    const next = runs[(index + by + runs.length) % runs.length];
    if (next) actions.openRun(next.runId);
  }
  const openPole = (poleId: string) => {
    actions.openPole(poleId);
    router.push({ pathname: '/sites/[siteId]/poles', params: { siteId } });
  };
  const view = (
    <View style={{ flex: 1, minHeight: 0, minWidth: 0 }}>
      <ElevationView
        drawing={drawing}
        setOut={setOut}
        runId={run.runId}
        selectedCourse={selected}
        onPickCourse={(number) => setCourse(number === selected ? null : number)}
        onPickPole={openPole}
      />
    </View>
  );
  const ledger = (
    <RunLedger
      drawing={drawing}
      setOut={setOut}
      runId={run.runId}
      selectedCourse={selected}
      onStep={step}
      onStepCourse={stepCourse}
    />
  );
  const wide = layout.name === 'wide';
  return (
    <View style={{ flex: 1, backgroundColor: colours.ground }}>
      <PageTitle title={`${t('walls.run', { name: run.name })} · ${siteName}`} />
      <Header
        title={
          layout.name === 'phone' ? t('walls.run', { name: run.name }) : t('walls.fromOutside', { name: run.name })
        }
        subtitle={line}
        actions={
          <Picker
            label={t('walls.pick')}
            hideLabel
            options={runs.map((each) => ({ value: each.runId, label: each.name }))}
            value={run.runId}
            onChange={(id) => actions.openRun(id)}
          />
        }
      />
      <View style={{ flex: 1, minHeight: 0, flexDirection: wide ? 'row' : 'column' }}>
        {view}
        {wide ? <View style={{ width: 420, backgroundColor: colours.surface }}>{ledger}</View> : ledger}
      </View>
    </View>
  );
}
