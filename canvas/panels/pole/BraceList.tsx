import { View } from 'react-native';
import type { Drawing } from '../../../model/drawing/schema';
import { writeLength } from '../../../model/length/write';
import type { Brace, StoryPole } from '../../../model/poles/types';
import type { Reason } from '../../../model/reasons';
import { ruleValue } from '../../../model/rules/registry';
import type { SetOut } from '../../../model/setOut';
import { ticks, type Ticks } from '../../../model/length/ticks';
import { wordBrace, wordReason, wordSetOff } from '../../../model/words/wordReason';
import { Caution } from '../../ui/Caution';
import { Measurement } from '../../ui/Measurement';
import { space } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { Txt } from '../../ui/Txt';
import { say, useWords } from '../../ui/words';

export interface BraceListProps {
  readonly drawing: Drawing;
  readonly setOut: SetOut;
  readonly pole: StoryPole;
}

/** What the set-out has against this pole or its braces. */
function reasonsOf(pole: StoryPole, reasons: readonly Reason[]): Reason[] {
  const ids = new Set([pole.id, ...pole.braces.map((brace) => brace.id)]);
  return reasons.filter(({ thing }) => (thing.kind === 'pole' || thing.kind === 'brace') && ids.has(thing.id));
}

/** The pole's braces by their legs and feet, why they stand as they do, and what to mind before raising it. */
export function BraceList({ drawing, setOut, pole }: BraceListProps) {
  const t = useWords();
  const write = (length: Ticks) => writeLength(length, { units: drawing.units, step: drawing.tapeStep });
  const setOff = wordSetOff(pole, drawing, say, write);
  const power = write(ticks(ruleValue(drawing, 'powerLineDistance')));
  return (
    <View style={{ padding: space.l, gap: space.m }}>
      <Txt size="large" weight="semibold" role="heading" level={2}>
        {t('poles.braces')}
      </Txt>
      {setOff ? <Txt>{setOff}</Txt> : null}
      {pole.braces.length === 0 ? <Txt tone="soft">{t('poles.noBraces')}</Txt> : null}
      {pole.braces.map((brace, i) => (
        <BraceRow key={brace.id} drawing={drawing} setOut={setOut} brace={brace} number={i + 1} />
      ))}
      {reasonsOf(pole, setOut.reasons).map((reason, i) => (
        <Caution key={i} weight={reason.weight} text={wordReason(reason, drawing, say, write)} />
      ))}
      <Txt size="large" weight="semibold" role="heading" level={2} style={{ marginTop: space.s }}>
        {t('poles.cautions')}
      </Txt>
      <Caution text={t('poles.cautionPower', { distance: power })} />
      <Caution weight="note" text={t('poles.cautionPlumb')} />
      <Caution weight="note" text={t('poles.cautionMeasure')} />
      <Caution weight="note" text={t('poles.cautionCode')} />
    </View>
  );
}

function BraceRow(props: { drawing: Drawing; setOut: SetOut; brace: Brace; number: number }) {
  const { drawing, setOut, brace, number } = props;
  const t = useWords();
  const { colours, strokes } = useTheme();
  const length = (value: Ticks) => (
    <Measurement length={value} units={drawing.units} step={drawing.tapeStep} size="table" form="feet" />
  );
  return (
    <View style={{ gap: space.xs, borderTopWidth: strokes.hair, borderColor: colours.rule, paddingTop: space.s }}>
      <View style={{ flexDirection: 'row', justifyContent: 'space-between', gap: space.m }}>
        <Txt weight="semibold">{t('poles.brace', { number })}</Txt>
        <Txt tone="soft" align="right" style={{ flexShrink: 1 }}>
          {wordBrace(brace, drawing, say)}
        </Txt>
      </View>
      <View style={{ flexDirection: 'row', flexWrap: 'wrap', alignItems: 'baseline', columnGap: space.s }}>
        <Txt tone="soft">{t('poles.leg')}</Txt>
        {length(brace.leg)}
        <Txt tone="soft">{t('poles.slope', { degrees: Math.round(brace.slope) })}</Txt>
      </View>
      <View style={{ flexDirection: 'row', flexWrap: 'wrap', alignItems: 'baseline', columnGap: space.s }}>
        <Txt tone="soft">{t('poles.foot')}</Txt>
        {brace.ties.map((tie) => (
          <View key={tie.cornerId} style={{ flexDirection: 'row', alignItems: 'baseline', gap: space.s }}>
            {length(tie.distance)}
            <Txt tone="soft">
              {t('poles.fromCorner', { letter: setOut.walls.cornerById.get(tie.cornerId)?.letter ?? '' })}
            </Txt>
          </View>
        ))}
      </View>
    </View>
  );
}
