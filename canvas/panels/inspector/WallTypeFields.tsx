import { changeWallType } from '../../../model/drawing/edits/settings';
import type { WallType } from '../../../model/drawing/schema';
import { Choice } from '../../ui/Choice';
import { Txt } from '../../ui/Txt';
import { useWords } from '../../ui/words';
import { NameField } from './NameField';
import { Section } from './Section';
import { useFields } from './useFields';

/** A wall type: unit, joints, bedding and bond. */
export function WallTypeFields({ type }: { type: WallType }) {
  const t = useWords();
  const { editing, length, change } = useFields('plan.did.building');
  const set = (fields: Partial<Omit<WallType, 'id'>>) => change((d) => changeWallType(d, type.id, fields));
  const unit = (key: 'length' | 'width' | 'height', label: string) =>
    length({
      label,
      value: type.unit[key],
      set: (d, value) => changeWallType(d, type.id, { unit: { ...type.unit, [key]: value } }),
    });
  const joint = (which: 'headJoint' | 'bedJoint', key: 'nominal' | 'least' | 'most') =>
    length({
      label: `${t(`plan.buildingSheet.${which}`)} · ${t(`plan.buildingSheet.${key}`)}`,
      value: type[which][key],
      set: (d, value) => changeWallType(d, type.id, { [which]: { ...type[which], [key]: value } }),
    });
  const bedding = (key: 'least' | 'most') =>
    length({
      label: `${t('plan.buildingSheet.bedding')} · ${t(`plan.buildingSheet.${key}`)}`,
      value: type.bedding[key],
      set: (d, value) => changeWallType(d, type.id, { bedding: { ...type.bedding, [key]: value } }),
    });
  return (
    <Section title={`${t('plan.buildingSheet.wallType')} · ${type.name}`}>
      <NameField
        label={t('plan.inspector.name')}
        value={type.name}
        disabled={!editing}
        onCommit={(name) => set({ name })}
      />
      <NameField
        label={t('plan.buildingSheet.unitName')}
        value={type.unitName}
        disabled={!editing}
        onCommit={(unitName) => set({ unitName })}
      />
      <NameField
        label={t('plan.buildingSheet.mortarName')}
        value={type.mortarName}
        disabled={!editing}
        onCommit={(mortarName) => set({ mortarName })}
      />
      {unit('length', t('plan.buildingSheet.unitLength'))}
      {unit('width', t('plan.buildingSheet.unitWidth'))}
      {unit('height', t('plan.buildingSheet.unitHeight'))}
      <Choice
        label={t('plan.buildingSheet.laid')}
        options={(['stretcher', 'header'] as const).map((value) => ({
          value,
          label: t(`plan.buildingSheet.${value}`),
          disabled: !editing,
        }))}
        value={type.laid}
        onChange={(laid) => set({ laid })}
      />
      <Choice
        label={t('plan.buildingSheet.bond')}
        options={(['half', 'third', 'quarter'] as const).map((value) => ({
          value,
          label: t(`plan.buildingSheet.${value}`),
          disabled: !editing,
        }))}
        value={type.bondOffset}
        onChange={(bondOffset) => set({ bondOffset })}
      />
      {(['headJoint', 'bedJoint'] as const).map((which) =>
        (['nominal', 'least', 'most'] as const).map((key) => joint(which, key)),
      )}
      {bedding('least')}
      {bedding('most')}
      {length({
        label: t('plan.buildingSheet.leastLap'),
        value: type.leastLap,
        set: (d, leastLap) => changeWallType(d, type.id, { leastLap }),
      })}
      {length({
        label: t('plan.buildingSheet.leastPiece'),
        value: type.leastPiece,
        set: (d, leastPiece) => changeWallType(d, type.id, { leastPiece }),
      })}
      {editing ? null : <Txt tone="soft">{t('plan.inspector.pressDraw')}</Txt>}
    </Section>
  );
}
