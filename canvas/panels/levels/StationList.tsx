import { Pressable, View } from 'react-native';
import type { Units } from '../../../model/drawing/schema';
import type { Ticks } from '../../../model/length/ticks';
import type { Ground } from '../../../model/survey/types';
import type { PressState } from '../../ui/Button';
import { Icon } from '../../ui/Icon';
import { Letter } from '../../ui/Letter';
import { Measurement } from '../../ui/Measurement';
import { space } from '../../ui/tokens';
import { Txt } from '../../ui/Txt';
import { useTheme } from '../../ui/theme';
import { useWords } from '../../ui/words';
import type { StationEntry } from './stations';
import { useStationName } from './useStationName';

interface StationListProps {
  readonly entries: readonly StationEntry[];
  readonly ground: Ground;
  readonly units: Units;
  readonly step: Ticks;
  readonly selected: string | null;
  readonly onSelect: (key: string) => void;
}

/** Every station with its reading and the bedding there; the high point and what is over its most are named. */
export function StationList({ entries, ground, units, step, selected, onSelect }: StationListProps) {
  const t = useWords();
  const byReading = new Map(ground.stations.map((station) => [station.readingId, station]));
  return (
    <View role="list" aria-label={t('levels.stations')}>
      {entries.map((entry) => (
        <View role="listitem" key={entry.key}>
          <StationRow
            entry={entry}
            at={entry.reading ? (byReading.get(entry.reading.id) ?? null) : null}
            high={entry.reading !== null && ground.highPoint?.readingId === entry.reading.id}
            units={units}
            step={step}
            selected={entry.key === selected}
            onSelect={() => onSelect(entry.key)}
          />
        </View>
      ))}
    </View>
  );
}

interface StationRowProps {
  readonly entry: StationEntry;
  readonly at: Ground['stations'][number] | null;
  readonly high: boolean;
  readonly units: Units;
  readonly step: Ticks;
  readonly selected: boolean;
  readonly onSelect: () => void;
}

function StationRow({ entry, at, high, units, step, selected, onSelect }: StationRowProps) {
  const t = useWords();
  const { colours, strokes } = useTheme();
  const name = useStationName(units, step);
  return (
    <Pressable
      role="button"
      {...({ 'aria-pressed': selected } as object)}
      onPress={onSelect}
      style={({ pressed, hovered }: PressState) => ({
        flexDirection: 'row',
        alignItems: 'center',
        gap: space.m,
        minHeight: 56,
        paddingHorizontal: space.l,
        paddingVertical: space.s,
        borderBottomWidth: strokes.hair,
        borderColor: colours.rule,
        backgroundColor: selected ? colours.selected : pressed || hovered ? colours.hover : colours.surface,
      })}
    >
      {entry.letter === null ? (
        <View style={{ width: 36, alignItems: 'center' }}>
          <View style={{ width: 9, height: 9, borderRadius: 5, backgroundColor: colours.steel }} />
        </View>
      ) : (
        <Letter letter={entry.letter} selected={selected} />
      )}
      <View style={{ flex: 1, minWidth: 0 }}>
        <Txt weight="medium">{name(entry)}</Txt>
        {at === null ? (
          <Txt size="small" tone="soft">
            {t('levels.noReading')}
          </Txt>
        ) : (
          <View style={{ flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', columnGap: space.xs }}>
            {at.over > 0 ? <Icon name="warning" size={16} colour={colours.caution} /> : null}
            <Txt size="small" tone={at.over > 0 ? 'caution' : 'soft'} weight={at.over > 0 ? 'medium' : 'regular'}>
              {t('levels.bedding')}
            </Txt>
            <Measurement length={at.bedding} units={units} step={step} tone={at.over > 0 ? 'caution' : 'soft'} />
            {high ? (
              <Txt size="small" weight="semibold" tone="accent">
                · {t('levels.isHighPoint')}
              </Txt>
            ) : null}
          </View>
        )}
      </View>
      {entry.reading ? <Measurement length={entry.reading.down} units={units} step={step} size="row" /> : null}
    </Pressable>
  );
}
