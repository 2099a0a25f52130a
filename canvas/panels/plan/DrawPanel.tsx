import { useState } from 'react';
import { View } from 'react-native';
import type { ActionContext } from '../../actions/action';
import { finish, redo, undo } from '../../actions/historyActions';
import { duplicate, flipHinge, openOtherWay, remove, turnRun } from '../../actions/thingActions';
import { fit, penDraws, snapping } from '../../actions/viewActions';
import { Button } from '../../ui/Button';
import { Choice } from '../../ui/Choice';
import { IconButton } from '../../ui/IconButton';
import { Measurement } from '../../ui/Measurement';
import { space } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { Txt } from '../../ui/Txt';
import { useWords } from '../../ui/words';
import { TapeKeypad } from '../keypad/TapeKeypad';
import { useTapeTyping } from '../keypad/useTapeTyping';
import { useDraft } from '../workspace/workspace';
import { ActionButton } from './ActionButton';
import { AngleDialog } from './AngleDialog';
import { Ledger, useEditHeight, type LedgerProps } from './Ledger';
import { ToolRow } from './ToolRow';
import type { RunEntry } from './useRunEntry';

export interface DrawPanelProps extends LedgerProps {
  readonly context: ActionContext;
  readonly entry: RunEntry;
  /** Keys are shown where a finger points; elsewhere the physical keyboard types. */
  readonly keys: boolean;
}

/** Under the plan while drawing: the length being set, its keypad, the commands and the tools. */
export function DrawPanel({ context, entry, keys, ...ledger }: DrawPanelProps) {
  const { colours, strokes } = useTheme();
  const t = useWords();
  const units = useDraft((state) => state.drawing.units);
  const step = useDraft((state) => state.drawing.tapeStep);
  const tool = useDraft((state) => state.tool);
  const empty = useDraft((state) => state.drawing.runs.length === 0);
  const area = useDraft((state) => state.area);
  const [keypad, setKeypad] = useState(false);
  const height = useEditHeight();
  const shown = keys && keypad && entry.drawing;
  const typing = { value: entry.text, onChange: entry.onChange, onEnter: entry.place };
  useTapeTyping(entry.drawing && !shown ? typing : null);

  return (
    <View style={{ backgroundColor: colours.surface, borderTopWidth: strokes.hair, borderColor: colours.rule }}>
      {entry.drawing ? (
        <RunEntryRow context={context} entry={entry} keypad={shown} onKeypad={keys ? setKeypad : null} />
      ) : tool === 'select' ? (
        <Ledger {...ledger} />
      ) : (
        <View style={{ flexDirection: 'row', alignItems: 'flex-start', gap: space.m, padding: space.l, height }}>
          <View style={{ flex: 1, gap: space.s }}>
            <Txt tone="soft" size={tool === 'keepClear' ? 'body' : 'large'}>
              {t(`plan.toolTells.${tool === 'keepClear' ? area : tool}`)}
            </Txt>
            {tool === 'keepClear' ? (
              <Choice
                label={t('plan.area')}
                hideLabel
                options={[
                  { value: 'keepClear', label: t('plan.areas.keepClear') },
                  { value: 'boundary', label: t('plan.areas.boundary') },
                ]}
                value={area}
                onChange={(next) => context.draft.setArea(next)}
              />
            ) : null}
          </View>
          {/* Before the first wall: what it is built of can be said here already. */}
          {empty ? <Button label={t('plan.building')} onPress={ledger.onBuilding} /> : null}
        </View>
      )}
      {shown ? (
        <TapeKeypad
          compact
          units={units}
          step={step}
          value={entry.text}
          onChange={entry.onChange}
          onEnter={entry.place}
          enterLabel={t('plan.place')}
        />
      ) : (
        <CommandRow context={context} />
      )}
      <ToolRow context={context} />
    </View>
  );
}

function CommandRow({ context }: { context: ActionContext }) {
  const penSeen = useDraft((state) => state.pen !== 'unseen');
  const kind = useDraft((state) => state.selection?.kind ?? null);
  const isDoor = useDraft(
    (state) =>
      state.selection?.kind === 'opening' &&
      state.drawing.openings.some((one) => one.id === state.selection?.id && one.kind === 'door'),
  );
  return (
    <View
      style={{
        flexDirection: 'row',
        flexWrap: 'wrap',
        alignItems: 'center',
        gap: space.xs,
        paddingHorizontal: space.s,
        paddingBottom: space.xs,
      }}
    >
      <ActionButton action={undo} context={context} />
      <ActionButton action={redo} context={context} />
      {/* A door has the most commands of its own: they and these fit one row of a phone without this one. */}
      {isDoor ? null : <ActionButton action={fit} context={context} />}
      <ActionButton action={snapping} context={context} />
      {penSeen ? <ActionButton action={penDraws} context={context} /> : null}
      <View style={{ flex: 1 }} />
      {isDoor ? <ActionButton action={flipHinge} context={context} /> : null}
      {isDoor ? <ActionButton action={openOtherWay} context={context} /> : null}
      {kind === 'opening' ? <ActionButton action={duplicate} context={context} /> : null}
      {kind === 'run' ? <ActionButton action={turnRun} context={context} /> : null}
      {kind ? <ActionButton action={remove} context={context} /> : null}
    </View>
  );
}

const KEYPAD_ENTRY_HEIGHT = 92;

interface RunEntryRowProps {
  readonly context: ActionContext;
  readonly entry: RunEntry;
  readonly keypad: boolean;
  readonly onKeypad: ((open: boolean) => void) | null;
}

function RunEntryRow({ context, entry, keypad, onKeypad }: RunEntryRowProps) {
  const t = useWords();
  const [angles, setAngles] = useState(false);
  // The keypad takes the room that the drawing would miss most.
  const usual = useEditHeight();
  const height = keypad ? KEYPAD_ENTRY_HEIGHT : usual;
  const units = useDraft((state) => state.drawing.units);
  const step = useDraft((state) => state.drawing.tapeStep);
  const run = useDraft((state) => state.preview?.run ?? null);
  if (!run) return null;
  const angle = run.heldAngle ?? run.angle;
  const unread = entry.text !== '' && run.heldLength === null;
  return (
    <View
      style={{
        flexDirection: 'row',
        alignItems: 'flex-end',
        gap: space.s,
        height,
        paddingHorizontal: space.l,
        paddingBottom: space.m,
      }}
    >
      {run.length === 0 && entry.text === '' ? (
        <Txt size="large" tone="soft" numberOfLines={2} style={{ flex: 1, alignSelf: 'center' }}>
          {t('plan.toolTells.runNext')}
        </Txt>
      ) : (
        <View style={{ flex: 1, minWidth: 0 }}>
          <Txt tone="soft" numberOfLines={1}>
            {t('plan.length')}
          </Txt>
          {unread ? (
            <Txt numeric size="ledger" weight="semibold" numberOfLines={1}>
              {entry.text}
            </Txt>
          ) : (
            <Measurement length={run.length} units={units} step={step} size="ledger" form="feet" />
          )}
        </View>
      )}
      <Button
        label={angle === null ? t('plan.angle') : t('plan.degrees', { value: Math.round(angle * 10) / 10 })}
        spoken={t('plan.typeAngle')}
        pressed={run.heldAngle !== null}
        onPress={() => setAngles(true)}
        style={{ paddingHorizontal: space.m }}
      />
      {onKeypad ? (
        <IconButton
          icon="ruler"
          kind="outline"
          label={keypad ? t('plan.hideKeypad') : t('plan.typeLength')}
          pressed={keypad}
          onPress={() => onKeypad(!keypad)}
        />
      ) : null}
      {run.heldLength !== null && !keypad ? (
        <Button label={t('plan.entry.set')} onPress={entry.place} style={{ paddingHorizontal: space.m }} />
      ) : null}
      <IconButton icon="check" kind="outline" label={t('plan.actions.finish')} onPress={() => finish.run(context)} />
      <AngleDialog open={angles} onClose={() => setAngles(false)} onChoose={entry.holdAngle} />
    </View>
  );
}
