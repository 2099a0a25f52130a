import { View } from 'react-native';
import type { ThingRef } from '../../../model/things';
import { space } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { useDraft } from '../workspace/workspace';
import { OpeningLedger } from './OpeningLedger';
import { PoleLedger } from './PoleLedger';
import { RunLedger } from './RunLedger';
import { KeepClearLedger, SiteLedger } from './SiteLedger';
import { ThingReasons } from './ThingReasons';

export interface LedgerProps {
  readonly onDetails: () => void;
  readonly onReasons: () => void;
  readonly onBuilding: () => void;
}

/** The one thing that is selected, its one number that matters, and what the solver has to say of it. */
export function Ledger(props: LedgerProps) {
  const { colours, strokes } = useTheme();
  const selection = useDraft((state) => state.selection);
  return (
    <View
      role="region"
      style={{
        padding: space.l,
        gap: space.s,
        backgroundColor: colours.surface,
        borderTopWidth: strokes.hair,
        borderColor: colours.rule,
      }}
    >
      <Inside selection={selection} {...props} />
      {selection ? <ThingReasons thing={selection} /> : null}
    </View>
  );
}

function Inside({ selection, ...props }: LedgerProps & { selection: ThingRef | null }) {
  switch (selection?.kind) {
    case 'corner':
    case 'pole':
      return <PoleLedger id={selection.id} {...props} />;
    case 'run':
      return <RunLedger runId={selection.id} {...props} />;
    case 'opening':
      return <OpeningLedger openingId={selection.id} {...props} />;
    case 'keepClear':
      return <KeepClearLedger id={selection.id} {...props} />;
    default:
      return <SiteLedger {...props} />;
  }
}
