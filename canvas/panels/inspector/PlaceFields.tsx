import { MAX_COORDINATE } from '../../../model/drawing/schema';
import { nameKeepClear } from '../../../model/drawing/edits/keepClears';
import { moveCorner } from '../../../model/drawing/edits/moveCorners';
import { ticks } from '../../../model/length/ticks';
import { Txt } from '../../ui/Txt';
import { useWords } from '../../ui/words';
import { useDraft, useSetOut } from '../workspace/workspace';
import { NameField } from './NameField';
import { Section } from './Section';
import { useFields } from './useFields';

/** A corner by its place on the plan. */
export function CornerFields({ cornerId }: { cornerId: string }) {
  const t = useWords();
  const { length } = useFields('plan.did.change');
  const { walls } = useSetOut();
  const corner = useDraft((state) => state.drawing.corners.find((one) => one.id === cornerId));
  if (!corner) return null;
  const least = ticks(-MAX_COORDINATE);
  const { x, y } = corner;
  const angle = walls.cornerById.get(cornerId)?.angle ?? null;
  return (
    <Section title={t('plan.inspector.corner', { letter: corner.letter })}>
      {angle === null ? null : (
        <Txt tone="soft">
          {t('plan.ledger.angle')}: {t('plan.degrees', { value: Math.round(angle * 10) / 10 })}
        </Txt>
      )}
      {length({
        label: t('plan.inspector.x'),
        value: x,
        form: 'feet',
        least,
        set: (d, to) => moveCorner(d, cornerId, { x: to, y }),
      })}
      {length({
        label: t('plan.inspector.y'),
        value: y,
        form: 'feet',
        least,
        set: (d, to) => moveCorner(d, cornerId, { x, y: to }),
      })}
    </Section>
  );
}

/** An area to keep free. */
export function KeepClearFields({ id }: { id: string }) {
  const t = useWords();
  const { editing, change } = useFields('plan.did.change');
  const area = useDraft((state) => state.drawing.keepClears.find((one) => one.id === id));
  if (!area) return null;
  return (
    <Section title={t('plan.ledger.keepClear')}>
      <NameField
        label={t('plan.inspector.name')}
        value={area.name}
        disabled={!editing}
        onCommit={(name) => change((d) => nameKeepClear(d, id, name))}
      />
      <Txt tone="soft">{t('plan.inspector.points', { count: area.points.length })}</Txt>
    </Section>
  );
}
