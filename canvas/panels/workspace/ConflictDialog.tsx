import { useState } from 'react';
import { View } from 'react-native';
import { drawingOutlines } from '../../../model/drawing/emptyOutline';
import type { Drawing } from '../../../model/drawing/schema';
import type { DraftConflict } from '../../store/draftStore';
import { Button } from '../../ui/Button';
import { Dialog } from '../../ui/Dialog';
import { radius, space } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { Txt } from '../../ui/Txt';
import { useWords } from '../../ui/words';
import { OutlinePicture } from '../sites/OutlinePicture';
import { useDraft, useWorkspace } from './workspace';

/** Asks, wherever in the site the person is, which version to go on with when two were saved at once. */
export function ConflictWatch() {
  const conflicts = useDraft((state) => state.conflicts);
  const { resolve } = useWorkspace();
  const [put, putOff] = useState<DraftConflict | null>(null);
  const clash = conflicts[0];
  if (!clash || put?.conflict.theirs === clash.conflict.theirs) return null;
  return <ConflictDialog clash={clash} onChoose={(choice) => resolve(clash, choice)} onLater={() => putOff(clash)} />;
}

export interface ConflictDialogProps {
  readonly clash: DraftConflict;
  readonly onChoose: (choice: 'mine' | 'theirs') => void;
  readonly onLater: () => void;
}

/** Both versions side by side, as pictures and in numbers. */
export function ConflictDialog({ clash, onChoose, onLater }: ConflictDialogProps) {
  const t = useWords();
  const { part, conflict } = clash;
  const title = part === 'drawing' ? t('plan.conflict.title') : t('plan.conflict.surveyTitle');
  return (
    <Dialog
      open
      title={title}
      onClose={onLater}
      actions={
        <>
          <Button label={t('plan.conflict.chooseTheirs')} onPress={() => onChoose('theirs')} />
          <Button label={t('plan.conflict.chooseMine')} kind="filled" onPress={() => onChoose('mine')} />
        </>
      }
    >
      <Txt size="large">{t('plan.conflict.text', { who: conflict.by ?? t('plan.conflict.someone') })}</Txt>
      <View style={{ flexDirection: 'row', gap: space.l }}>
        {part === 'drawing' ? (
          <>
            <Version title={t('plan.conflict.mine')} drawing={clash.conflict.mine} />
            <Version title={t('plan.conflict.theirs')} drawing={clash.conflict.theirs} />
          </>
        ) : (
          <>
            <Readings title={t('plan.conflict.mine')} count={clash.conflict.mine.readings.length} />
            <Readings title={t('plan.conflict.theirs')} count={clash.conflict.theirs.readings.length} />
          </>
        )}
      </View>
    </Dialog>
  );
}

function Version({ title, drawing }: { title: string; drawing: Drawing }) {
  const t = useWords();
  const counts = t('plan.conflict.counts', {
    runs: t('plan.ledger.runs', { count: drawing.runs.length }),
    openings: t('plan.conflict.openings', { count: drawing.openings.length }),
  });
  return (
    <Side title={title} text={counts}>
      <OutlinePicture outline={drawingOutlines(drawing)} size={132} />
    </Side>
  );
}

function Readings({ title, count }: { title: string; count: number }) {
  const t = useWords();
  return <Side title={title} text={t('plan.conflict.readings', { count })} />;
}

function Side({ title, text, children }: { title: string; text: string; children?: React.ReactNode }) {
  const { colours, strokes } = useTheme();
  return (
    <View
      style={{
        flex: 1,
        gap: space.s,
        padding: space.m,
        borderWidth: strokes.hair,
        borderColor: colours.rule,
        borderRadius: radius,
      }}
    >
      <Txt weight="semibold">{title}</Txt>
      {children}
      <Txt tone="soft">{text}</Txt>
    </View>
  );
}
