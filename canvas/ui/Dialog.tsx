import { useId, type ReactNode } from 'react';
import { Modal, Pressable, ScrollView, View } from 'react-native';
import { IconButton } from './IconButton';
import { radius, space } from './tokens';
import { Txt } from './Txt';
import { useTheme } from './theme';
import { useLayout } from './useLayout';
import { useWords } from './words';

export interface DialogProps {
  readonly open: boolean;
  readonly title: string;
  readonly onClose: () => void;
  readonly children?: ReactNode;
  /** Buttons, the one that goes ahead last. */
  readonly actions?: ReactNode;
}

/**
 * A dialog in the middle of the window; on a phone, a sheet from the bottom. It keeps the focus inside, closes by Escape,
 * by its cross and by a press outside, and gives the focus back to what opened it.
 */
export function Dialog({ open, title, onClose, children, actions }: DialogProps) {
  const { colours, strokes } = useTheme();
  const { name, height } = useLayout();
  const t = useWords();
  const id = useId();
  const phone = name === 'phone';
  if (!open) return null;
  return (
    <Modal transparent visible onRequestClose={onClose} {...({ 'aria-labelledby': `${id}-title` } as object)}>
      <View style={{ flex: 1, justifyContent: phone ? 'flex-end' : 'center', alignItems: 'center' }}>
        <Pressable
          onPress={onClose}
          tabIndex={-1}
          aria-hidden
          style={{ position: 'absolute', inset: 0, backgroundColor: colours.scrim }}
        />
        <View
          style={{
            width: '100%',
            maxWidth: phone ? undefined : 520,
            maxHeight: Math.round(height * 0.92),
            backgroundColor: colours.surface,
            borderColor: colours.rule,
            borderWidth: strokes.hair,
            borderRadius: phone ? 0 : radius,
          }}
        >
          <View
            style={{
              flexDirection: 'row',
              alignItems: 'center',
              gap: space.s,
              paddingLeft: space.xl,
              paddingRight: space.s,
              paddingVertical: space.s,
              borderBottomWidth: strokes.hair,
              borderColor: colours.rule,
            }}
          >
            <View style={{ flex: 1 }}>
              <Txt size="title" weight="semibold" role="heading" level={2} nativeID={`${id}-title`}>
                {title}
              </Txt>
            </View>
            <IconButton icon="close" label={t('common.close')} onPress={onClose} />
          </View>
          <ScrollView
            style={{ flexGrow: 0, flexShrink: 1 }}
            contentContainerStyle={{ padding: space.xl, gap: space.l }}
          >
            {children}
          </ScrollView>
          {actions ? (
            <View
              style={{
                flexDirection: 'row',
                flexWrap: 'wrap',
                justifyContent: 'flex-end',
                gap: space.m,
                paddingHorizontal: space.xl,
                paddingVertical: space.l,
                borderTopWidth: strokes.hair,
                borderColor: colours.rule,
              }}
            >
              {actions}
            </View>
          ) : null}
        </View>
      </View>
    </Modal>
  );
}
