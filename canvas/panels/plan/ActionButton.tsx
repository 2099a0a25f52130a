import type { Action, ActionContext } from '../../actions/action';
import { IconButton } from '../../ui/IconButton';
import { say, useWords } from '../../ui/words';
import { useDraft } from '../workspace/workspace';

/** A command as an icon; a switch or a choice shows whether it is on. */
export function ActionButton({ action, context }: { action: Action; context: ActionContext }) {
  const t = useWords();
  const label = useDraft((state) => action.label(state));
  const icon = useDraft((state) => action.icon(state));
  const enabled = useDraft((state) => action.enabled(state));
  const on = useDraft((state) => action.on?.(state));
  const of = useDraft((state) => action.of?.(state) ?? null);
  const plain = t(`plan.${label}`);
  return (
    <IconButton
      icon={icon}
      label={of === null ? plain : t('plan.actions.what', { action: plain, what: say(of) })}
      disabled={!enabled}
      pressed={on}
      onPress={() => action.run(context)}
    />
  );
}
