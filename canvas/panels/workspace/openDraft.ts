/** Opens a draft: its store, its solver, and what saves it. */
import type { QueryClient } from '@tanstack/react-query';
import type { Draft, Revision } from '../../../model/contracts/drawings';
import type { Role } from '../../../model/contracts/common';
import { solve } from '../../../model/setOut';
import { startAutosave, type Autosave, type LocalDraft } from '../../store/autosave';
import { createDraftStore } from '../../store/draftStore';
import { createSolver, type Solver } from '../../store/solver';
import type { DraftStore } from '../../store/draftStore';
import { autosaveHost, setTheirsAside } from './sending';
import type { Workspace } from './workspace';

export interface OpenDraft {
  readonly workspace: Workspace;
  readonly autosave: Autosave;
  stop(): void;
}

function startSolver(draft: DraftStore): Solver {
  return createSolver(draft, {
    solve,
    soon(atLeast, run) {
      let frame = 0;
      const timer = setTimeout(() => {
        frame = requestAnimationFrame(run);
      }, atLeast);
      return () => {
        clearTimeout(timer);
        cancelAnimationFrame(frame);
      };
    },
    now: () => performance.now(),
    report: (error) => console.error(error),
  });
}

export interface OpenDraftOf {
  readonly client: QueryClient;
  readonly userId: string;
  readonly siteId: string;
  readonly siteName: string;
  readonly role: Role;
  readonly fetched: Draft;
  readonly local: LocalDraft;
}

export function openDraft({ client, userId, siteId, siteName, role, fetched, local }: OpenDraftOf): OpenDraft {
  const draft = createDraftStore({ drawing: fetched.drawing, survey: fetched.survey, role });
  const loaded = { drawing: fetched.drawingVersion, survey: fetched.surveyVersion };
  const autosave = startAutosave(draft, autosaveHost(client, userId, siteId), loaded, local);
  const solver = startSolver(draft);
  const workspace: Workspace = {
    siteId,
    siteName,
    of: { kind: 'draft', afterRevision: fetched.afterRevision },
    draft,
    solver,
    flush: autosave.flush,
    versions: autosave.versions,
    resolve(clash, choice) {
      autosave.resolve(clash.part, choice);
      if (choice === 'theirs') return;
      const theirs =
        clash.part === 'drawing'
          ? ({ part: 'drawing', value: clash.conflict.theirs } as const)
          : ({ part: 'survey', value: clash.conflict.theirs } as const);
      // Mine goes first: theirs is only put aside once it is no longer what the server has.
      void autosave
        .flush()
        .then((status) =>
          status === 'saved' ? setTheirsAside(siteId, theirs, clash.conflict.theirVersion) : undefined,
        )
        .catch((error: unknown) => console.error(error));
    },
  };
  return {
    workspace,
    autosave,
    stop() {
      // What is unsaved is kept on the device already; a last try costs nothing.
      void autosave.flush();
      autosave.stop();
      solver.stop();
    },
  };
}

/** A revision as a drawing that nobody can change. */
export function openRevision(
  siteId: string,
  siteName: string,
  revision: Revision,
): { workspace: Workspace; stop: () => void } {
  const draft = createDraftStore({ drawing: revision.drawing, survey: revision.survey, role: 'observer' });
  const solver = startSolver(draft);
  const workspace: Workspace = {
    siteId,
    siteName,
    of: { kind: 'revision', number: revision.number },
    draft,
    solver,
    flush: () => Promise.resolve('saved'),
    versions: () => ({ drawing: 0, survey: 0 }),
    resolve: () => undefined,
  };
  return { workspace, stop: solver.stop };
}
