import { View } from 'react-native';
import { changeOpening, moveOpening, type OpeningChange } from '../../../model/drawing/edits/openings';
import type { Ticks } from '../../../model/length/ticks';
import { Button } from '../../ui/Button';
import { space } from '../../ui/tokens';
import { useLayout } from '../../ui/useLayout';
import { useWords } from '../../ui/words';
import { LengthField } from '../keypad/LengthField';
import { useDraft, useDraftActions, useSetOut } from '../workspace/workspace';
import { BigLength } from './BigLength';
import type { LedgerProps } from './Ledger';

/** An opening: how far it stands from its run's first corner, and its width, sill and head. */
export function OpeningLedger({ openingId, onDetails }: LedgerProps & { openingId: string }) {
  const t = useWords();
  const actions = useDraftActions();
  const editing = useDraft((state) => state.mode === 'edit');
  const opening = useDraft((state) => state.drawing.openings.find((one) => one.id === openingId));
  // While drawing on a phone the room goes to what doesn't fit; the other sizes are under Details.
  const phone = useLayout().name === 'phone';
  const units = useDraft((state) => state.drawing.units);
  const step = useDraft((state) => state.drawing.tapeStep);
  const { walls } = useSetOut();
  if (!opening) return null;
  const run = walls.runById.get(opening.runId);
  const letter = walls.cornerById.get(run?.ends[0].cornerId ?? '')?.letter ?? '';
  const change = (fields: OpeningChange) => actions.edit('plan.did.change', (d) => changeOpening(d, openingId, fields));
  const field = (label: string, value: Ticks, onCommit: (length: Ticks) => void) => (
    <View style={{ flexGrow: 1, flexBasis: 140 }}>
      <LengthField
        label={label}
        value={value}
        units={units}
        step={step}
        form="inches"
        onCommit={onCommit}
        disabled={!editing}
      />
    </View>
  );
  const name = t(`plan.ledger.${opening.kind}`, { run: run?.name ?? '' });
  return (
    <>
      <BigLength
        label={`${name} · ${t('plan.ledger.at', { letter })}`}
        length={opening.at}
        onCommit={
          editing
            ? (at) => actions.edit('plan.did.slideOpening', (d) => moveOpening(d, openingId, opening.runId, at))
            : undefined
        }
        after={editing ? <Button label={t('plan.details')} onPress={onDetails} /> : null}
      />
      {editing && phone ? null : (
        <View style={{ flexDirection: 'row', flexWrap: 'wrap', columnGap: space.l, rowGap: space.s }}>
          {field(t('plan.ledger.width'), opening.width, (width) => change({ width }))}
          {opening.kind === 'window' ? field(t('plan.ledger.sill'), opening.sill, (sill) => change({ sill })) : null}
          {field(t('plan.ledger.head'), opening.head, (head) => change({ head }))}
        </View>
      )}
    </>
  );
}
