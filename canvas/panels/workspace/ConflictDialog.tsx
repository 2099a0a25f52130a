import { useMemo, type ReactNode } from 'react';
import { View } from 'react-native';
import { drawingOutlines } from '../../../model/drawing/emptyOutline';
import type { Drawing } from '../../../model/drawing/schema';
import type { DraftConflict } from '../../store/draftStore';
import { Button } from '../../ui/Button';
import { Dialog } from '../../ui/Dialog';
import { radius, space } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { Txt } from '../../ui/Txt';
import { say, useWords } from '../../ui/words';
import { OutlinePicture } from '../sites/OutlinePicture';
import { clashWords } from './clashWords';

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
      {part === 'drawing' ? <Differences theirs={clash.conflict.theirs} mine={clash.conflict.mine} /> : null}
    </Dialog>
  );
}

/** More than this is read better after choosing, by comparing. */
const SHOWN = 8;

function Differences({ theirs, mine }: { theirs: Drawing; mine: Drawing }) {
  const t = useWords();
  const changes = useMemo(() => clashWords(theirs, mine, say), [theirs, mine]);
  if (changes.length === 0) return <Txt tone="soft">{t('plan.conflict.same')}</Txt>;
  return (
    <View role="list" style={{ gap: space.xs }}>
      <Txt weight="semibold">{t('plan.conflict.differs')}</Txt>
      {changes.slice(0, SHOWN).map(({ about, what }, i) => (
        <Txt key={i} role="listitem">
          <Txt weight="medium">{about}</Txt> {what}
        </Txt>
      ))}
      {changes.length > SHOWN ? (
        <Txt tone="soft">{t('plan.conflict.moreDiffers', { count: changes.length - SHOWN })}</Txt>
      ) : null}
    </View>
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

function Side({ title, text, children }: { title: string; text: string; children?: ReactNode }) {
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
