import { useRouter } from 'expo-router';
import { useState } from 'react';
import { ScrollView, View } from 'react-native';
import { may } from '../../../model/contracts/common';
import type { Station, Survey } from '../../../model/drawing/surveySchema';
import { Button } from '../../ui/Button';
import { Caution } from '../../ui/Caution';
import { Header } from '../../ui/Header';
import { Empty } from '../../ui/States';
import { space } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { Txt } from '../../ui/Txt';
import { useLayout } from '../../ui/useLayout';
import { useWords } from '../../ui/words';
import { PageTitle } from '../shell/PageTitle';
import { useDraftLine } from '../workspace/useDraftLine';
import { useDraft, useDraftActions, useSolved, useWorkspace } from '../workspace/workspace';
import { AddStationDialog } from './AddStationDialog';
import { GroundSummary } from './GroundSummary';
import { ProfileView } from './ProfileView';
import { ReadingPad } from './ReadingPad';
import { withoutReadings } from './readings';
import { StationList } from './StationList';
import { listStations, nextUnread, stationKey, type StationEntry } from './stations';

/** Below this height, px, a phone's keypad takes the profile's room. */
const SHORT = 700;

/** The level book: every station measured down from the level line, with what that makes of the bedding. */
export function LevelsScreen({ siteId }: { siteId: string }) {
  const t = useWords();
  const router = useRouter();
  const { siteName } = useWorkspace();
  const { drawing, setOut } = useSolved();
  const survey = useDraft((state) => state.survey);
  const role = useDraft((state) => state.role);
  const { editSurvey } = useDraftActions();
  const line = useDraftLine();
  const layout = useLayout();
  const { colours, strokes } = useTheme();
  const [chosen, setChosen] = useState<string | null>(null);
  const [added, setAdded] = useState<Station | null>(null);
  const [adding, setAdding] = useState(false);
  const [listed, setListed] = useState(false);
  const phone = layout.name === 'phone';
  const byRod = survey.method === 'rod';
  const editable = may(role, 'editSurvey') && !byRod;
  const { units, tapeStep: step } = drawing;
  const { walls, ground } = setOut;

  const book = listStations(walls, survey, drawing.ruleValues);
  const entries = withAdded(book.entries, added, (runId) => {
    const run = walls.runById.get(runId);
    return run ? { run: run.name, letter: walls.cornerById.get(run.ends[0].cornerId)?.letter ?? '' } : null;
  });
  const done = entries.filter(({ reading }) => reading !== null).length;
  const selected = entries.find(({ key }) => key === chosen) ?? entries.find(({ reading }) => !reading) ?? entries[0];

  function choose(key: string) {
    setChosen(key);
    setListed(false);
  }

  function stepBy(by: number) {
    const at = entries.findIndex(({ key }) => key === selected?.key);
    const next = entries[(at + by + entries.length) % entries.length];
    if (next) setChosen(next.key);
  }

  function set(next: Survey, from: StationEntry) {
    editSurvey(() => next);
    setAdded(null);
    setChosen(nextUnread(entries, from.key) ?? from.key);
  }

  if (entries.length === 0 || !selected)
    return (
      <View style={{ flex: 1, backgroundColor: colours.ground }}>
        <PageTitle title={`${t('levels.title')} · ${siteName}`} />
        <Header title={t('levels.title')} subtitle={siteName} />
        <Empty
          icon="levels"
          title={t('levels.empty.title')}
          text={t('levels.empty.text')}
          action={
            <Button
              kind="filled"
              label={t('levels.empty.action')}
              onPress={() => router.push({ pathname: '/sites/[siteId]/plan', params: { siteId } })}
            />
          }
        />
      </View>
    );

  const list = (
    <>
      <GroundSummary drawing={drawing} ground={ground} entries={entries} />
      {book.off.length > 0 ? (
        <View style={{ paddingHorizontal: space.l, paddingBottom: space.l }}>
          <Caution text={t('levels.offDrawing', { count: book.off.length })}>
            {editable ? (
              <Button
                size="body"
                label={t('levels.dropOff')}
                onPress={() =>
                  editSurvey((now) =>
                    withoutReadings(
                      now,
                      book.off.map(({ id }) => id),
                    ),
                  )
                }
                style={{ alignSelf: 'flex-start' }}
              />
            ) : null}
          </Caution>
        </View>
      ) : null}
      <View style={{ paddingHorizontal: space.l, paddingBottom: space.m, gap: 2 }}>
        <Txt size="large" weight="semibold" role="heading" level={2}>
          {t('levels.stations')}
        </Txt>
        <Txt tone="soft">{t('levels.how')}</Txt>
        {editable ? <Txt tone="soft">{t('levels.stationsText')}</Txt> : null}
      </View>
      <View style={{ borderTopWidth: strokes.hair, borderColor: colours.rule }}>
        <StationList
          entries={entries}
          ground={ground}
          units={units}
          step={step}
          selected={phone && !listed ? null : selected.key}
          onSelect={choose}
        />
      </View>
    </>
  );
  const profile = (
    <View style={{ backgroundColor: colours.surface, borderBottomWidth: strokes.hair, borderColor: colours.rule }}>
      <ProfileView readingId={selected.reading?.id ?? null} height={phone ? 128 : 220} />
    </View>
  );
  // While a station is being added the dialog's keypad alone listens to the keyboard.
  const pad = adding ? null : (
    <ReadingPad
      key={selected.key}
      entry={selected}
      survey={survey}
      last={nextUnread(entries, selected.key) === null}
      compact={layout.height < 800}
      onSet={(next) => set(next, selected)}
      onClear={(readingId) => {
        editSurvey((now) => withoutReadings(now, [readingId]));
        if (selected.along) setChosen(null);
      }}
      onStep={stepBy}
    />
  );

  return (
    <View style={{ flex: 1, backgroundColor: colours.ground }}>
      <PageTitle title={`${t('levels.title')} · ${siteName}`} />
      <Header
        title={t('levels.title')}
        subtitle={phone ? t('levels.subtitle', { done, all: entries.length }) : `${siteName} · ${line}`}
        actions={
          <>
            {editable && (!phone || listed) ? (
              <Button icon={phone ? undefined : 'add'} label={t('levels.add')} onPress={() => setAdding(true)} />
            ) : null}
            {phone && editable && !listed ? (
              <Button label={t('levels.stations')} onPress={() => setListed(true)} />
            ) : null}
          </>
        }
      />
      {phone ? (
        editable && !listed ? (
          <View style={{ flex: 1, minHeight: 0 }}>
            {layout.height < SHORT ? null : profile}
            {pad}
          </View>
        ) : (
          <ScrollView style={{ flex: 1 }}>
            {profile}
            {editable ? null : (
              <View style={{ padding: space.l, paddingBottom: 0 }}>
                <Caution weight="note" text={t(byRod ? 'levels.byRod' : 'levels.readOnly')} />
              </View>
            )}
            {list}
          </ScrollView>
        )
      ) : (
        <View style={{ flex: 1, flexDirection: 'row', minHeight: 0 }}>
          <ScrollView style={{ flex: 1 }}>
            {profile}
            {editable ? null : (
              <View style={{ padding: space.l, paddingBottom: 0 }}>
                <Caution weight="note" text={t(byRod ? 'levels.byRod' : 'levels.readOnly')} />
              </View>
            )}
            {list}
          </ScrollView>
          {editable ? (
            <View
              style={{
                width: layout.name === 'wide' ? 460 : 400,
                backgroundColor: colours.surface,
                borderLeftWidth: strokes.hair,
                borderColor: colours.rule,
              }}
            >
              {pad}
            </View>
          ) : null}
        </View>
      )}
      {adding ? (
        <AddStationDialog
          isTaken={(station) => entries.some(({ key }) => key === stationKey(station))}
          onAdd={(station) => {
            setAdded(station);
            setAdding(false);
            choose(stationKey(station));
          }}
          onClose={() => setAdding(false)}
        />
      ) : null}
    </View>
  );
}

/** The stations with the one just added, which has no reading yet and so is not in the survey. */
function withAdded(
  entries: readonly StationEntry[],
  added: Station | null,
  runOf: (runId: string) => { readonly run: string; readonly letter: string } | null,
): readonly StationEntry[] {
  if (added?.kind !== 'run' || entries.some(({ key }) => key === stationKey(added))) return entries;
  const run = runOf(added.runId);
  if (!run) return entries;
  const entry = {
    key: stationKey(added),
    station: added,
    letter: null,
    along: { ...run, at: added.at },
    reading: null,
  };
  return [...entries, entry];
}
