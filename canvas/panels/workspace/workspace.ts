/** The open drawing as every screen of a site sees it: a draft that can be changed, or a revision that can't. */
import { createContext, use, useSyncExternalStore } from 'react';
import { useStore } from 'zustand';
import type { SetOut } from '../../../model/setOut';
import type { SaveStatus } from '../../store/saver';
import type { Versions } from '../../store/autosave';
import type { DraftConflict, DraftState, DraftStore } from '../../store/draftStore';
import type { Solved, Solver } from '../../store/solver';

export interface Workspace {
  readonly siteId: string;
  readonly siteName: string;
  readonly of:
    | { readonly kind: 'draft'; readonly afterRevision: number | null }
    | { readonly kind: 'revision'; readonly number: number };
  readonly draft: DraftStore;
  readonly solver: Solver;
  /** Saves what is unsaved now; says where it stands. A revision is always saved. */
  flush(): Promise<SaveStatus>;
  versions(): Versions;
  resolve(conflict: DraftConflict, choice: 'mine' | 'theirs'): void;
}

export const WorkspaceContext = createContext<Workspace | null>(null);

/** The open drawing. Throws outside a DraftProvider or RevisionProvider, or before the draft is there. */
export function useWorkspace(): Workspace {
  const workspace = use(WorkspaceContext);
  if (!workspace) throw new Error('this screen needs a DraftProvider or RevisionProvider with a drawing above it');
  return workspace;
}

/** A part of the draft's state; renders again only when that part changes. */
export function useDraft<T>(select: (state: DraftState) => T): T {
  return useStore(useWorkspace().draft.api, select);
}

/** The set-out with the drawing and survey it is of; the last good one while a change can't be solved. */
export function useSolved(): Solved {
  const { solver } = useWorkspace();
  const { solved } = useSyncExternalStore(solver.subscribe, solver.get);
  if (!solved) throw new Error('the drawing could not be solved');
  return solved;
}

export function useSetOut(): SetOut {
  return useSolved().setOut;
}

/** Whether the set-out shown is from before a change that could not be solved. */
export function useSolveFailed(): boolean {
  const { solver } = useWorkspace();
  return useSyncExternalStore(solver.subscribe, solver.get).failed;
}

export interface DraftActions extends DraftStore {
  readonly flush: Workspace['flush'];
  readonly versions: Workspace['versions'];
}

const actionsOf = new WeakMap<Workspace, DraftActions>();

/** Everything that can be done to the draft; the same object for as long as the drawing is open. */
export function useDraftActions(): DraftActions {
  const workspace = useWorkspace();
  let actions = actionsOf.get(workspace);
  if (!actions) {
    actions = { ...workspace.draft, flush: workspace.flush, versions: workspace.versions };
    actionsOf.set(workspace, actions);
  }
  return actions;
}
