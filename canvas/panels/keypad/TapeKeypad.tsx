import { View } from 'react-native';
import type { Units } from '../../../model/drawing/schema';
import { TICKS_PER_INCH, type Ticks } from '../../../model/length/ticks';
import { fractionOf, pressTapeKey, type TapeKey } from '../../input/tapeEntry';
import { Button } from '../../ui/Button';
import { space } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { useWords } from '../../ui/words';
import { Key } from './Key';
import { useTapeTyping } from './useTapeTyping';

export interface TapeKeypadProps {
  readonly units: Units;
  /** The tape's step: which odd parts there are keys for. */
  readonly step: Ticks;
  /** The length as text so far, that `readLength` reads. */
  readonly value: string;
  readonly onChange: (text: string) => void;
  readonly onEnter: () => void;
  readonly enterLabel: string;
  readonly enterDisabled?: boolean;
  /** Lower keys, where a drawing needs the room. */
  readonly compact?: boolean;
}

interface KeySpec {
  readonly means: TapeKey;
  readonly face: string;
  readonly spoken: string;
}

/** Whole inches on the left, the fraction on the right; a physical keyboard types as well. */
export function TapeKeypad(props: TapeKeypadProps) {
  const { units, step, value, onChange, onEnter, enterLabel, enterDisabled = false, compact = false } = props;
  const { colours } = useTheme();
  const t = useWords();
  const height = compact ? 48 : 56;
  const parts = units === 'imperial' ? fractionOf(value) : null;
  useTapeTyping({ value, onChange, onEnter: enterDisabled ? null : onEnter });

  const digit = (face: string): KeySpec => ({ means: { kind: 'digit', digit: face }, face, spoken: face });
  const erase: KeySpec = { means: { kind: 'erase' }, face: 'erase', spoken: t('plan.keypad.erase') };
  const eighths = (count: number, face: string, spoken: string): KeySpec => ({
    means: { kind: 'eighths', count },
    face,
    spoken,
  });
  const odd = (count: number) => eighths(count, `${count}/8`, t('plan.keypad.eighths', { count }));
  const sixteenth: KeySpec = { means: { kind: 'odd', part: 16 }, face: '+1/16', spoken: t('plan.keypad.sixteenth') };
  const thirtySecond: KeySpec = {
    means: { kind: 'odd', part: 32 },
    face: '+1/32',
    spoken: t('plan.keypad.thirtySecond'),
  };
  const feet: KeySpec = { means: { kind: 'feet' }, face: '′', spoken: t('plan.keypad.feet') };
  const point: KeySpec = { means: { kind: 'point' }, face: '.', spoken: t('plan.keypad.point') };
  const unit = (name: 'mm' | 'm'): KeySpec => ({
    means: { kind: 'unit', unit: name },
    face: name,
    spoken: t(`plan.keypad.${name}`),
  });

  const quarters = [
    eighths(2, '1/4', t('plan.keypad.quarter')),
    eighths(4, '1/2', t('plan.keypad.half')),
    eighths(6, '3/4', t('plan.keypad.threeQuarters')),
  ] as const;
  const finest = step < TICKS_PER_INCH / 16 ? [sixteenth, thirtySecond] : step < TICKS_PER_INCH / 8 ? [sixteenth] : [];
  const rows: readonly (readonly [readonly KeySpec[], readonly KeySpec[]])[] =
    units === 'imperial'
      ? [
          [
            [digit('1'), digit('2'), digit('3')],
            [odd(1), quarters[0]],
          ],
          [
            [digit('4'), digit('5'), digit('6')],
            [odd(3), quarters[1]],
          ],
          [
            [digit('7'), digit('8'), digit('9')],
            [odd(5), quarters[2]],
          ],
          [
            [erase, digit('0'), feet],
            [odd(7), ...finest],
          ],
        ]
      : [
          [[digit('1'), digit('2'), digit('3')], [erase]],
          [[digit('4'), digit('5'), digit('6')], [unit('mm')]],
          [[digit('7'), digit('8'), digit('9')], [unit('m')]],
          [[digit('0'), point], []],
        ];

  function isOn({ means }: KeySpec): boolean {
    if (!parts) return means.kind === 'unit' && new RegExp(`\\d ${means.unit}$`).test(value);
    if (means.kind === 'eighths') return parts.eighths === means.count;
    return means.kind === 'odd' && (means.part === 16 ? parts.sixteenth : parts.thirtySecond);
  }

  function press({ means }: KeySpec): void {
    onChange(pressTapeKey(value, means, units));
  }

  return (
    <View
      role="group"
      aria-label={t('plan.keypad.label')}
      style={{ padding: space.m, gap: space.s, backgroundColor: colours.selected }}
    >
      {rows.map(([left, right]) => (
        <View key={left[0]?.face} style={{ flexDirection: 'row', gap: space.s }}>
          <View style={{ flex: 3, flexDirection: 'row', gap: space.s }}>
            {left.map((spec) => (
              <Key key={spec.face} face={spec.face} spoken={spec.spoken} height={height} onPress={() => press(spec)} />
            ))}
          </View>
          <View style={{ width: 1, backgroundColor: colours.rule }} />
          <View style={{ flex: units === 'imperial' ? 2 : 1, flexDirection: 'row', gap: space.s }}>
            {right.map((spec) => (
              <Key
                key={spec.face}
                face={spec.face}
                spoken={spec.spoken}
                height={height}
                on={isOn(spec)}
                onPress={() => press(spec)}
              />
            ))}
          </View>
        </View>
      ))}
      <Button
        label={enterLabel}
        kind="filled"
        onPress={onEnter}
        disabled={enterDisabled}
        style={{ minHeight: height }}
      />
    </View>
  );
}
