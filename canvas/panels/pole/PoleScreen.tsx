import { useRouter } from 'expo-router';
import { useState } from 'react';
import { ScrollView, View } from 'react-native';
import type { Ticks } from '../../../model/length/ticks';
import type { SetOut } from '../../../model/setOut';
import type { ThingRef } from '../../../model/things';
import { Button } from '../../ui/Button';
import { Choice } from '../../ui/Choice';
import { Header } from '../../ui/Header';
import { Picker } from '../../ui/Picker';
import { Empty } from '../../ui/States';
import { useTheme } from '../../ui/theme';
import { useLayout } from '../../ui/useLayout';
import { useWords } from '../../ui/words';
import { PageTitle } from '../shell/PageTitle';
import { useDraft, useDraftActions, useSolved, useWorkspace } from '../workspace/workspace';
import { useDraftLine } from '../workspace/useDraftLine';
import { BraceList } from './BraceList';
import { LetterStrip } from './LetterStrip';
import { MarkLedger } from './MarkLedger';
import { PoleView } from './PoleView';

/** The pole that a selection means: itself, its corner's, or its brace's. */
function poleOf(selection: ThingRef | null, setOut: SetOut): string | null {
  if (!selection) return null;
  if (selection.kind === 'pole') return selection.id;
  if (selection.kind === 'brace') return selection.id.replace(/\.\d+$/, '');
  if (selection.kind === 'corner') return setOut.poles.poles.find((pole) => pole.cornerId === selection.id)?.id ?? null;
  return null;
}

type Part = 'marks' | 'braces';

/** One pole: its marks joined to the steel, one of them huge, and its braces. */
export function PoleScreen({ siteId }: { siteId: string }) {
  const t = useWords();
  const router = useRouter();
  const { colours, strokes } = useTheme();
  const layout = useLayout();
  const { siteName } = useWorkspace();
  const line = useDraftLine();
  const { drawing, setOut } = useSolved();
  const open = useDraft((state) => state.openPoleId);
  const selection = useDraft((state) => state.selection);
  const actions = useDraftActions();
  const [height, setHeight] = useState<Ticks | null>(null);
  const [lift, setLift] = useState(1);
  const [part, setPart] = useState<Part>('marks');
  const { poles } = setOut.poles;
  const wanted = open ?? poleOf(selection, setOut);
  const pole = poles.find((each) => each.id === wanted) ?? poles[0];

  if (!pole)
    return (
      <View style={{ flex: 1, backgroundColor: colours.ground }}>
        <PageTitle title={`${t('poles.title')} · ${siteName}`} />
        <Header title={t('poles.title')} subtitle={line} />
        <Empty
          icon="poles"
          title={t('poles.noPoles')}
          text={t('poles.noPolesHelp')}
          action={
            <Button
              label={t('common.nav.plan')}
              onPress={() => router.push({ pathname: '/sites/[siteId]/plan', params: { siteId } })}
            />
          }
        />
      </View>
    );

  const lifts = setOut.marks.poles.filter((each) => each.poleId === pole.id);
  const marks = lifts.find((each) => each.lift === lift) ?? lifts[0];
  const all = marks?.marks ?? [];
  const index = all.findIndex((mark) => mark.height === height);
  // The first course's mark is the one to begin with: it comes last, since the highest is first.
  const shown = index >= 0 ? index : all.length - 1;
  const mark = all[shown];
  function step(by: 1 | -1) {
    const next = all[shown - by];
    if (next) setHeight(next.height);
  }
  const wide = layout.name !== 'phone';
  const table = marks ? (
    <PoleView
      key={`${marks.poleId} ${marks.lift}`}
      drawing={drawing}
      marks={marks}
      selectedHeight={mark?.height ?? null}
      onPick={(each) => setHeight(each.height)}
    />
  ) : null;
  const ledger = mark ? <MarkLedger drawing={drawing} letter={pole.letter} mark={mark} onStep={step} /> : null;
  const braces = (
    <ScrollView style={{ flex: 1, backgroundColor: colours.surface }}>
      <BraceList drawing={drawing} setOut={setOut} pole={pole} />
    </ScrollView>
  );
  return (
    <View style={{ flex: 1, backgroundColor: colours.ground }}>
      <PageTitle title={`${t('poles.pole', { letter: pole.letter })} · ${siteName}`} />
      <Header
        title={t('poles.pole', { letter: pole.letter })}
        subtitle={line}
        actions={
          lifts.length > 1 ? (
            <Picker
              label={t('poles.pickLift')}
              hideLabel
              options={lifts.map((each) => ({
                value: String(each.lift),
                label: t('poles.lift', { number: each.lift }),
              }))}
              value={String(marks?.lift ?? 1)}
              onChange={(value) => setLift(Number(value))}
            />
          ) : undefined
        }
      />
      <LetterStrip poles={poles} poleId={pole.id} onPick={(id) => actions.openPole(id)} />
      {wide ? (
        <View style={{ flex: 1, minHeight: 0, flexDirection: 'row' }}>
          <View style={{ flex: 3, minWidth: 0 }}>{table}</View>
          <View style={{ flex: 2, minWidth: 0, borderLeftWidth: strokes.hair, borderColor: colours.rule }}>
            {ledger}
            {braces}
          </View>
        </View>
      ) : (
        <View style={{ flex: 1, minHeight: 0 }}>
          {part === 'marks' ? table : braces}
          {part === 'marks' ? ledger : null}
          <View style={{ backgroundColor: colours.surface, padding: 8, paddingTop: 0 }}>
            <Choice
              label={t('poles.part')}
              hideLabel
              options={[
                { value: 'marks', label: t('poles.marks') },
                { value: 'braces', label: t('poles.braces') },
              ]}
              value={part}
              onChange={setPart}
            />
          </View>
        </View>
      )}
    </View>
  );
}
