import { useState } from 'react';
import { z } from 'zod';
import { newRevisionSchema } from '../../../model/contracts/drawings';
import { ApiError } from '../../client/api';
import { useSaveRevision } from '../../client/revisions';
import { newWriteId } from '../../client/writeId';
import { Button } from '../../ui/Button';
import { Caution } from '../../ui/Caution';
import { Dialog } from '../../ui/Dialog';
import { FormField } from '../../ui/FormField';
import { toast } from '../../ui/toasts';
import { Txt } from '../../ui/Txt';
import { useCheckedForm } from '../../ui/useCheckedForm';
import { useWords } from '../../ui/words';
import { useDraftActions, useSetOut } from '../workspace/workspace';

/** Saves what is on the screen as the next revision: first as the draft, then, from that very version, as the revision. */
export function SaveRevisionDialog(props: { siteId: string; number: number; onClose: () => void }) {
  const { siteId, number, onClose } = props;
  const t = useWords();
  const { flush, versions } = useDraftActions();
  const { reasons } = useSetOut();
  const save = useSaveRevision(siteId);
  const [refused, setRefused] = useState<string | null>(null);
  // One write however often it is pressed: the server answers the second try as it did the first.
  const [writeId] = useState(newWriteId);
  const wrong = reasons.filter(({ weight }) => weight !== 'note').length;

  const form = useCheckedForm({
    schema: () => z.object({ note: newRevisionSchema.shape.note }),
    initial: { note: '' },
    onSend: async ({ note }) => {
      setRefused(null);
      if ((await flush()) !== 'saved') {
        setRefused(t('revisions.save.unsaved'));
        return;
      }
      const { drawing, survey } = versions();
      try {
        await save.mutateAsync({ writeId, note, drawingVersion: drawing, surveyVersion: survey });
        toast(t('revisions.save.saved', { number }));
        onClose();
      } catch (error) {
        const stale = error instanceof ApiError && error.code === 'stale';
        setRefused(stale ? t('revisions.save.stale') : t('revisions.save.failed'));
      }
    },
  });

  return (
    <Dialog
      open
      title={t('revisions.save.title', { number })}
      onClose={onClose}
      actions={
        <>
          <Button label={t('common.cancel')} onPress={onClose} />
          <Button kind="filled" label={t('revisions.save.confirm', { number })} busy={form.busy} onPress={form.send} />
        </>
      }
    >
      <Txt tone="soft">{t('revisions.save.text')}</Txt>
      <FormField
        form={form}
        name="note"
        label={t('revisions.save.note')}
        placeholder={t('revisions.save.notePlaceholder')}
        maxLength={500}
        autoFocus
      />
      {wrong > 0 ? <Caution text={t('revisions.save.reasons', { count: wrong })} /> : null}
      {refused ? <Caution text={refused} /> : null}
    </Dialog>
  );
}
