import { Pressable, View } from 'react-native';
import type { ActionContext } from '../../actions/action';
import { toolActions } from '../../actions/toolActions';
import type { PressState } from '../../ui/Button';
import { Icon } from '../../ui/Icon';
import { radius, space } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { Txt } from '../../ui/Txt';
import { useWords } from '../../ui/words';
import { useDraft } from '../workspace/workspace';

/** The tools, in thumb reach. */
export function ToolRow({ context }: { context: ActionContext }) {
  const t = useWords();
  const { colours } = useTheme();
  const tool = useDraft((state) => state.tool);
  return (
    <View
      role="toolbar"
      aria-label={t('plan.tools.label')}
      style={[
        {
          flexDirection: 'row',
          gap: 2,
          paddingHorizontal: space.s,
          paddingVertical: space.xs,
          backgroundColor: colours.selected,
        },
        { paddingBottom: `max(${space.xs}px, env(safe-area-inset-bottom))` } as object,
      ]}
    >
      {toolActions.map((action) => {
        const state = context.draft.get();
        const on = action.id === `tool.${tool}`;
        const label = t(`plan.${action.label(state)}`);
        return (
          <Pressable
            key={action.id}
            role="button"
            aria-label={label}
            {...({ 'aria-pressed': on } as object)}
            onPress={() => action.run(context)}
            style={({ pressed, hovered }: PressState) => ({
              flex: 1,
              minWidth: 0,
              minHeight: 60,
              gap: 2,
              alignItems: 'center',
              justifyContent: 'center',
              borderRadius: radius,
              backgroundColor: on ? colours.earthDeep : pressed || hovered ? colours.hover : 'transparent',
            })}
          >
            <Icon name={action.icon(state)} colour={on ? colours.onEarthDeep : colours.ink} />
            <Txt size="small" weight="medium" tone={on ? 'onAccent' : 'ink'} numberOfLines={1}>
              {label}
            </Txt>
          </Pressable>
        );
      })}
    </View>
  );
}
