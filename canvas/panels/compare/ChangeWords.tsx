import { View } from 'react-native';
import { writeLength } from '../../../model/length/write';
import type { Ticks } from '../../../model/length/ticks';
import { wordChange, wordRemark } from '../../../model/words/wordChange';
import { Letter } from '../../ui/Letter';
import { radius, space } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { Txt } from '../../ui/Txt';
import { say, useWords } from '../../ui/words';
import type { Compared, NumberedChanges } from './comparedStates';

/** In words: what changed, numbered as on the plans, and then which poles to mark again. */
export function ChangeWords({ compared }: { compared: Compared }) {
  const t = useWords();
  const { colours, strokes } = useTheme();
  const { drawing } = compared.after;
  const write = (length: Ticks) => writeLength(length, { units: drawing.units, step: drawing.tapeStep });
  const { polesToRemark } = compared.comparison;
  const edge = { borderTopWidth: strokes.hair, borderColor: colours.rule, paddingVertical: space.m } as const;
  return (
    <View style={{ padding: space.l, gap: space.s }}>
      <Txt size="large" weight="semibold" role="heading" level={2}>
        {t('revisions.compare.changes')}
      </Txt>
      {compared.numbered.length === 0 ? <Txt tone="soft">{t('revisions.compare.noChanges')}</Txt> : null}
      <View role="list">
        {compared.numbered.map((changes) => (
          <View key={changes.number} role="listitem" style={[edge, { flexDirection: 'row', gap: space.m }]}>
            <NumberTag number={changes.number} />
            <View style={{ flex: 1 }}>
              <WordsOfThing compared={compared} numbered={changes} write={write} />
            </View>
          </View>
        ))}
      </View>
      <Txt size="large" weight="semibold" role="heading" level={2} style={{ marginTop: space.l }}>
        {t('revisions.compare.poles')}
      </Txt>
      {polesToRemark.length === 0 ? <Txt tone="soft">{t('revisions.compare.noPoles')}</Txt> : null}
      {polesToRemark.map((pole) => {
        const words = wordRemark(pole, say, write);
        return (
          <View
            key={`${pole.poleId} ${pole.lift}`}
            style={[edge, { flexDirection: 'row', alignItems: 'center', gap: space.m }]}
          >
            <Letter letter={pole.letter} />
            <View style={{ flex: 1 }}>
              <Txt weight="medium">{`${t('revisions.compare.lift')} ${pole.lift}`}</Txt>
              <Txt tone="soft">{`${t('revisions.compare.courses')} ${words.courses}`}</Txt>
            </View>
            <Txt numeric size="table" weight="semibold" align="right" style={{ flexShrink: 1 }}>
              {words.by}
            </Txt>
          </View>
        );
      })}
    </View>
  );
}

function WordsOfThing(props: { compared: Compared; numbered: NumberedChanges; write: (length: Ticks) => string }) {
  const { compared, numbered, write } = props;
  const worded = numbered.changes.map((change) =>
    wordChange(change, compared.before.drawing, compared.after.drawing, say, write),
  );
  return (
    <>
      <Txt weight="semibold">{worded[0]?.about}</Txt>
      {worded.map((words, i) => (
        <Txt key={i} tone="soft">
          {words.what}
        </Txt>
      ))}
    </>
  );
}

/** The number of a change, as it stands on the plan. */
function NumberTag({ number }: { number: number }) {
  const { colours } = useTheme();
  return (
    <View
      style={{
        minWidth: 26,
        height: 26,
        borderRadius: radius,
        alignItems: 'center',
        justifyContent: 'center',
        backgroundColor: colours.caution,
      }}
    >
      <Txt numeric size="table" weight="semibold" style={{ color: colours.surface }}>
        {number}
      </Txt>
    </View>
  );
}
