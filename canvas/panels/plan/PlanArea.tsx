import { View } from 'react-native';
import type { Figure } from '../../../model/figures/figure';
import type { StrokeEvent } from '../../input/events';
import { useWords } from '../../ui/words';
import { PlanViewport } from '../../viewport/PlanViewport';
import { useDraft, useDraftActions } from '../workspace/workspace';
import { LengthChip } from './LengthChip';
import { PartsList } from './PartsList';
import { PlanPicture } from './PlanPicture';
import { PreviewPicture } from './PreviewPicture';
import type { PlanCamera } from './usePlanCamera';

const UNPLACED = { x: 0, y: 0, scale: 1e-4 };

export interface PlanAreaProps {
  readonly camera: PlanCamera;
  readonly figure: Figure | null;
  readonly onStroke: (event: StrokeEvent) => 'keep' | 'pan';
}

/** The drawing itself, with what the tool shows over it and, for the keyboard, the list of its parts. */
export function PlanArea({ camera, figure, onStroke }: PlanAreaProps) {
  const t = useWords();
  const actions = useDraftActions();
  const pen = useDraft((state) => state.pen);
  const shown = camera.camera;
  return (
    <View style={{ flex: 1, minHeight: 0 }}>
      <PlanViewport
        camera={shown ?? UNPLACED}
        size={camera.size}
        glideFrom={camera.glideFrom}
        onSize={camera.onSize}
        onCamera={camera.setCamera}
        onStroke={onStroke}
        fingersOnlyMove={pen === 'draws'}
        onPenSeen={() => {
          // The first pen to come near draws, and fingers move from then on, until the switch says otherwise.
          if (pen === 'unseen') actions.setPen('draws');
        }}
        label={t('plan.drawing')}
      >
        {shown && figure ? (
          <>
            <PlanPicture figure={figure} camera={shown} size={camera.size} />
            <PreviewPicture camera={shown} size={camera.size} />
          </>
        ) : null}
      </PlanViewport>
      {shown ? <LengthChip camera={shown} size={camera.size} /> : null}
      <PartsList />
    </View>
  );
}
