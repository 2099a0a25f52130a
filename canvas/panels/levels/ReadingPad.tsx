import { useState } from 'react';
import { ScrollView, View } from 'react-native';
import type { Survey } from '../../../model/drawing/surveySchema';
import { readLength } from '../../../model/length/read';
import { ticks, type Ticks } from '../../../model/length/ticks';
import { writeLength } from '../../../model/length/write';
import { levelGround } from '../../../model/survey/levelGround';
import { newWriteId } from '../../client/writeId';
import { Button } from '../../ui/Button';
import { Caution } from '../../ui/Caution';
import { IconButton } from '../../ui/IconButton';
import { Measurement } from '../../ui/Measurement';
import { space } from '../../ui/tokens';
import { Txt } from '../../ui/Txt';
import { useWords } from '../../ui/words';
import { enterLength } from '../keypad/lengthWords';
import { TapeKeypad } from '../keypad/TapeKeypad';
import { useSolved } from '../workspace/workspace';
import { withReading } from './readings';
import type { StationEntry } from './stations';
import { useStationName } from './useStationName';

interface ReadingPadProps {
  readonly entry: StationEntry;
  readonly survey: Survey;
  readonly last: boolean;
  readonly compact: boolean;
  readonly onSet: (survey: Survey) => void;
  readonly onClear: (readingId: string) => void;
  /** To the station before or after. */
  readonly onStep: (by: 1 | -1) => void;
}

/** One station's reading, huge, with the bedding it gives while it is typed, over the tape keypad. */
export function ReadingPad({ entry, survey, last, compact, onSet, onClear, onStep }: ReadingPadProps) {
  const t = useWords();
  const { drawing, setOut } = useSolved();
  const { units, tapeStep: step } = drawing;
  const name = useStationName(units, step);
  const [text, setText] = useState('');
  const [error, setError] = useState<string | null>(null);
  const [newId] = useState(newWriteId);
  const id = entry.reading?.id ?? newId;
  const typed = readLength(text, { units });
  const down = text === '' ? (entry.reading?.down ?? null) : typed.ok && typed.ticks >= 0 ? typed.ticks : null;
  const ground =
    down === null ? null : levelGround(drawing, setOut.walls, withReading(survey, id, entry.station, down));
  const here = ground?.stations.find((station) => station.readingId === id) ?? null;
  const write = (length: Ticks) => writeLength(length, { units, step, style: units === 'imperial' ? 'inches' : 'mm' });
  const lower = setOut.ground.highPoint !== null && here?.height === 0 ? setOut.ground.highPoint.down - here.down : 0;

  function enter(): void {
    if (text === '') return onStep(1);
    const entered = enterLength(text, { units, step }, t);
    if (!entered.ok) return setError(entered.words);
    setText('');
    onSet(withReading(survey, id, entry.station, entered.ticks));
  }

  return (
    <View style={{ flex: 1, minHeight: 0 }}>
      <ScrollView
        style={{ flex: 1 }}
        contentContainerStyle={{ paddingHorizontal: space.l, paddingVertical: space.s, gap: space.xs }}
      >
        <View style={{ flexDirection: 'row', alignItems: 'center', gap: space.xs }}>
          <IconButton icon="back" label={t('levels.previous')} onPress={() => onStep(-1)} />
          <View style={{ flex: 1 }}>
            <Txt size="large" weight="semibold" align="center" role="heading" level={2}>
              {name(entry)}
            </Txt>
            <Txt tone="soft" align="center">
              {t('levels.reading')}
            </Txt>
          </View>
          <IconButton icon="forward" label={t('levels.next')} onPress={() => onStep(1)} />
        </View>
        <View role="status" style={{ flexDirection: 'row', flexWrap: 'wrap', alignItems: 'flex-end', gap: space.s }}>
          <View style={{ flexGrow: 1 }}>
            {down === null ? (
              <Txt numeric size="screen" weight="semibold" tone="soft">
                {text === '' ? '–' : text}
              </Txt>
            ) : (
              <Measurement length={down} units={units} step={step} size="screen" />
            )}
          </View>
          {here ? (
            <View style={{ alignItems: 'flex-end', paddingBottom: space.s }}>
              <Txt tone="soft">{t(text === '' ? 'levels.bedding' : 'levels.beddingWill')}</Txt>
              <Measurement length={here.bedding} units={units} step={step} size="row" />
            </View>
          ) : null}
        </View>
        {here && here.over > 0 ? <Caution bare text={t('levels.over', { by: write(here.over) })} /> : null}
        {text !== '' && lower > 0 ? (
          <Caution bare weight="note" text={t('levels.newHighPoint', { by: write(ticks(lower)) })} />
        ) : null}
        {error ? <Caution bare text={error} /> : null}
        {entry.reading && text === '' ? (
          <Button
            kind="quiet"
            size="body"
            label={entry.along ? t('levels.removeStation') : t('levels.clear')}
            onPress={() => entry.reading && onClear(entry.reading.id)}
            style={{ alignSelf: 'flex-start', paddingHorizontal: 0 }}
          />
        ) : null}
      </ScrollView>
      <TapeKeypad
        units={units}
        step={step}
        value={text}
        onChange={(next) => {
          setText(next);
          setError(null);
        }}
        onEnter={enter}
        enterLabel={last ? t('levels.enterLast') : t('levels.enter')}
        compact={compact}
      />
    </View>
  );
}
