import { View } from 'react-native';
import { may } from '../../../model/contracts/common';
import { space } from '../../ui/tokens';
import { Txt } from '../../ui/Txt';
import { useWords } from '../../ui/words';
import { useDraft } from '../workspace/workspace';
import { OpeningFields } from './OpeningFields';
import { CornerFields, KeepClearFields } from './PlaceFields';
import { RunFields } from './RunFields';

/** Every number of the selected thing. */
export function Inspector() {
  const t = useWords();
  const selection = useDraft((state) => state.selection);
  const mayDraw = useDraft((state) => may(state.role, 'editDrawing'));
  return (
    <View style={{ gap: space.l }}>
      {mayDraw ? null : <Txt tone="soft">{t('plan.inspector.observer')}</Txt>}
      <Fields kind={selection?.kind ?? null} id={selection?.id ?? ''} />
    </View>
  );
}

function Fields({ kind, id }: { kind: string | null; id: string }) {
  const t = useWords();
  switch (kind) {
    case 'opening':
      return <OpeningFields openingId={id} />;
    case 'run':
      return <RunFields runId={id} />;
    case 'corner':
    case 'pole':
      return <CornerFields cornerId={id} />;
    case 'keepClear':
      return <KeepClearFields id={id} />;
    default:
      return <Txt tone="soft">{t('plan.inspector.nothing')}</Txt>;
  }
}
