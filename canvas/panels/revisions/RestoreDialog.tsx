import { useState } from 'react';
import { ApiError } from '../../client/api';
import { useRestoreRevision } from '../../client/revisions';
import { newWriteId } from '../../client/writeId';
import { Button } from '../../ui/Button';
import { Caution } from '../../ui/Caution';
import { Dialog } from '../../ui/Dialog';
import { toast } from '../../ui/toasts';
import { Txt } from '../../ui/Txt';
import { useWords } from '../../ui/words';
import { useDraftActions } from '../workspace/workspace';

/** Makes an older revision the draft again, after asking: the draft of now is set aside by the server. */
export function RestoreDialog(props: { siteId: string; number: number; onClose: () => void }) {
  const { siteId, number, onClose } = props;
  const t = useWords();
  const { flush, versions } = useDraftActions();
  const restore = useRestoreRevision(siteId);
  const [writeId] = useState(newWriteId);
  const [refused, setRefused] = useState<string | null>(null);
  const [busy, setBusy] = useState(false);

  async function go() {
    setBusy(true);
    setRefused(null);
    try {
      if ((await flush()) !== 'saved') return setRefused(t('revisions.save.unsaved'));
      const { drawing, survey } = versions();
      await restore.mutateAsync({ number, writeId, drawingVersion: drawing, surveyVersion: survey });
      toast(t('revisions.restore.done', { number }));
      onClose();
    } catch (error) {
      const stale = error instanceof ApiError && error.code === 'stale';
      setRefused(stale ? t('revisions.save.stale') : t('revisions.restore.failed', { number }));
    } finally {
      setBusy(false);
    }
  }

  return (
    <Dialog
      open
      title={t('revisions.restore.title', { number })}
      onClose={onClose}
      actions={
        <>
          <Button label={t('common.cancel')} onPress={onClose} />
          <Button
            kind="filled"
            label={t('revisions.restore.confirm', { number })}
            busy={busy}
            onPress={() => void go()}
          />
        </>
      }
    >
      <Txt size="large">{t('revisions.restore.text', { number })}</Txt>
      {refused ? <Caution text={refused} /> : null}
    </Dialog>
  );
}
