import { useRouter } from 'expo-router';
import { View } from 'react-native';
import { setRunLength } from '../../../model/drawing/edits/runLength';
import { inches, TICKS_PER_MM, ticks } from '../../../model/length/ticks';
import { Button } from '../../ui/Button';
import { space } from '../../ui/tokens';
import { Txt } from '../../ui/Txt';
import { useLayout } from '../../ui/useLayout';
import { useWords } from '../../ui/words';
import { useDraft, useDraftActions, useSolved, useWorkspace } from '../workspace/workspace';
import { BigLength } from './BigLength';
import type { LedgerProps } from './Ledger';
import { writerOf } from './tapeOf';

/** A wall run: its length to be set, and what the bond thinks of it. */
export function RunLedger({ runId, onDetails }: LedgerProps & { runId: string }) {
  const t = useWords();
  const router = useRouter();
  const wide = useLayout().name === 'wide';
  const { siteId } = useWorkspace();
  const actions = useDraftActions();
  const editing = useDraft((state) => state.mode === 'edit');
  const { drawing, setOut } = useSolved();
  const run = setOut.walls.runById.get(runId);
  const bond = setOut.bond.byRun.get(runId);
  if (!run) return <Txt tone="soft">{t('plan.inspector.nothing')}</Txt>;
  const write = writerOf(drawing);
  const set = (length: typeof run.length) =>
    actions.edit('plan.did.setLength', (d) => setRunLength(d, runId, length, 'from'));
  const noCut = bond?.noCut;
  const near = [noCut?.below, noCut?.above].filter((length) => length != null && length !== run.length);
  const fits = noCut?.below === run.length || noCut?.above === run.length;
  return (
    <>
      <BigLength
        label={t('plan.ledger.run', { name: run.name })}
        length={run.length}
        least={drawing.units === 'metric' ? ticks(10 * TICKS_PER_MM) : inches(1)}
        onCommit={editing ? set : undefined}
        after={
          <View style={{ flexDirection: 'row', gap: space.s }}>
            {editing ? <Button label={t('plan.details')} onPress={onDetails} /> : null}
            {wide ? null : (
              <Button
                label={t('plan.elevation')}
                onPress={() => {
                  actions.openRun(runId);
                  router.push(`/sites/${siteId}/elevation`);
                }}
              />
            )}
          </View>
        }
      />
      {fits ? (
        <Txt size="large">{t('plan.ledger.noCut')}</Txt>
      ) : (
        <View style={{ flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', gap: space.s }}>
          {bond ? <Txt size="large">{t('plan.ledger.closers', { count: bond.closersPerCoursePair })}</Txt> : null}
          {near.length > 0 ? <Txt tone="soft">{t('plan.ledger.noCutBelow')}</Txt> : null}
          {near.map((length) =>
            length == null ? null : editing ? (
              <Button key={length} label={write(length)} onPress={() => set(length)} size="body" />
            ) : (
              <Txt key={length} numeric size="table" weight="medium">
                {write(length)}
              </Txt>
            ),
          )}
        </View>
      )}
    </>
  );
}
