import { View } from 'react-native';
import { noCutLengths } from '../../../model/bond/noCut';
import type { Drawing } from '../../../model/drawing/schema';
import type { Ticks } from '../../../model/length/ticks';
import type { Preview } from '../../store/preview';
import { drawnType } from '../../tools/toolHost';
import { Measurement } from '../../ui/Measurement';
import { radius, space } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { Txt } from '../../ui/Txt';
import { useWords } from '../../ui/words';
import { toScreen, type Camera, type ViewSize } from '../../viewport/camera';
import { useDraft } from '../workspace/workspace';
import { chipPlace } from './chipPlace';

/** Whether a run of this length between outside corners needs no cutting. */
export function needsNoCut(drawing: Drawing, length: Ticks): boolean {
  const type = drawnType(drawing);
  return type !== undefined && noCutLengths(type, ['outside', 'outside'], length).below === length;
}

/** The length being drawn or dragged, riding clear of the finger, with what the bond thinks of it and what was caught. */
export function LengthChip({ camera, size }: { camera: Camera; size: ViewSize }) {
  const { colours } = useTheme();
  const t = useWords();
  const preview = useDraft((state) => state.preview);
  const drawing = useDraft((state) => state.drawing);
  const length = preview ? shownLength(preview) : null;
  if (!preview?.at || (length === null && preview.caught === null)) return null;
  const { units, tapeStep } = drawing;
  const { left, top, width } = chipPlace(toScreen(camera, size, preview.at), preview.pointer, size);
  const angle = preview.run?.angle ?? null;
  const noCut = preview.run !== null && length !== null && length > 0 && needsNoCut(drawing, length);
  const said = noCut
    ? t('plan.noClosers')
    : preview.caught === null || preview.caught === 'noCut'
      ? null
      : t(`plan.caught.${preview.caught}`);
  return (
    <View pointerEvents="none" style={{ position: 'absolute', left, top, width, alignItems: 'center' }}>
      <View
        style={{
          flexDirection: 'row',
          alignItems: 'center',
          gap: space.m,
          paddingHorizontal: space.m,
          paddingVertical: space.xs,
          borderRadius: radius,
          backgroundColor: colours.tag,
        }}
      >
        {length === null ? null : (
          <Measurement length={length} units={units} step={tapeStep} size="row" form="feet" tone="onTag" />
        )}
        {angle === null ? null : (
          <Txt numeric size="table" tone="onTag">
            {t('plan.degrees', { value: Math.round(angle * 10) / 10 })}
          </Txt>
        )}
        {said === null ? null : (
          <Txt numeric size="table" weight="medium" style={{ color: colours.earth }}>
            {said}
          </Txt>
        )}
      </View>
    </View>
  );
}

function shownLength({ run, length }: Preview): Ticks | null {
  return run ? run.length : length;
}
