import { changePoleKit } from '../../../model/drawing/edits/settings';
import type { PoleKit } from '../../../model/drawing/schema';
import { useWords } from '../../ui/words';
import { useDraft } from '../workspace/workspace';
import { NameField } from './NameField';
import { Section } from './Section';
import { useFields } from './useFields';

const SIZES = [
  'leg',
  'steel',
  'stockLength',
  'poleLength',
  'footLap',
  'spacer',
  'clearance',
  'lineBlock',
  'kerf',
] as const;
const BRACE = ['leastLeg', 'mostLeg', 'fixing', 'headRoom'] as const;
const LINE = ['lineWeight', 'linePull'] as const;

/** The poles, their braces and the line. */
export function PoleKitFields() {
  const t = useWords();
  const { editing, length, change } = useFields('plan.did.building');
  const kit = useDraft((state) => state.drawing.poleKit);
  return (
    <Section title={t('plan.buildingSheet.poles')}>
      {SIZES.map((key) =>
        length({
          label: t(`plan.buildingSheet.${key}`),
          value: kit[key],
          set: (d, value) => changePoleKit(d, { [key]: value } satisfies Partial<PoleKit>),
        }),
      )}
      {BRACE.map((key) =>
        length({
          label: t(`plan.buildingSheet.${key}`),
          value: kit.brace[key],
          set: (d, value) => changePoleKit(d, { brace: { ...kit.brace, [key]: value } }),
        }),
      )}
      {LINE.map((key) => (
        <NameField
          key={key}
          numeric
          label={t(`plan.buildingSheet.${key}`)}
          value={String(kit[key])}
          disabled={!editing}
          onCommit={(text) => {
            const value = Number(text.replace(',', '.'));
            if (Number.isFinite(value)) change((d) => changePoleKit(d, { [key]: value }));
          }}
        />
      ))}
    </Section>
  );
}
