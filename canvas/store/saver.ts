/**
 * Saves one part of a draft (the drawing or the survey) as it changes: after a pause, one request at a time, kept on
 * the device until the server has it. Timers, identity and storage come from outside.
 */
export type SaveStatus = 'saved' | 'unsaved' | 'saving' | 'offline' | 'conflict' | 'refused';

/** One write as sent. Until it is answered it is sent again exactly so: the server may have taken it already. */
export interface Attempt<T> {
  readonly writeId: string;
  readonly baseVersion: number;
  readonly value: T;
}

/** What the device keeps while the server hasn't got everything. */
export interface LocalCopy<T> {
  readonly value: T;
  readonly baseVersion: number;
  /** Sent and not yet answered. */
  readonly attempt: Attempt<T> | null;
}

export type SendResult<T> =
  | { readonly kind: 'saved'; readonly version: number }
  | {
      readonly kind: 'stale';
      readonly theirs: T;
      readonly version: number;
      readonly by: string | null;
      readonly at: string;
    }
  /** No answer, or one that says to come again later. */
  | { readonly kind: 'offline' }
  /** Not allowed, or not accepted: sending it again will not help. */
  | { readonly kind: 'refused' };

export interface Conflict<T> {
  readonly mine: T;
  readonly theirs: T;
  readonly theirVersion: number;
  readonly by: string | null;
  readonly at: string;
}

export interface SaverHost<T> {
  /** The part as it stands on the screen. */
  current(): T;
  /** Never rejects. */
  send(attempt: Attempt<T>): Promise<SendResult<T>>;
  /** Keeps a copy on the device, or forgets it. Never rejects. */
  keep(copy: LocalCopy<T> | null): Promise<void>;
  /** Puts the server's version on the screen. */
  adopt(value: T): void;
  /** Runs later; answers how to call it off. */
  later(milliseconds: number, run: () => void): () => void;
  newWriteId(): string;
  changed(status: SaveStatus, conflict: Conflict<T> | null): void;
}

export interface Saver<T> {
  /** The part changed on the screen. */
  touched(): void;
  /** The device is back on line. */
  online(): void;
  /** Saves at once; settles when the server has it, or says why it hasn't. */
  flush(): Promise<SaveStatus>;
  /** Takes up a copy that the device kept from before. The part on the screen must be the copy's value already. */
  resume(copy: LocalCopy<T>): void;
  resolve(choice: 'mine' | 'theirs'): void;
  /** The server's version as just fetched: taken over where nothing here is unsaved; otherwise the next save finds out. */
  offer(value: T, version: number): void;
  version(): number;
  status(): SaveStatus;
  stop(): void;
}

export const SAVE_PAUSE = 800;
const RETRY_FIRST = 2_000;
const RETRY_MOST = 60_000;

export function createSaver<T>(host: SaverHost<T>, savedValue: T, savedVersion: number): Saver<T> {
  let saved = savedValue;
  let version = savedVersion;
  let status: SaveStatus = 'saved';
  let conflict: Conflict<T> | null = null;
  let attempt: Attempt<T> | null = null;
  let inFlight = false;
  let stopped = false;
  let failures = 0;
  let cancelTimer: (() => void) | null = null;
  let waiting: ((status: SaveStatus) => void)[] = [];

  function become(next: SaveStatus): void {
    const told = status !== next || next === 'conflict';
    status = next;
    if (told) host.changed(status, conflict);
    if (next !== 'saving' && next !== 'unsaved') {
      const settled = waiting;
      waiting = [];
      for (const settle of settled) settle(next);
    }
  }

  function clearTimer(): void {
    cancelTimer?.();
    cancelTimer = null;
  }

  function schedule(milliseconds: number): void {
    clearTimer();
    cancelTimer = host.later(milliseconds, () => {
      cancelTimer = null;
      void push();
    });
  }

  function keepCopy(): void {
    const value = host.current();
    void host.keep(value === saved && attempt === null ? null : { value, baseVersion: version, attempt });
  }

  async function push(): Promise<void> {
    if (inFlight || stopped || conflict) return;
    if (attempt === null) {
      const value = host.current();
      if (value === saved) return become('saved');
      attempt = { writeId: host.newWriteId(), baseVersion: version, value };
      keepCopy();
    }
    inFlight = true;
    become('saving');
    const sent = attempt;
    const result = await host.send(sent);
    inFlight = false;
    if (stopped) return;
    receive(sent, result);
  }

  function receive(sent: Attempt<T>, result: SendResult<T>): void {
    if (result.kind === 'offline') {
      become('offline');
      schedule(Math.min(RETRY_MOST, RETRY_FIRST * 2 ** failures));
      failures += 1;
      return;
    }
    attempt = null;
    failures = 0;
    if (result.kind === 'saved') {
      saved = sent.value;
      version = result.version;
      keepCopy();
      if (host.current() === saved) return become('saved');
      become('unsaved');
      schedule(waiting.length > 0 ? 0 : SAVE_PAUSE);
    } else if (result.kind === 'stale') {
      conflict = {
        mine: host.current(),
        theirs: result.theirs,
        theirVersion: result.version,
        by: result.by,
        at: result.at,
      };
      keepCopy();
      become('conflict');
    } else {
      keepCopy();
      become('refused');
    }
  }

  function touched(): void {
    if (stopped) return;
    keepCopy();
    if (conflict) {
      conflict = { ...conflict, mine: host.current() };
      return;
    }
    if (inFlight) return;
    if (attempt === null && host.current() === saved) {
      clearTimer();
      return become('saved');
    }
    if (status === 'offline' && cancelTimer) return;
    become('unsaved');
    schedule(SAVE_PAUSE);
  }

  return {
    touched,
    online() {
      if (status !== 'offline') return;
      failures = 0;
      clearTimer();
      void push();
    },
    flush() {
      if (status === 'conflict' || (status === 'saved' && host.current() === saved)) return Promise.resolve(status);
      const settled = new Promise<SaveStatus>((settle) => waiting.push(settle));
      clearTimer();
      void push();
      return settled;
    },
    resume(copy) {
      version = copy.baseVersion;
      attempt = copy.attempt;
      become('unsaved');
      schedule(0);
    },
    resolve(choice) {
      if (!conflict) return;
      const { theirs, theirVersion } = conflict;
      conflict = null;
      version = theirVersion;
      saved = theirs;
      if (choice === 'theirs') {
        host.adopt(theirs);
        keepCopy();
        become('saved');
      } else {
        become('unsaved');
        keepCopy();
        schedule(0);
      }
    },
    offer(value, offered) {
      if (offered <= version || status !== 'saved' || host.current() !== saved) return;
      saved = value;
      version = offered;
      host.adopt(value);
    },
    version: () => version,
    status: () => status,
    stop() {
      stopped = true;
      clearTimer();
    },
  };
}
