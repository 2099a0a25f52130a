import type { ToolId } from '../store/draftStore';
import type { Action, ActionIcon } from './action';
import { isEditing } from './action';

const ICONS: Readonly<Record<ToolId, ActionIcon>> = {
  select: 'select',
  run: 'wallRun',
  door: 'door',
  window: 'window',
  passage: 'passage',
  keepClear: 'keepClear',
};

function choose(tool: ToolId): Action {
  return {
    id: `tool.${tool}`,
    label: () => `tools.${tool}`,
    icon: () => ICONS[tool],
    enabled: isEditing,
    on: (state) => state.tool === tool,
    run: ({ draft }) => draft.setTool(tool),
  };
}

/** The tools in the order of the work: walls first, then what stands in them. */
export const toolActions: readonly Action[] = [
  choose('select'),
  choose('run'),
  choose('door'),
  choose('window'),
  choose('passage'),
  choose('keepClear'),
];
