import { useRouter } from 'expo-router';
import { View } from 'react-native';
import { ticks } from '../../../model/length/ticks';
import { wordBrace, wordSetOff } from '../../../model/words/wordReason';
import { Button } from '../../ui/Button';
import { space } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { Txt } from '../../ui/Txt';
import { say, useWords } from '../../ui/words';
import { useDraft, useDraftActions, useSolved, useWorkspace } from '../workspace/workspace';
import { BigLength } from './BigLength';
import { bearingKey } from './bearingKey';
import type { LedgerProps } from './Ledger';
import { writerOf } from './tapeOf';

/** A pole: its first mark from the level line, and how its braces had to turn. */
export function PoleLedger({ id, onDetails }: LedgerProps & { id: string }) {
  const t = useWords();
  const router = useRouter();
  const { siteId } = useWorkspace();
  const actions = useDraftActions();
  const { drawing, setOut } = useSolved();
  const editing = useDraft((state) => state.mode === 'edit');
  const pole = setOut.poles.poleById.get(id);
  const corner = setOut.walls.cornerById.get(id);
  const letter = pole?.letter ?? corner?.letter ?? '';
  const first = setOut.marks.poles.find((one) => one.poleId === id)?.marks.find((mark) => mark.course === 1);
  const buttons = (
    <View style={{ flexDirection: 'row', gap: space.s }}>
      {editing ? <Button label={t('plan.details')} onPress={onDetails} /> : null}
      {pole ? (
        <Button
          label={t('plan.marks')}
          onPress={() => {
            actions.openPole(id);
            router.push(`/sites/${siteId}/poles`);
          }}
        />
      ) : null}
    </View>
  );
  if (!first || !pole)
    return (
      <View style={{ flexDirection: 'row', alignItems: 'center', gap: space.m }}>
        <Txt size="title" weight="semibold" style={{ flex: 1 }}>
          {t('plan.ledger.corner', { letter })}
        </Txt>
        {buttons}
      </View>
    );
  const below = first.printed.fromLine <= 0;
  const setOff = wordSetOff(pole, drawing, say, writerOf(drawing));
  const turned = pole.braces.filter((brace) => brace.turned !== 0);
  return (
    <>
      <BigLength
        label={t(below ? 'plan.ledger.pole' : 'plan.ledger.poleAbove', { letter })}
        length={ticks(Math.abs(first.printed.fromLine))}
        form="inches"
        after={buttons}
      />
      {turned.map((brace) => (
        <Line
          key={brace.id}
          left={t('plan.ledger.brace', { direction: t(`plan.directions.${bearingKey(brace.bearing)}`) })}
          right={wordBrace(brace, drawing, say)}
        />
      ))}
      {setOff ? <Line left={t('plan.ledger.poleNoMarks', { letter })} right={setOff} /> : null}
    </>
  );
}

/** A quiet word at the left, what the solver says of it at the right. */
export function Line({ left, right }: { left: string; right: string }) {
  const { colours, strokes } = useTheme();
  return (
    <View
      style={{
        flexDirection: 'row',
        flexWrap: 'wrap',
        justifyContent: 'space-between',
        columnGap: space.m,
        paddingTop: space.s,
        borderTopWidth: strokes.hair,
        borderColor: colours.rule,
      }}
    >
      <Txt size="large">{left}</Txt>
      <Txt size="large" weight="medium" tone="caution">
        {right}
      </Txt>
    </View>
  );
}
