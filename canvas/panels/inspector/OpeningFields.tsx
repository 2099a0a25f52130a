import { changeOpening, moveOpening, type OpeningChange } from '../../../model/drawing/edits/openings';
import type { Opening } from '../../../model/drawing/schema';
import { Choice } from '../../ui/Choice';
import { useWords } from '../../ui/words';
import { useDraft, useSetOut } from '../workspace/workspace';
import { Section } from './Section';
import { useFields } from './useFields';

/** Every number of an opening. */
export function OpeningFields({ openingId }: { openingId: string }) {
  const t = useWords();
  const { walls } = useSetOut();
  const { editing, length, change } = useFields('plan.did.change');
  const opening = useDraft((state) => state.drawing.openings.find((one) => one.id === openingId));
  if (!opening) return null;
  const run = walls.runById.get(opening.runId);
  const letters = run?.ends.map((end) => walls.cornerById.get(end.cornerId)?.letter ?? '') ?? ['', ''];
  const set = (fields: OpeningChange) => change((d) => changeOpening(d, openingId, fields));
  const size = <Key extends 'width' | 'sill' | 'head' | 'frame'>(key: Key) =>
    length({
      label: t(`plan.inspector.${key}`),
      value: opening[key],
      set: (d, value) => changeOpening(d, openingId, { [key]: value }),
    });
  const { lintel } = opening;
  return (
    <Section title={t(`plan.ledger.${opening.kind}`, { run: run?.name ?? '' })}>
      {editing ? (
        <Choice
          label={t('plan.inspector.kind')}
          options={(['door', 'window', 'passage'] as const).map((value) => ({
            value,
            label: t(`plan.inspector.${value}`),
          }))}
          value={opening.kind}
          onChange={(kind) => set({ kind })}
        />
      ) : null}
      {length({
        label: t('plan.inspector.at', { letter: letters[0] ?? '' }),
        value: opening.at,
        form: 'feet',
        set: (d, at) => moveOpening(d, openingId, opening.runId, at),
      })}
      {size('width')}
      {opening.kind === 'window' ? size('sill') : null}
      {size('head')}
      {size('frame')}
      {length({
        label: t('plan.inspector.lintelDepth'),
        value: lintel.depth,
        set: (d, depth) => changeOpening(d, openingId, { lintel: { ...lintel, depth } }),
      })}
      {length({
        label: t('plan.inspector.lintelBearing'),
        value: lintel.bearing,
        set: (d, bearing) => changeOpening(d, openingId, { lintel: { ...lintel, bearing } }),
      })}
      {opening.kind === 'door' ? (
        <SwingFields door={opening} letters={letters} onChange={set} editing={editing} />
      ) : null}
      {opening.kind === 'window' ? null : <WayFields opening={opening} />}
    </Section>
  );
}

interface SwingFieldsProps {
  readonly door: Extract<Opening, { kind: 'door' }>;
  readonly letters: readonly string[];
  readonly onChange: (change: OpeningChange) => void;
  readonly editing: boolean;
}

function SwingFields({ door, letters, onChange, editing }: SwingFieldsProps) {
  const t = useWords();
  const { swing } = door;
  return (
    <>
      <Choice
        label={t('plan.inspector.hinge')}
        options={[
          { value: 'near', label: letters[0] ?? '', disabled: !editing },
          { value: 'far', label: letters[1] ?? '', disabled: !editing },
        ]}
        value={swing.hinge}
        onChange={(hinge) => onChange({ swing: { ...swing, hinge } })}
      />
      <Choice
        label={t('plan.inspector.opens')}
        options={[
          { value: 'in', label: t('plan.inspector.in'), disabled: !editing },
          { value: 'out', label: t('plan.inspector.out'), disabled: !editing },
        ]}
        value={swing.opens}
        onChange={(opens) => onChange({ swing: { ...swing, opens } })}
      />
    </>
  );
}

function WayFields({ opening }: { opening: Exclude<Opening, { kind: 'window' }> }) {
  const t = useWords();
  const { editing, length, change } = useFields('plan.did.change');
  const { way } = opening;
  return (
    <>
      <Choice
        label={t('plan.inspector.used')}
        options={[
          { value: 'yes', label: t('plan.inspector.yes'), disabled: !editing },
          { value: 'no', label: t('plan.inspector.no'), disabled: !editing },
        ]}
        value={way.used ? 'yes' : 'no'}
        onChange={(used) => change((d) => changeOpening(d, opening.id, { way: { ...way, used: used === 'yes' } }))}
      />
      {length({
        label: t('plan.inspector.wayWidth'),
        value: way.width,
        set: (d, width) => changeOpening(d, opening.id, { way: { ...way, width } }),
      })}
      {length({
        label: t('plan.inspector.wayDepth'),
        value: way.depth,
        set: (d, depth) => changeOpening(d, opening.id, { way: { ...way, depth } }),
      })}
    </>
  );
}
