import { View } from 'react-native';
import type { Drawing } from '../../../model/drawing/schema';
import { roundTicks } from '../../../model/length/ticks';
import type { PoleMark } from '../../../model/marks/types';
import { IconButton } from '../../ui/IconButton';
import { Measurement } from '../../ui/Measurement';
import { space } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { Txt } from '../../ui/Txt';
import { useWords } from '../../ui/words';
import { nameOfMark } from './MarkRow';

export interface MarkLedgerProps {
  readonly drawing: Drawing;
  readonly letter: string;
  readonly mark: PoleMark;
  readonly onStep?: (step: 1 | -1) => void;
}

const SIDES = { down: 'poles.below', up: 'poles.above', onLine: 'poles.atLine' } as const;

/** The selected mark, huge: how far from the level line, and above the foundation here. */
export function MarkLedger({ drawing, letter, mark, onStep }: MarkLedgerProps) {
  const t = useWords();
  const { colours, strokes } = useTheme();
  const { fromLine, aboveFoundation } = mark.printed;
  const side = SIDES[fromLine === 0 ? 'onLine' : fromLine < 0 ? 'down' : 'up'];
  return (
    <View
      style={{
        backgroundColor: colours.surface,
        borderTopWidth: strokes.hair,
        borderColor: colours.rule,
        paddingHorizontal: space.l,
        paddingVertical: space.m,
        gap: space.xs,
      }}
    >
      <Txt tone="soft" numberOfLines={1}>
        {`${t('poles.pole', { letter })} · ${nameOfMark(mark, t)}`}
      </Txt>
      <View style={{ flexDirection: 'row', alignItems: 'center', gap: space.s }}>
        <View style={{ flex: 1, flexDirection: 'row', alignItems: 'baseline', flexWrap: 'wrap', columnGap: space.m }}>
          <Measurement
            length={roundTicks(Math.abs(fromLine))}
            units={drawing.units}
            step={drawing.tapeStep}
            size="ledger"
          />
          <Txt size="large" weight="medium" tone="level">
            {t(side)}
          </Txt>
        </View>
        {onStep ? (
          <>
            <IconButton icon="down" kind="outline" label={t('poles.nextDown')} onPress={() => onStep(-1)} />
            <IconButton icon="up" kind="outline" label={t('poles.nextUp')} onPress={() => onStep(1)} />
          </>
        ) : null}
      </View>
      <View style={{ flexDirection: 'row', alignItems: 'baseline', gap: space.s }}>
        <Measurement length={aboveFoundation} units={drawing.units} step={drawing.tapeStep} size="table" />
        <Txt tone="soft">{t('poles.aboveHere')}</Txt>
      </View>
    </View>
  );
}
