import { useState } from 'react';
import { View } from 'react-native';
import { Button } from '../../ui/Button';
import { Dialog } from '../../ui/Dialog';
import { Field } from '../../ui/Field';
import { space } from '../../ui/tokens';
import { useWords } from '../../ui/words';

const USUAL = [90, 45, 135, 60, 120] as const;

export interface AngleDialogProps {
  readonly open: boolean;
  readonly onClose: () => void;
  /** Degrees to the run before; null: any. */
  readonly onChoose: (degrees: number | null) => void;
  /** Whether any angle is an answer. */
  readonly any?: boolean;
}

/** An angle by its usual values or typed. */
export function AngleDialog({ open, onClose, onChoose, any = true }: AngleDialogProps) {
  const t = useWords();
  const [text, setText] = useState('');
  const [error, setError] = useState<string | undefined>();

  function choose(degrees: number | null): void {
    setText('');
    setError(undefined);
    onClose();
    onChoose(degrees);
  }

  function enter(): void {
    const degrees = Number(text.replace(',', '.').replace('°', '').trim());
    if (text.trim() === '' || !(degrees >= 1 && degrees <= 359)) return setError(t('plan.entry.badAngle'));
    choose(degrees);
  }

  return (
    <Dialog
      open={open}
      title={t('plan.angle')}
      onClose={onClose}
      actions={<Button label={t('plan.entry.set')} kind="filled" onPress={enter} />}
    >
      <View style={{ flexDirection: 'row', flexWrap: 'wrap', gap: space.s }}>
        {USUAL.map((degrees) => (
          <Button key={degrees} label={t('plan.degrees', { value: degrees })} onPress={() => choose(degrees)} />
        ))}
        {any ? <Button label={t('plan.angleAuto')} onPress={() => choose(null)} /> : null}
      </View>
      <Field
        label={t('plan.typeAngle')}
        value={text}
        error={error}
        inputMode="decimal"
        onChangeText={setText}
        onSubmitEditing={enter}
      />
    </Dialog>
  );
}
