import { View } from 'react-native';
import { setTapeStep, setUnits } from '../../../model/drawing/edits/settings';
import type { Drawing } from '../../../model/drawing/schema';
import { ticks } from '../../../model/length/ticks';
import { Caution } from '../../ui/Caution';
import { Choice } from '../../ui/Choice';
import { Picker } from '../../ui/Picker';
import { space } from '../../ui/tokens';
import { useWords } from '../../ui/words';
import { useDraft } from '../workspace/workspace';
import { BeamFields } from './BeamFields';
import { HeightFields } from './HeightFields';
import { PoleKitFields } from './PoleKitFields';
import { Section } from './Section';
import { useFields } from './useFields';
import { WallTypeFields } from './WallTypeFields';

const STEPS: readonly {
  readonly value: `${number}`;
  readonly word: 'eighth' | 'sixteenth' | 'thirtySecond' | 'millimetre';
}[] = [
  { value: '2032', word: 'eighth' },
  { value: '1016', word: 'sixteenth' },
  { value: '508', word: 'thirtySecond' },
  { value: '640', word: 'millimetre' },
];

/** What holds for the whole building: its units and mortar, the heights to meet, beams, poles and tape. */
export function BuildingFields() {
  const t = useWords();
  const wallTypes = useDraft((state) => state.drawing.wallTypes);
  return (
    <View style={{ gap: space.xl }}>
      {wallTypes.map((type) => (
        <WallTypeFields key={type.id} type={type} />
      ))}
      <HeightFields />
      <BeamFields />
      <PoleKitFields />
      <TapeFields />
      <Caution weight="note" text={t('plan.buildingSheet.code')} />
    </View>
  );
}

function TapeFields() {
  const t = useWords();
  const { editing, change } = useFields('plan.did.building');
  const units = useDraft((state) => state.drawing.units);
  const tapeStep = useDraft((state) => state.drawing.tapeStep);
  return (
    <Section title={t('plan.buildingSheet.tape')}>
      <Choice<Drawing['units']>
        label={t('plan.buildingSheet.units')}
        options={(['imperial', 'metric'] as const).map((value) => ({
          value,
          label: t(`plan.buildingSheet.${value}`),
          disabled: !editing,
        }))}
        value={units}
        onChange={(next) => change((d) => setUnits(d, next))}
      />
      <Picker
        label={t('plan.buildingSheet.tapeStep')}
        options={STEPS.map(({ value, word }) => ({ value, label: t(`plan.buildingSheet.${word}`) }))}
        value={`${tapeStep}`}
        disabled={!editing}
        onChange={(value) => change((d) => setTapeStep(d, ticks(Number(value))))}
      />
    </Section>
  );
}
