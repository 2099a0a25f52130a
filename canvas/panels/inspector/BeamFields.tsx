import { View } from 'react-native';
import { addBondBeam, changeBondBeam, deleteBondBeam } from '../../../model/drawing/edits/heights';
import type { BondBeam } from '../../../model/drawing/schema';
import { newWriteId } from '../../client/writeId';
import { Button } from '../../ui/Button';
import { space } from '../../ui/tokens';
import { Txt } from '../../ui/Txt';
import { useWords } from '../../ui/words';
import { useDraft } from '../workspace/workspace';
import { HoldChoice } from './HeightFields';
import { NameField } from './NameField';
import { Section } from './Section';
import { useFields } from './useFields';

/** The bond beams, lowest first as they are poured. */
export function BeamFields() {
  const t = useWords();
  const { editing, change } = useFields('plan.did.building');
  const beams = useDraft((state) => state.drawing.bondBeams);
  const sorted = [...beams].sort((a, b) => a.soffit - b.soffit);
  return (
    <Section title={t('plan.buildingSheet.beams')}>
      {beams.length === 0 && !editing ? <Txt tone="soft">{t('common.none')}</Txt> : null}
      {sorted.map((beam) => (
        <OneBeam key={beam.id} beam={beam} />
      ))}
      {editing ? (
        <Button
          label={t('plan.buildingSheet.addBeam')}
          icon="add"
          onPress={() => change((d) => addBondBeam(d, { name: t('plan.buildingSheet.newBeam') }, newWriteId))}
        />
      ) : null}
    </Section>
  );
}

function OneBeam({ beam }: { beam: BondBeam }) {
  const t = useWords();
  const { editing, length, change } = useFields('plan.did.building');
  const set = (fields: Partial<Omit<BondBeam, 'id'>>) => change((d) => changeBondBeam(d, beam.id, fields));
  const { bars } = beam;
  return (
    <View style={{ gap: space.m, paddingBottom: space.m }}>
      <NameField
        label={t('plan.inspector.name')}
        value={beam.name}
        disabled={!editing}
        onCommit={(name) => set({ name })}
      />
      {length({
        label: t('plan.buildingSheet.soffit'),
        value: beam.soffit,
        set: (d, soffit) => changeBondBeam(d, beam.id, { soffit }),
      })}
      {length({
        label: t('plan.buildingSheet.depth'),
        value: beam.depth,
        set: (d, depth) => changeBondBeam(d, beam.id, { depth }),
      })}
      {length({
        label: t('plan.buildingSheet.tolerance'),
        value: beam.tolerance,
        set: (d, tolerance) => changeBondBeam(d, beam.id, { tolerance }),
      })}
      <HoldChoice value={beam.hold} disabled={!editing} onChange={(hold) => set({ hold })} />
      <NameField
        numeric
        label={t('plan.buildingSheet.bars')}
        value={String(bars.count)}
        disabled={!editing}
        onCommit={(text) => {
          const count = Number(text);
          if (Number.isInteger(count)) set({ bars: { ...bars, count } });
        }}
      />
      {length({
        label: t('plan.buildingSheet.barDiameter'),
        value: bars.diameter,
        set: (d, diameter) => changeBondBeam(d, beam.id, { bars: { ...bars, diameter } }),
      })}
      {length({
        label: t('plan.buildingSheet.barLap'),
        value: bars.lap,
        set: (d, lap) => changeBondBeam(d, beam.id, { bars: { ...bars, lap } }),
      })}
      {editing ? (
        <Button
          label={t('plan.buildingSheet.remove', { name: beam.name || t('plan.buildingSheet.newBeam') })}
          icon="delete"
          kind="quiet"
          onPress={() => change((d) => deleteBondBeam(d, beam.id))}
        />
      ) : null}
    </View>
  );
}
