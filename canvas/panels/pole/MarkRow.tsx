import { Pressable, View } from 'react-native';
import { sayLength } from '../../../model/length/say';
import { roundTicks, type Ticks } from '../../../model/length/ticks';
import type { PoleMark } from '../../../model/marks/types';
import { tagsOfMark } from '../../../model/figures/pole';
import type { Tape } from '../../../model/figures/figure';
import type { PressState } from '../../ui/Button';
import { Measurement } from '../../ui/Measurement';
import { radius, space } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { Txt } from '../../ui/Txt';
import { useWords, type Words } from '../../ui/words';

export interface MarkRowProps {
  readonly mark: PoleMark;
  readonly tape: Tape;
  readonly selected: boolean;
  /** With the distance from the pole's foot beside the other two. */
  readonly full: boolean;
  readonly height: number;
  readonly onPress: () => void;
}

/** What a mark is, in words: its course, and what else stands at that height. */
export function nameOfMark(mark: PoleMark, t: Words): string {
  const tags = tagsOfMark(mark).map((kind) => t(`poles.kinds.${kind}`));
  return [...(mark.course === null ? [] : [t('poles.courseNumber', { number: mark.course })]), ...tags].join(', ');
}

/** Which side of the level line a mark is on, as a key of `poles`. */
export function sideOf(fromLine: Ticks): 'down' | 'up' | 'onLine' {
  if (fromLine === 0) return 'onLine';
  return fromLine < 0 ? 'down' : 'up';
}

/** One mark of the table, joined by its leader to the steel. */
export function MarkRow({ mark, tape, selected, full, height, onPress }: MarkRowProps) {
  const t = useWords();
  const { colours, strokes } = useTheme();
  const { fromLine, fromFoot, aboveFoundation } = mark.printed;
  const say = (length: Ticks) => sayLength(length, tape.units, tape.step, tape.units === 'imperial' ? 'inches' : 'mm');
  const size = roundTicks(Math.abs(fromLine));
  const side = t(`poles.${sideOf(fromLine)}`);
  const tags = tagsOfMark(mark);
  const spoken = `${nameOfMark(mark, t)}: ${fromLine === 0 ? side : `${side} ${say(size)}`}, ${say(aboveFoundation)} ${t('poles.aboveHere')}`;
  const number = (length: Ticks) => (
    <Measurement
      length={length}
      units={tape.units}
      step={tape.step}
      size="table"
      weight={selected ? 'semibold' : 'medium'}
    />
  );
  return (
    <Pressable
      role="button"
      aria-label={spoken}
      {...({ 'aria-pressed': selected } as object)}
      onPress={onPress}
      style={({ hovered }: PressState) => ({
        height,
        flexDirection: 'row',
        alignItems: 'center',
        paddingHorizontal: space.s,
        gap: space.xs,
        borderBottomWidth: strokes.hair,
        borderColor: colours.rule,
        backgroundColor: selected ? colours.selected : hovered ? colours.hover : colours.surface,
      })}
    >
      <View style={{ flex: 1, minWidth: 0, flexDirection: 'row', alignItems: 'center', gap: space.s }}>
        {mark.course === null ? null : (
          <Txt numeric size="table" weight={selected ? 'semibold' : 'medium'} style={{ minWidth: 20 }}>
            {mark.course}
          </Txt>
        )}
        {tags.length === 0 ? null : (
          <View
            style={{
              flexShrink: 1,
              borderWidth: strokes.hair,
              borderColor: colours.frame,
              borderRadius: radius,
              paddingHorizontal: 5,
            }}
          >
            <Txt numeric size="small" weight="medium" tone="frame" numberOfLines={1} style={{ fontSize: 14 }}>
              {tags.map((kind) => t(`poles.kinds.${kind}`)).join(', ')}
            </Txt>
          </View>
        )}
      </View>
      <View style={{ width: 104, flexDirection: 'row', justifyContent: 'flex-end', alignItems: 'baseline', gap: 5 }}>
        <Txt numeric size="table" tone="level">
          {side}
        </Txt>
        {fromLine === 0 ? null : number(size)}
      </View>
      {full ? <View style={{ width: 96, alignItems: 'flex-end' }}>{number(fromFoot)}</View> : null}
      <View style={{ width: full ? 130 : 84, alignItems: 'flex-end' }}>{number(aboveFoundation)}</View>
    </Pressable>
  );
}
