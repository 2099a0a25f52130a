import { View } from 'react-native';
import { addControlHeight, changeControlHeight, deleteControlHeight } from '../../../model/drawing/edits/heights';
import type { ControlHeight } from '../../../model/drawing/schema';
import { newWriteId } from '../../client/writeId';
import { Button } from '../../ui/Button';
import { Choice } from '../../ui/Choice';
import { Picker } from '../../ui/Picker';
import { space } from '../../ui/tokens';
import { Txt } from '../../ui/Txt';
import { useWords } from '../../ui/words';
import { useDraft } from '../workspace/workspace';
import { NameField } from './NameField';
import { Section } from './Section';
import { useFields } from './useFields';

const KINDS = ['plate', 'sill', 'head', 'named'] as const satisfies readonly ControlHeight['kind'][];

/** Heights that the course lines must meet, besides those that openings bring. */
export function HeightFields() {
  const t = useWords();
  const { editing, change } = useFields('plan.did.building');
  const heights = useDraft((state) => state.drawing.controlHeights);
  return (
    <Section title={t('plan.buildingSheet.heights')}>
      {heights.length === 0 && !editing ? <Txt tone="soft">{t('common.none')}</Txt> : null}
      {heights.map((height) => (
        <OneHeight key={height.id} height={height} />
      ))}
      {editing ? (
        <Button
          label={t('plan.buildingSheet.addHeight')}
          icon="add"
          onPress={() =>
            change((d) => addControlHeight(d, { kind: 'named', name: t('plan.buildingSheet.newHeight') }, newWriteId))
          }
        />
      ) : null}
    </Section>
  );
}

function OneHeight({ height }: { height: ControlHeight }) {
  const t = useWords();
  const { editing, length, change } = useFields('plan.did.building');
  const set = (fields: Partial<Omit<ControlHeight, 'id'>>) => change((d) => changeControlHeight(d, height.id, fields));
  return (
    <View style={{ gap: space.m, paddingBottom: space.m }}>
      <NameField
        label={t('plan.inspector.name')}
        value={height.name}
        disabled={!editing}
        onCommit={(name) => set({ name })}
      />
      <Picker
        label={t('plan.buildingSheet.heightKind')}
        options={KINDS.map((value) => ({ value, label: t(`plan.buildingSheet.${value}`) }))}
        value={height.kind}
        disabled={!editing}
        onChange={(kind) => set({ kind })}
      />
      {length({
        label: t('plan.buildingSheet.height'),
        value: height.height,
        set: (d, value) => changeControlHeight(d, height.id, { height: value }),
      })}
      {length({
        label: t('plan.buildingSheet.tolerance'),
        value: height.tolerance,
        set: (d, tolerance) => changeControlHeight(d, height.id, { tolerance }),
      })}
      <HoldChoice value={height.hold} disabled={!editing} onChange={(hold) => set({ hold })} />
      {height.hold === 'soft' ? (
        <NameField
          numeric
          label={t('plan.buildingSheet.weight')}
          value={String(height.weight)}
          disabled={!editing}
          onCommit={(text) => {
            const weight = Number(text);
            if (Number.isInteger(weight)) set({ weight });
          }}
        />
      ) : null}
      {editing ? (
        <Button
          label={t('plan.buildingSheet.remove', { name: height.name || t('plan.buildingSheet.newHeight') })}
          icon="delete"
          kind="quiet"
          onPress={() => change((d) => deleteControlHeight(d, height.id))}
        />
      ) : null}
    </View>
  );
}

export interface HoldChoiceProps {
  readonly value: 'hard' | 'soft';
  readonly disabled: boolean;
  readonly onChange: (hold: 'hard' | 'soft') => void;
}

/** How hard a height is held. */
export function HoldChoice({ value, disabled, onChange }: HoldChoiceProps) {
  const t = useWords();
  return (
    <Choice
      label={t('plan.buildingSheet.hold')}
      options={(['hard', 'soft'] as const).map((hold) => ({
        value: hold,
        label: t(`plan.buildingSheet.${hold}`),
        disabled,
      }))}
      value={value}
      onChange={onChange}
    />
  );
}
