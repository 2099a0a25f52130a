import type { ReactNode } from 'react';
import { View } from 'react-native';
import { Button } from './Button';
import { Icon } from './Icon';
import type { IconName } from './iconPaths';
import { space } from './tokens';
import { Spinner } from './Spinner';
import { Txt } from './Txt';
import { useTheme } from './theme';
import { useWords } from './words';

interface StateProps {
  readonly icon?: IconName;
  readonly title: string;
  readonly text?: string;
  readonly action?: ReactNode;
}

function State({ icon, title, text, action }: StateProps) {
  const { colours } = useTheme();
  return (
    <View style={{ padding: space.xxl, gap: space.m, alignItems: 'center', justifyContent: 'center', flexGrow: 1 }}>
      {icon ? <Icon name={icon} size={40} colour={colours.inkSoft} /> : null}
      <Txt size="title" weight="semibold" align="center" role="heading" level={2}>
        {title}
      </Txt>
      {text ? (
        <Txt tone="soft" size="large" align="center" style={{ maxWidth: 460 }}>
          {text}
        </Txt>
      ) : null}
      {action ? <View style={{ marginTop: space.s }}>{action}</View> : null}
    </View>
  );
}

/** Something is being fetched. */
export function Loading({ label }: { label?: string }) {
  const t = useWords();
  return (
    <View
      role="status"
      aria-label={label ?? t('common.loading')}
      style={{ padding: space.xxl, alignItems: 'center', justifyContent: 'center', flexGrow: 1 }}
    >
      <Spinner size={36} />
    </View>
  );
}

/** Nothing here yet, and what to do about it. */
export function Empty({ icon, title, text, action }: StateProps) {
  return <State icon={icon} title={title} text={text} action={action} />;
}

/** It could not be fetched. */
export function Failed({ title, text, onRetry }: { title?: string; text?: string; onRetry?: () => void }) {
  const t = useWords();
  return (
    <View role="alert" style={{ flexGrow: 1 }}>
      <State
        icon="warning"
        title={title ?? t('common.failed')}
        text={text}
        action={onRetry ? <Button label={t('common.tryAgain')} onPress={onRetry} /> : undefined}
      />
    </View>
  );
}

/** The person's role does not reach this. */
export function NoPermission({ text, action }: { text: string; action?: ReactNode }) {
  const t = useWords();
  return <State icon="lock" title={t('common.noPermission')} text={text} action={action} />;
}

/** A strip across the top: no signal, and what that means here. */
export function Offline({ text }: { text?: string }) {
  const t = useWords();
  return <Banner icon="offline" text={text ?? t('common.offline')} />;
}

/** A strip across the top with an icon, a line of words and, if given, something to do. */
export function Banner(props: { icon: IconName; text: string; tone?: 'plain' | 'caution'; action?: ReactNode }) {
  const { icon, text, tone = 'plain', action } = props;
  const { colours, strokes } = useTheme();
  const caution = tone === 'caution';
  return (
    <View
      role="status"
      style={{
        flexDirection: 'row',
        flexWrap: 'wrap',
        alignItems: 'center',
        gap: space.s,
        paddingHorizontal: space.l,
        paddingVertical: space.s,
        backgroundColor: caution ? colours.cautionTint : colours.selected,
        borderBottomWidth: strokes.hair,
        borderColor: colours.rule,
      }}
    >
      {/* The icon stays beside its words; only what there is to do goes to a line of its own. */}
      <View style={{ flexDirection: 'row', alignItems: 'center', gap: space.s, flexGrow: 1, flexBasis: 240 }}>
        <Icon name={icon} size={20} colour={caution ? colours.caution : colours.ink} />
        <Txt weight="medium" tone={caution ? 'caution' : 'ink'} style={{ flex: 1, minWidth: 0 }}>
          {text}
        </Txt>
      </View>
      {action}
    </View>
  );
}
