import { useEffect, useSyncExternalStore } from 'react';
import { Pressable, View } from 'react-native';
import { Icon } from './Icon';
import { radius, space, touch } from './tokens';
import { currentToast, dismissToast, watchToasts } from './toasts';
import { Txt } from './Txt';
import { useTheme } from './theme';

export { toast } from './toasts';

const SHOWN_FOR_MS = 6000;

/** Where toasts appear; put once, at the root. A polite live region, so that they are read aloud too. */
export function ToastHost() {
  const message = useSyncExternalStore(watchToasts, currentToast, () => null);
  const { colours } = useTheme();
  const id = message?.id;
  useEffect(() => {
    if (id === undefined) return;
    const timer = setTimeout(() => dismissToast(id), SHOWN_FOR_MS);
    return () => clearTimeout(timer);
  }, [id]);
  return (
    <View
      aria-live="polite"
      pointerEvents="box-none"
      style={{
        position: 'absolute',
        left: space.l,
        right: space.l,
        // Under the header: what there is to press on a field screen lies at the foot.
        top: 76,
        alignItems: 'center',
      }}
    >
      {message ? (
        <View
          style={{
            flexDirection: 'row',
            alignItems: 'center',
            gap: space.m,
            minHeight: touch,
            maxWidth: 560,
            paddingHorizontal: space.l,
            borderRadius: radius,
            backgroundColor: colours.tag,
          }}
        >
          <Icon name={message.tone === 'caution' ? 'warning' : 'check'} size={20} colour={colours.onTag} />
          <Txt tone="onTag" weight="medium" style={{ flexShrink: 1, paddingVertical: space.m }}>
            {message.text}
          </Txt>
          {message.action ? (
            <Pressable
              role="button"
              aria-label={message.action.label}
              onPress={() => {
                message.action?.onPress();
                dismissToast(message.id);
              }}
              style={{ minHeight: touch, justifyContent: 'center', paddingHorizontal: space.s }}
            >
              <Txt tone="onTag" weight="semibold" style={{ textDecorationLine: 'underline' }}>
                {message.action.label}
              </Txt>
            </Pressable>
          ) : null}
        </View>
      ) : null}
    </View>
  );
}
