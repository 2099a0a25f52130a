import { View } from 'react-native';
import type { Drawing } from '../../../model/drawing/schema';
import { ticks, type Ticks } from '../../../model/length/ticks';
import { writeLength } from '../../../model/length/write';
import type { Ground } from '../../../model/survey/types';
import { Caution } from '../../ui/Caution';
import { Measurement } from '../../ui/Measurement';
import { space } from '../../ui/tokens';
import { Txt } from '../../ui/Txt';
import { useWords } from '../../ui/words';
import type { StationEntry } from './stations';
import { useStationName } from './useStationName';

interface GroundSummaryProps {
  readonly drawing: Drawing;
  readonly ground: Ground;
  readonly entries: readonly StationEntry[];
}

/** What the readings come to: the high point, the range, the first mark, and what to do where the bedding is too thick. */
export function GroundSummary({ drawing, ground, entries }: GroundSummaryProps) {
  const t = useWords();
  const { units, tapeStep: step } = drawing;
  const name = useStationName(units, step);
  const write = (length: Ticks) => writeLength(length, { units, step, style: units === 'imperial' ? 'inches' : 'mm' });
  const nameOf = (readingId: string) => {
    const entry = entries.find(({ reading }) => reading?.id === readingId);
    return entry ? name(entry) : '';
  };
  const over = ground.stations.filter((station) => station.over > 0);
  const worst = over.reduce<(typeof over)[number] | null>(
    (most, station) => (most === null || station.over > most.over ? station : most),
    null,
  );
  // The most that may be bedded, from any station: its bedding less what it is over.
  const most = worst ? write(ticks(worst.bedding - worst.over)) : '';
  return (
    <View style={{ gap: space.m, padding: space.l }}>
      {ground.assumed ? <Caution weight="note" text={t('levels.assumed')} /> : null}
      <View style={{ flexDirection: 'row', flexWrap: 'wrap', columnGap: space.xxl, rowGap: space.m }}>
        {ground.highPoint ? (
          <View>
            <Txt tone="soft">{t('levels.highPoint')}</Txt>
            <Txt size="large" weight="semibold">
              {nameOf(ground.highPoint.readingId)}
            </Txt>
          </View>
        ) : null}
        <View>
          <Txt tone="soft">{t('levels.range')}</Txt>
          <Measurement length={ground.range} units={units} step={step} size="row" />
        </View>
        <View>
          <Txt tone="soft">{t('levels.firstMark')}</Txt>
          <Measurement
            length={ticks(ground.levelLine - ground.firstCourseTop)}
            units={units}
            step={step}
            size="row"
            tone="level"
          />
        </View>
      </View>
      {worst ? (
        <View style={{ gap: space.s }}>
          <Caution
            text={`${t('levels.overMany', { count: over.length })} ${t('levels.overWorst', {
              name: nameOf(worst.readingId),
              by: write(worst.over),
            })}`}
          />
          <Txt weight="semibold">{t('levels.choices.title')}</Txt>
          <Txt>· {t('levels.choices.layers', { most })}</Txt>
          <Txt>· {t('levels.choices.grind', { by: write(worst.over) })}</Txt>
          <Txt>· {t('levels.choices.course')}</Txt>
          <Caution weight="note" bare text={t('common.cautions.silica')} />
        </View>
      ) : null}
    </View>
  );
}
