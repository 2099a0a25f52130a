import { useState, type ReactNode } from 'react';
import { Pressable, View } from 'react-native';
import type { Ticks } from '../../../model/length/ticks';
import type { PressState } from '../../ui/Button';
import { Icon } from '../../ui/Icon';
import { Measurement } from '../../ui/Measurement';
import { radius, space } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { Txt } from '../../ui/Txt';
import { useLayout } from '../../ui/useLayout';
import { LengthDialog } from '../keypad/LengthField';
import { useDraft } from '../workspace/workspace';

export interface BigLengthProps {
  readonly label: string;
  readonly length: Ticks;
  readonly form?: 'inches' | 'feet';
  /** Sets it, where the person may: the number is then a button that opens the tape keypad. */
  readonly onCommit?: (length: Ticks) => void;
  readonly least?: Ticks;
  readonly after?: ReactNode;
}

/** The one number that matters, with its words above it. */
export function BigLength({ label, length, form = 'feet', onCommit, least, after }: BigLengthProps) {
  const { colours } = useTheme();
  const phone = useLayout().name === 'phone';
  const units = useDraft((state) => state.drawing.units);
  const step = useDraft((state) => state.drawing.tapeStep);
  const [open, setOpen] = useState(false);
  const size = phone ? 'ledger' : 'row';
  const number = <Measurement length={length} units={units} step={step} size={size} form={form} />;
  return (
    <View style={{ flexDirection: 'row', alignItems: 'flex-end', gap: space.m }}>
      <View style={{ flex: 1, minWidth: 0 }}>
        <Txt tone="soft" size="body" numberOfLines={2}>
          {label}
        </Txt>
        {onCommit ? (
          <Pressable
            role="button"
            onPress={() => setOpen(true)}
            style={({ pressed, hovered }: PressState) => ({
              flexDirection: 'row',
              alignItems: 'center',
              alignSelf: 'flex-start',
              gap: space.s,
              minHeight: 48,
              paddingRight: space.s,
              borderRadius: radius,
              backgroundColor: pressed || hovered ? colours.hover : 'transparent',
            })}
          >
            {number}
            <Icon name="edit" size={18} colour={colours.inkSoft} />
          </Pressable>
        ) : (
          <View style={{ minHeight: 48, justifyContent: 'center' }}>{number}</View>
        )}
      </View>
      {after}
      {onCommit ? (
        <LengthDialog
          open={open}
          onClose={() => setOpen(false)}
          label={label}
          value={length}
          units={units}
          step={step}
          form={form}
          least={least}
          onCommit={onCommit}
        />
      ) : null}
    </View>
  );
}
