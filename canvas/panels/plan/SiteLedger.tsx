import { View } from 'react-native';
import { TICKS_PER_FOOT, TICKS_PER_MM } from '../../../model/length/ticks';
import { Button } from '../../ui/Button';
import { space } from '../../ui/tokens';
import { Txt } from '../../ui/Txt';
import { useWords } from '../../ui/words';
import { useDraft, useSolved } from '../workspace/workspace';
import { CompareDraft } from './RevisionButtons';
import { BigLength } from './BigLength';
import type { LedgerProps } from './Ledger';

/** Nothing is selected: the building as a whole. */
export function SiteLedger({ onReasons, onBuilding }: LedgerProps) {
  const t = useWords();
  const { drawing, setOut } = useSolved();
  const editing = useDraft((state) => state.mode === 'edit');
  const mayDraw = useDraft((state) => state.role === 'lead' || state.role === 'designer');
  if (drawing.runs.length === 0)
    return (
      <View style={{ flexDirection: 'row', alignItems: 'center', gap: space.m }}>
        <View style={{ flex: 1, minWidth: 0, gap: space.xs }}>
          <Txt size="title" weight="semibold">
            {t('plan.empty.title')}
          </Txt>
          <Txt tone="soft">{mayDraw ? t('plan.empty.text') : t('plan.empty.viewText')}</Txt>
        </View>
        {editing ? <Button label={t('plan.building')} onPress={onBuilding} /> : null}
      </View>
    );
  const inside = setOut.walls.footprints.reduce((sum, footprint) => sum + footprint.areaInside, 0);
  const side = drawing.units === 'metric' ? 1000 * TICKS_PER_MM : TICKS_PER_FOOT;
  const area = Math.round((inside / side / side) * 10) / 10;
  const counts = [
    t('plan.ledger.runs', { count: setOut.walls.runs.length }),
    t('plan.ledger.courses', { count: setOut.coursing.courses.length }),
    inside > 0
      ? t(drawing.units === 'metric' ? 'plan.ledger.squareMetres' : 'plan.ledger.squareFeet', { value: area })
      : null,
  ].filter((text) => text !== null);
  return (
    <>
      <BigLength
        label={`${t('plan.ledger.site')} · ${counts.join(' · ')}`}
        length={setOut.walls.perimeter}
        after={<Button label={t('plan.building')} onPress={onBuilding} />}
      />
      {/* While drawing there is room for what is wrong, not for saying that nothing is. */}
      {editing && setOut.reasons.length === 0 ? null : <ReasonsButton onPress={onReasons} />}
      {editing ? null : <CompareDraft />}
    </>
  );
}

/** How many things don't fit, leading to their list. */
export function ReasonsButton({ onPress }: { onPress: () => void }) {
  const t = useWords();
  const { setOut } = useSolved();
  const wrong = setOut.reasons.filter((reason) => reason.weight !== 'note').length;
  const notes = setOut.reasons.length - wrong;
  if (wrong + notes === 0) return <Txt tone="soft">{t('plan.allFits')}</Txt>;
  const label = wrong > 0 ? t('plan.reasonsCount', { count: wrong }) : t('plan.notesCount', { count: notes });
  return (
    <Button
      label={label}
      kind="quiet"
      tone={wrong > 0 ? 'caution' : 'accent'}
      icon={wrong > 0 ? 'warning' : 'info'}
      onPress={onPress}
      style={{ justifyContent: 'flex-start', paddingHorizontal: 0 }}
    />
  );
}

export function BoundaryLedger() {
  const t = useWords();
  return (
    <Txt size="title" weight="semibold" style={{ minHeight: 48 }}>
      {t('plan.ledger.boundary')}
    </Txt>
  );
}

export function KeepClearLedger({ id, onDetails }: LedgerProps & { id: string }) {
  const t = useWords();
  const editing = useDraft((state) => state.mode === 'edit');
  const name = useDraft((state) => state.drawing.keepClears.find((area) => area.id === id)?.name ?? '');
  return (
    <View style={{ flexDirection: 'row', alignItems: 'center', gap: space.m, minHeight: 48 }}>
      <Txt size="title" weight="semibold" style={{ flex: 1 }}>
        {name === '' ? t('plan.ledger.keepClear') : name}
      </Txt>
      {editing ? <Button label={t('plan.details')} onPress={onDetails} /> : null}
    </View>
  );
}
