import type { ReactNode } from 'react';
import { View } from 'react-native';
import { space } from '../../ui/tokens';
import { Txt } from '../../ui/Txt';
import { useLayout } from '../../ui/useLayout';

/** A heading and what stands under it. */
export function Section({ title, text, children }: { title: string; text?: string; children: ReactNode }) {
  const phone = useLayout().name === 'phone';
  const inset = phone ? space.l : 0;
  return (
    <View style={{ gap: space.s, paddingTop: phone ? space.l : 0 }}>
      <View style={{ paddingHorizontal: inset, gap: 2 }}>
        <Txt size="large" weight="semibold" role="heading" level={2}>
          {title}
        </Txt>
        {text ? <Txt tone="soft">{text}</Txt> : null}
      </View>
      {children}
    </View>
  );
}
