import { useState } from 'react';
import { View } from 'react-native';
import { setRunAngle, setRunLength } from '../../../model/drawing/edits/runLength';
import { setRunWallType } from '../../../model/drawing/edits/settings';
import { bearing } from '../../../model/geometry/vec';
import { inches } from '../../../model/length/ticks';
import { Button } from '../../ui/Button';
import { Measurement } from '../../ui/Measurement';
import { Picker } from '../../ui/Picker';
import { space } from '../../ui/tokens';
import { Txt } from '../../ui/Txt';
import { useWords } from '../../ui/words';
import { AngleDialog } from '../plan/AngleDialog';
import { useDraft, useDraftActions, useSetOut } from '../workspace/workspace';
import { Section } from './Section';
import { useFields } from './useFields';

/** A wall run: length, angle at its first corner, wall type. */
export function RunFields({ runId }: { runId: string }) {
  const t = useWords();
  const actions = useDraftActions();
  const { walls } = useSetOut();
  const { editing, length, change } = useFields('plan.did.change');
  const [turning, setTurning] = useState(false);
  const wallTypes = useDraft((state) => state.drawing.wallTypes);
  const units = useDraft((state) => state.drawing.units);
  const step = useDraft((state) => state.drawing.tapeStep);
  const run = walls.runById.get(runId);
  if (!run) return null;
  const corner = walls.cornerById.get(run.ends[0].cornerId);
  const angle = corner?.angle ?? null;

  /** The run turns about its first corner until the walls there stand at the angle. */
  function turnTo(degrees: number | null): void {
    if (degrees === null || angle === null || !run) return;
    const now = bearing(run.direction);
    // The corner's angle runs counter-clockwise from this run to the one before it, through the body.
    actions.edit('plan.did.setAngle', (d) => setRunAngle(d, runId, now + angle - degrees, 'from'));
  }

  return (
    <Section title={run.name}>
      {length({
        label: t('plan.inspector.length'),
        value: run.length,
        form: 'feet',
        least: inches(1),
        set: (d, value) => setRunLength(d, runId, value, 'from'),
      })}
      {angle === null ? null : (
        <View
          style={{
            flexDirection: 'row',
            alignItems: 'center',
            justifyContent: 'space-between',
            gap: space.m,
            minHeight: 48,
          }}
        >
          <Txt tone="soft">{t('plan.inspector.angleAtEnd', { letter: corner?.letter ?? '' })}</Txt>
          <Button
            label={t('plan.degrees', { value: Math.round(angle * 10) / 10 })}
            disabled={!editing}
            onPress={() => setTurning(true)}
          />
        </View>
      )}
      <Picker
        label={t('plan.inspector.wallType')}
        options={wallTypes.map((type) => ({ value: type.id, label: type.name }))}
        value={run.wallTypeId}
        disabled={!editing}
        onChange={(id) => change((d) => setRunWallType(d, runId, id))}
      />
      {(
        [
          [t('plan.inspector.inside'), run.insideLength],
          [t('plan.inspector.thickness'), run.thickness],
        ] as const
      ).map(([label, value]) => (
        <View key={label} style={{ flexDirection: 'row', justifyContent: 'space-between', gap: space.m }}>
          <Txt tone="soft">{label}</Txt>
          <Measurement length={value} units={units} step={step} form="feet" />
        </View>
      ))}
      <AngleDialog open={turning} onClose={() => setTurning(false)} onChoose={turnTo} any={false} />
    </Section>
  );
}
