import { ScrollView } from 'react-native';
import type { ThingRef } from '../../../model/things';
import { space } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { useLayout } from '../../ui/useLayout';
import { useDraft } from '../workspace/workspace';
import { OpeningLedger } from './OpeningLedger';
import { PoleLedger } from './PoleLedger';
import { RunLedger } from './RunLedger';
import { BoundaryLedger, KeepClearLedger, SiteLedger } from './SiteLedger';
import { ThingReasons } from './ThingReasons';

const PHONE_HEIGHT = 196;
const SIDE_HEIGHT = 150;
const PHONE_EDIT_HEIGHT = 116;
const SIDE_EDIT_HEIGHT = 164;

/** Height of what stands over the commands while drawing: the same for every tool, so that the plan never jumps. */
export function useEditHeight(): number {
  return useLayout().name === 'phone' ? PHONE_EDIT_HEIGHT : SIDE_EDIT_HEIGHT;
}

export interface LedgerProps {
  readonly onDetails: () => void;
  readonly onReasons: () => void;
  readonly onBuilding: () => void;
}

/** The one thing that is selected, its one number that matters, and what the solver has to say of it. */
export function Ledger(props: LedgerProps) {
  const { colours, strokes } = useTheme();
  const phone = useLayout().name === 'phone';
  const selection = useDraft((state) => state.selection);
  const editing = useDraft((state) => state.mode === 'edit');
  // Of one height whatever is selected: the drawing must not jump under the finger.
  const editHeight = useEditHeight();
  const height = editing ? editHeight : phone ? PHONE_HEIGHT : SIDE_HEIGHT;
  return (
    <ScrollView
      style={{
        height,
        flexGrow: 0,
        backgroundColor: colours.surface,
        borderTopWidth: editing ? 0 : strokes.hair,
        borderColor: colours.rule,
      }}
      contentContainerStyle={{ paddingHorizontal: space.l, paddingVertical: space.m, gap: space.s }}
    >
      <Inside selection={selection} {...props} />
      {selection ? <ThingReasons thing={selection} /> : null}
    </ScrollView>
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
    case 'boundary':
      return <BoundaryLedger />;
    default:
      return <SiteLedger {...props} />;
  }
}
