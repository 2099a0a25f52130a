/** Saves a draft as it changes: the drawing and the survey each by a saver of its own, so that readings never wait for walls. */
import { may } from '../../model/contracts/common';
import type { Drawing } from '../../model/drawing/schema';
import type { Survey } from '../../model/drawing/surveySchema';
import type { DraftConflict, DraftStore } from './draftStore';
import { createSaver, type Attempt, type LocalCopy, type Saver, type SaveStatus, type SendResult } from './saver';

export interface LocalDraft {
  readonly drawing: LocalCopy<Drawing> | null;
  readonly survey: LocalCopy<Survey> | null;
}

export interface AutosaveHost {
  sendDrawing(attempt: Attempt<Drawing>): Promise<SendResult<Drawing>>;
  sendSurvey(attempt: Attempt<Survey>): Promise<SendResult<Survey>>;
  keepDrawing(copy: LocalCopy<Drawing> | null): Promise<void>;
  keepSurvey(copy: LocalCopy<Survey> | null): Promise<void>;
  later(milliseconds: number, run: () => void): () => void;
  newWriteId(): string;
}

export interface Versions {
  readonly drawing: number;
  readonly survey: number;
}

export interface Autosave {
  /** Saves what is unsaved now; says where both parts stand. */
  flush(): Promise<SaveStatus>;
  online(): void;
  resolve(part: DraftConflict['part'], choice: 'mine' | 'theirs'): void;
  /** A newer draft was fetched: what others saved, or a revision restored. */
  offer(drawing: Drawing, survey: Survey, versions: Versions): void;
  versions(): Versions;
  stop(): void;
}

/** Worst first: what the header has to say of both parts together. */
const WORST_FIRST: readonly SaveStatus[] = ['conflict', 'refused', 'offline', 'saving', 'unsaved', 'saved'];

export function worse(a: SaveStatus, b: SaveStatus): SaveStatus {
  return WORST_FIRST.indexOf(a) <= WORST_FIRST.indexOf(b) ? a : b;
}

/**
 * Starts saving a draft. A gesture under way is not saved until it ends. Copies kept on the device are put on the
 * screen and sent from the version that they were made from, so that a clash is found by the server, as any other is.
 */
export function startAutosave(draft: DraftStore, host: AutosaveHost, loaded: Versions, local: LocalDraft): Autosave {
  const start = draft.get();
  const canDraw = may(start.role, 'editDrawing');
  const canRead = may(start.role, 'editSurvey');
  let settledDrawing = start.drawing;

  function setConflict(part: DraftConflict['part'], conflict: DraftConflict | null): void {
    const others = draft.get().conflicts.filter((other) => other.part !== part);
    draft.setSave({ conflicts: conflict ? [...others, conflict] : others });
  }

  const drawing: Saver<Drawing> = createSaver(
    {
      current: () => settledDrawing,
      send: host.sendDrawing,
      keep: host.keepDrawing,
      adopt(value) {
        settledDrawing = value;
        draft.adoptDrawing(value);
      },
      later: host.later,
      newWriteId: host.newWriteId,
      changed(status, conflict) {
        draft.setSave({ drawingSave: status });
        setConflict('drawing', conflict && { part: 'drawing', conflict });
      },
    },
    start.drawing,
    loaded.drawing,
  );
  const survey: Saver<Survey> = createSaver(
    {
      current: () => draft.get().survey,
      send: host.sendSurvey,
      keep: host.keepSurvey,
      adopt: (value) => draft.adoptSurvey(value),
      later: host.later,
      newWriteId: host.newWriteId,
      changed(status, conflict) {
        draft.setSave({ surveySave: status });
        setConflict('survey', conflict && { part: 'survey', conflict });
      },
    },
    start.survey,
    loaded.survey,
  );

  if (local.drawing && canDraw) {
    settledDrawing = local.drawing.value;
    draft.adoptDrawing(settledDrawing);
    drawing.resume(local.drawing);
  }
  if (local.survey && canRead) {
    draft.adoptSurvey(local.survey.value);
    survey.resume(local.survey);
  }

  const unsubscribe = draft.api.subscribe((state, before) => {
    if (canDraw && state.gesture === null && state.drawing !== settledDrawing) {
      settledDrawing = state.drawing;
      drawing.touched();
    }
    if (canRead && state.survey !== before.survey) survey.touched();
  });

  return {
    async flush() {
      const [a, b] = await Promise.all([drawing.flush(), survey.flush()]);
      return worse(a, b);
    },
    online() {
      drawing.online();
      survey.online();
    },
    resolve(part, choice) {
      (part === 'drawing' ? drawing : survey).resolve(choice);
      setConflict(part, null);
    },
    offer(newDrawing, newSurvey, versions) {
      if (draft.get().gesture === null) drawing.offer(newDrawing, versions.drawing);
      survey.offer(newSurvey, versions.survey);
    },
    versions: () => ({ drawing: drawing.version(), survey: survey.version() }),
    stop() {
      unsubscribe();
      drawing.stop();
      survey.stop();
    },
  };
}
