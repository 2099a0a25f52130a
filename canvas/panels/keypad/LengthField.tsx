import { useState } from 'react';
import { Pressable, View } from 'react-native';
import { readLength } from '../../../model/length/read';
import type { Ticks } from '../../../model/length/ticks';
import { writeLength } from '../../../model/length/write';
import type { PressState } from '../../ui/Button';
import { Caution } from '../../ui/Caution';
import { Dialog } from '../../ui/Dialog';
import { Field } from '../../ui/Field';
import { Icon } from '../../ui/Icon';
import { Measurement } from '../../ui/Measurement';
import { radius, space, touch } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { Txt } from '../../ui/Txt';
import { useWords } from '../../ui/words';
import { enterLength, type LengthLimits } from './lengthWords';
import { TapeKeypad } from './TapeKeypad';
import { useCoarsePointer } from './useCoarsePointer';

export interface LengthFieldProps extends LengthLimits {
  readonly label: string;
  readonly value: Ticks;
  readonly onCommit: (length: Ticks) => void;
  readonly disabled?: boolean;
  readonly form?: 'inches' | 'feet';
}

/** One length to set: on a touch screen by the tape keypad, else typed, and taken on Enter or on leaving. */
export function LengthField(props: LengthFieldProps) {
  const coarse = useCoarsePointer();
  if (props.disabled) return <ShownLength {...props} />;
  return coarse ? <TouchLength {...props} /> : <TypedLength {...props} />;
}

function ShownLength({ label, value, units, step, form = 'feet' }: LengthFieldProps) {
  return (
    <View
      style={{
        flexDirection: 'row',
        alignItems: 'center',
        justifyContent: 'space-between',
        gap: space.m,
        minHeight: touch,
      }}
    >
      <Txt tone="soft" style={{ flexShrink: 1 }}>
        {label}
      </Txt>
      <Measurement length={value} units={units} step={step} form={form} />
    </View>
  );
}

function TypedLength(props: LengthFieldProps) {
  const { label, value, units, step, onCommit } = props;
  const t = useWords();
  const shown = writeLength(value, { units, step });
  const [text, setText] = useState(shown);
  const [error, setError] = useState<string | undefined>();
  const [of, setOf] = useState(shown);
  if (of !== shown) {
    // The value changed from outside: what was typed before is no longer of it.
    setOf(shown);
    setText(shown);
    setError(undefined);
  }

  function commit(): void {
    if (text === shown) return setError(undefined);
    const entered = enterLength(text, props, t);
    if (!entered.ok) return setError(entered.words);
    setError(undefined);
    setText(writeLength(entered.ticks, { units, step }));
    if (entered.ticks !== value) onCommit(entered.ticks);
  }

  return (
    <Field
      label={label}
      value={text}
      error={error}
      inputMode="decimal"
      autoComplete="off"
      onChangeText={setText}
      onBlur={commit}
      onSubmitEditing={commit}
      submitBehavior="submit"
      onKeyPress={(event) => {
        if (event.nativeEvent.key !== 'Escape') return;
        setText(shown);
        setError(undefined);
      }}
    />
  );
}

function TouchLength(props: LengthFieldProps) {
  const { label, value, units, step, form = 'feet' } = props;
  const { colours, strokes } = useTheme();
  const [open, setOpen] = useState(false);
  return (
    <>
      <Pressable
        role="button"
        onPress={() => setOpen(true)}
        style={({ pressed, hovered }: PressState) => ({
          flexDirection: 'row',
          alignItems: 'center',
          justifyContent: 'space-between',
          gap: space.m,
          minHeight: touch + 4,
          paddingHorizontal: space.m,
          borderRadius: radius,
          borderWidth: strokes.hair,
          borderColor: colours.edge,
          backgroundColor: pressed || hovered ? colours.hover : colours.surface,
        })}
      >
        <Txt style={{ flexShrink: 1 }}>{label}</Txt>
        <View style={{ flexDirection: 'row', alignItems: 'center', gap: space.s }}>
          <Measurement length={value} units={units} step={step} form={form} />
          <Icon name="edit" size={16} colour={colours.inkSoft} />
        </View>
      </Pressable>
      <LengthDialog {...props} open={open} onClose={() => setOpen(false)} />
    </>
  );
}

export interface LengthDialogProps extends LengthFieldProps {
  readonly open: boolean;
  readonly onClose: () => void;
}

/** The tape keypad in a dialog, with the length as it grows; empty each time it is opened. */
export function LengthDialog(props: LengthDialogProps) {
  return props.open ? <OpenLengthDialog {...props} /> : null;
}

function OpenLengthDialog(props: LengthDialogProps) {
  const { label, value, units, step, form = 'feet', onCommit, onClose } = props;
  const t = useWords();
  const [text, setText] = useState('');
  const [error, setError] = useState<string | undefined>();
  const read = readLength(text, { units });

  function enter(): void {
    if (text === '') return onClose();
    const entered = enterLength(text, props, t);
    if (!entered.ok) return setError(entered.words);
    onClose();
    if (entered.ticks !== value) onCommit(entered.ticks);
  }

  return (
    <Dialog open title={label} onClose={onClose}>
      <View role="status" style={{ minHeight: 60, justifyContent: 'center' }}>
        {text === '' || read.ok ? (
          <View style={{ opacity: text === '' ? 0.45 : 1 }}>
            <Measurement length={read.ok ? read.ticks : value} units={units} step={step} size="ledger" form={form} />
          </View>
        ) : (
          <Txt numeric size="ledger" weight="semibold">
            {text}
          </Txt>
        )}
      </View>
      {error ? <Caution text={error} bare /> : null}
      <TapeKeypad
        units={units}
        step={step}
        value={text}
        onChange={(next) => {
          setText(next);
          setError(undefined);
        }}
        onEnter={enter}
        enterLabel={t('plan.entry.set')}
      />
    </Dialog>
  );
}
