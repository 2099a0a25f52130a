import { useState } from 'react';
import { View } from 'react-native';
import type { Station } from '../../../model/drawing/surveySchema';
import { readLength } from '../../../model/length/read';
import { writeLength } from '../../../model/length/write';
import { Caution } from '../../ui/Caution';
import { Dialog } from '../../ui/Dialog';
import { Measurement } from '../../ui/Measurement';
import { Picker } from '../../ui/Picker';
import { Txt } from '../../ui/Txt';
import { useWords } from '../../ui/words';
import { enterLength } from '../keypad/lengthWords';
import { TapeKeypad } from '../keypad/TapeKeypad';
import { useSolved } from '../workspace/workspace';

interface AddStationDialogProps {
  readonly isTaken: (station: Station) => boolean;
  readonly onAdd: (station: Station) => void;
  readonly onClose: () => void;
}

/** A station between corners: which run, and how far along it. */
export function AddStationDialog({ isTaken, onAdd, onClose }: AddStationDialogProps) {
  const t = useWords();
  const { drawing, setOut } = useSolved();
  const { units, tapeStep: step } = drawing;
  const { runs, runById, cornerById } = setOut.walls;
  const [runId, setRunId] = useState(runs[0]?.runId ?? '');
  const [text, setText] = useState('');
  const [error, setError] = useState<string | null>(null);
  const run = runById.get(runId);
  const letter = run ? (cornerById.get(run.ends[0].cornerId)?.letter ?? '') : '';
  const read = readLength(text, { units });

  function enter(): void {
    if (!run) return;
    const entered = enterLength(text, { units, step }, t);
    if (!entered.ok) return setError(entered.words);
    if (entered.ticks > run.length)
      return setError(t('levels.addPastEnd', { length: writeLength(run.length, { units, step }) }));
    const station = { kind: 'run', runId, at: entered.ticks } as const;
    if (isTaken(station)) return setError(t('levels.addTaken'));
    onAdd(station);
  }

  return (
    <Dialog open title={t('levels.addTitle')} onClose={onClose}>
      <Picker
        label={t('levels.addRun')}
        value={runId}
        onChange={(next) => {
          setRunId(next);
          setError(null);
        }}
        options={runs.map((each) => ({
          value: each.runId,
          label: `${each.name} · ${writeLength(each.length, { units, step })}`,
        }))}
      />
      <View role="status">
        <Txt tone="soft">{t('levels.addAt', { letter })}</Txt>
        {text === '' || !read.ok ? (
          <Txt numeric size="ledger" weight="semibold" tone="soft">
            {text === '' ? '–' : text}
          </Txt>
        ) : (
          <Measurement length={read.ticks} units={units} step={step} size="ledger" form="feet" />
        )}
      </View>
      {error ? <Caution text={error} /> : null}
      <TapeKeypad
        units={units}
        step={step}
        value={text}
        onChange={(next) => {
          setText(next);
          setError(null);
        }}
        onEnter={enter}
        enterLabel={t('levels.addAction')}
        enterDisabled={text === ''}
      />
    </Dialog>
  );
}
