import { useEffect, useState } from 'react';
import { View } from 'react-native';
import { may } from '../../../model/contracts/common';
import { setRunLength } from '../../../model/drawing/edits/runLength';
import type { ThingRef } from '../../../model/things';
import { fit } from '../../actions/viewActions';
import { useOnline } from '../../client/online';
import { Button } from '../../ui/Button';
import { Dialog } from '../../ui/Dialog';
import { Header } from '../../ui/Header';
import { Banner } from '../../ui/States';
import { useTheme } from '../../ui/theme';
import { useLayout } from '../../ui/useLayout';
import { useWords } from '../../ui/words';
import { BuildingFields } from '../inspector/BuildingFields';
import { Inspector } from '../inspector/Inspector';
import { LengthDialog } from '../keypad/LengthField';
import { useCoarsePointer } from '../keypad/useCoarsePointer';
import { useWithoutNav } from '../shell/withoutNav';
import { useDraftLine, useSaveStatus } from '../workspace/useDraftLine';
import { useDraft, useDraftActions, useSolved, useSolveFailed, useWorkspace } from '../workspace/workspace';
import { ActionButton } from './ActionButton';
import { DrawPanel } from './DrawPanel';
import { Ledger } from './Ledger';
import { PlanArea } from './PlanArea';
import { ReasonsPanel } from './ReasonsPanel';
import { RevisionButtons } from './RevisionButtons';
import { SideColumn, type SideTab } from './SideColumn';
import { usePlanCamera } from './usePlanCamera';
import { usePlanFigure } from './usePlanFigure';
import { usePlanHand } from './usePlanHand';
import { useRunEntry } from './useRunEntry';

/** The plan: what one looks at, and draws on. */
export function PlanScreen(_props: { siteId?: string }) {
  const t = useWords();
  const { colours } = useTheme();
  const layout = useLayout().name;
  const phone = layout === 'phone';
  const coarse = useCoarsePointer();
  const workspace = useWorkspace();
  const actions = useDraftActions();
  const editing = useDraft((state) => state.mode === 'edit');
  const mayDraw = useDraft((state) => may(state.role, 'editDrawing'));
  const [sheet, setSheet] = useState<'details' | 'reasons' | 'building' | null>(null);
  const [tab, setTab] = useState<SideTab>('wall');
  const [dimension, setDimension] = useState<ThingRef | null>(null);

  // While a run is being drawn, digits are its length.
  const isTyping = useDraft((state) => state.tool === 'run' && state.preview?.run != null);
  const camera = usePlanCamera();
  const figure = usePlanFigure(camera.camera, camera.size);
  const hand = usePlanHand({
    camera,
    figure,
    isTyping,
    onDimension(thing) {
      actions.select(thing);
      if (workspace.draft.get().mode === 'edit') setDimension(thing);
    },
  });
  const entry = useRunEntry(hand.context);
  useWithoutNav(editing);
  useEffect(() => () => workspace.draft.setMode('view'), [workspace.draft]);

  const open = (what: 'details' | 'reasons' | 'building') =>
    // The column beside a tablet's plan has no room for the building's many numbers.
    phone || (layout === 'tablet' && what === 'building') ? setSheet(what) : setTab(what);
  const ledger = {
    onDetails: () => open('details'),
    onReasons: () => open('reasons'),
    onBuilding: () => open('building'),
  };

  return (
    <View style={{ flex: 1, minHeight: 0, backgroundColor: colours.ground }}>
      <PlanHeader
        editing={editing}
        actions={
          editing ? (
            <Button label={t('plan.done')} kind="filled" onPress={() => actions.setMode('view')} />
          ) : (
            <>
              <ActionButton action={fit} context={hand.context} />
              <RevisionButtons />
              {mayDraw ? <Button label={t('plan.draw')} kind="filled" onPress={() => actions.setMode('edit')} /> : null}
            </>
          )
        }
      />
      <SaveBanners />
      <View style={{ flex: 1, minHeight: 0, flexDirection: phone ? 'column' : 'row' }}>
        <View style={{ flex: 1, minHeight: 0, minWidth: 0 }}>
          <PlanArea camera={camera} figure={figure} onStroke={hand.onStroke} />
          {editing ? (
            <DrawPanel context={hand.context} entry={entry} keys={coarse} {...ledger} />
          ) : (
            <Ledger {...ledger} />
          )}
        </View>
        {phone ? null : <SideColumn tab={tab} onTab={setTab} />}
      </View>
      <Dialog open={sheet === 'details'} title={t('plan.details')} onClose={() => setSheet(null)}>
        <Inspector />
      </Dialog>
      <Dialog open={sheet === 'building'} title={t('plan.building')} onClose={() => setSheet(null)}>
        <BuildingFields />
      </Dialog>
      <Dialog open={sheet === 'reasons'} title={t('plan.reasons')} onClose={() => setSheet(null)}>
        <ReasonsPanel onPicked={() => setSheet(null)} />
      </Dialog>
      {dimension ? <DimensionDialog thing={dimension} onClose={() => setDimension(null)} /> : null}
    </View>
  );
}

function PlanHeader({ editing, actions }: { editing: boolean; actions: React.ReactNode }) {
  const t = useWords();
  const { siteName } = useWorkspace();
  const status = useSaveStatus();
  const draftLine = useDraftLine();
  const noSignal = !useOnline() || status === 'offline';
  // In the header's own line: a strip of its own would move the plan.
  const line = noSignal ? t('plan.noSignal') : draftLine;
  const icon = noSignal ? 'offline' : undefined;
  const tool = useDraft((state) => state.tool);
  const drawing = useDraft((state) => state.preview?.run != null);
  const letter = useDraft((state) => {
    const from = state.preview?.run?.from;
    return from ? (state.drawing.corners.find((one) => one.x === from.x && one.y === from.y)?.letter ?? null) : null;
  });
  if (!editing) return <Header title={siteName} subtitle={line} subtitleIcon={icon} actions={actions} />;
  const title =
    tool === 'run' && letter !== null ? t('plan.toolTitle.runFrom', { letter }) : t(`plan.toolTitle.${tool}`);
  const tells = tool === 'run' && drawing ? t('plan.toolTells.runNext') : line;
  return <Header title={title} subtitle={tells} subtitleIcon={tells === line ? icon : undefined} actions={actions} />;
}

/** What keeps the draft from being saved, where something does. */
function SaveBanners() {
  const t = useWords();
  const status = useSaveStatus();
  const failed = useSolveFailed();
  return (
    <>
      {status === 'refused' ? <Banner icon="warning" tone="caution" text={t('plan.refused')} /> : null}
      {failed ? <Banner icon="warning" tone="caution" text={t('plan.solveFailed')} /> : null}
    </>
  );
}

/** A dimension was tapped: its run's length. */
function DimensionDialog({ thing, onClose }: { thing: ThingRef; onClose: () => void }) {
  const t = useWords();
  const actions = useDraftActions();
  const { drawing, setOut } = useSolved();
  const run = setOut.walls.runById.get(thing.id);
  if (thing.kind !== 'run' || !run) return null;
  return (
    <LengthDialog
      open
      onClose={onClose}
      label={t('plan.ledger.run', { name: run.name })}
      value={run.length}
      units={drawing.units}
      step={drawing.tapeStep}
      onCommit={(length) => actions.edit('plan.did.setLength', (d) => setRunLength(d, run.runId, length, 'from'))}
    />
  );
}
