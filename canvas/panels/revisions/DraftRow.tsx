import { View } from 'react-native';
import type { Draft } from '../../../model/contracts/drawings';
import { Icon } from '../../ui/Icon';
import { space } from '../../ui/tokens';
import { Txt } from '../../ui/Txt';
import { useTheme } from '../../ui/theme';
import { sayWhen, useNow } from '../../ui/when';
import { useWords } from '../../ui/words';

/** The draft at the head of the list: which revision it follows and whether it has changed since. */
export function DraftRow({ draft, newest }: { draft: Draft; newest: number | null }) {
  const t = useWords();
  const now = useNow();
  const { colours, strokes } = useTheme();
  const after = draft.afterRevision;
  const state =
    newest === null || after === null
      ? null
      : draft.changedSince
        ? t('revisions.changed', { number: after })
        : t('revisions.unchanged', { number: after });
  return (
    <View
      role="listitem"
      style={{
        flexDirection: 'row',
        gap: space.l,
        padding: space.l,
        alignItems: 'center',
        borderBottomWidth: strokes.hair,
        borderColor: colours.rule,
        backgroundColor: colours.hover,
      }}
    >
      <Icon name="pen" colour={colours.inkSoft} />
      <View style={{ flex: 1, gap: 2 }}>
        <Txt size="large" weight="semibold">
          {after === null ? t('revisions.draftFirst') : t('revisions.draftAfter', { number: after })}
        </Txt>
        {state ? (
          <Txt tone={draft.changedSince ? 'caution' : 'soft'} weight={draft.changedSince ? 'medium' : 'regular'}>
            {state}
          </Txt>
        ) : null}
        {draft.changedBy ? (
          <Txt tone="soft">
            {t('revisions.changedBy', { when: sayWhen(t, draft.changedAt, now), name: draft.changedBy })}
          </Txt>
        ) : null}
      </View>
    </View>
  );
}
