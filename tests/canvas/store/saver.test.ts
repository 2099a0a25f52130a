import { describe, expect, it } from 'vitest';
import {
  createSaver,
  SAVE_PAUSE,
  type Attempt,
  type Conflict,
  type LocalCopy,
  type SaveStatus,
  type SendResult,
} from '../../../canvas/store/saver';

/** A bench of one saver with a hand-turned clock, a server that answers when told, and a record of everything. */
function bench(saved = 'a', version = 5) {
  let now = 0;
  let writes = 0;
  let timers: { at: number; run: () => void }[] = [];
  const sent: Attempt<string>[] = [];
  const answers: ((result: SendResult<string>) => void)[] = [];
  const seen = {
    statuses: [] as SaveStatus[],
    conflict: null as Conflict<string> | null,
    kept: null as LocalCopy<string> | null,
  };
  let value = saved;
  const saver = createSaver<string>(
    {
      current: () => value,
      send(attempt) {
        sent.push(attempt);
        return new Promise((settle) => answers.push(settle));
      },
      async keep(copy) {
        seen.kept = copy;
      },
      adopt(theirs) {
        value = theirs;
      },
      later(milliseconds, run) {
        const timer = { at: now + milliseconds, run };
        timers.push(timer);
        return () => {
          timers = timers.filter((other) => other !== timer);
        };
      },
      newWriteId: () => `w${(writes += 1)}`,
      changed(status, conflict) {
        seen.statuses.push(status);
        seen.conflict = conflict;
      },
    },
    saved,
    version,
  );
  return {
    saver,
    seen,
    sent,
    type(text: string) {
      value = text;
      saver.touched();
    },
    pass(milliseconds: number) {
      now += milliseconds;
      const due = timers.filter((timer) => timer.at <= now);
      timers = timers.filter((timer) => timer.at > now);
      for (const timer of due) timer.run();
    },
    async answer(result: SendResult<string>) {
      answers.shift()?.(result);
      await Promise.resolve();
      await Promise.resolve();
    },
    value: () => value,
    timers: () => timers.length,
  };
}

describe('saving by itself', () => {
  it('waits for a pause, then sends the last value once, naming the version it was made from', async () => {
    const b = bench();
    b.type('b');
    b.pass(SAVE_PAUSE - 1);
    b.type('c');
    b.pass(SAVE_PAUSE - 1);
    expect(b.sent).toEqual([]);
    b.pass(1);
    expect(b.sent).toEqual([{ writeId: 'w1', baseVersion: 5, value: 'c' }]);
    await b.answer({ kind: 'saved', version: 6 });
    expect(b.seen.statuses).toEqual(['unsaved', 'saving', 'saved']);
    expect(b.saver.version()).toBe(6);
    expect(b.seen.kept).toBe(null);
  });

  it('has one request in the air at a time and sends what came meanwhile after it', async () => {
    const b = bench();
    b.type('b');
    b.pass(SAVE_PAUSE);
    b.type('c');
    b.pass(SAVE_PAUSE);
    b.type('d');
    b.pass(SAVE_PAUSE);
    expect(b.sent).toHaveLength(1);
    await b.answer({ kind: 'saved', version: 6 });
    expect(b.saver.status()).toBe('unsaved');
    b.pass(SAVE_PAUSE);
    expect(b.sent[1]).toEqual({ writeId: 'w2', baseVersion: 6, value: 'd' });
  });

  it('sends an unanswered write again exactly as it was, and only then what came after', async () => {
    const b = bench();
    b.type('b');
    b.pass(SAVE_PAUSE);
    await b.answer({ kind: 'offline' });
    expect(b.saver.status()).toBe('offline');
    b.type('c');
    expect(b.seen.kept).toEqual({ value: 'c', baseVersion: 5, attempt: { writeId: 'w1', baseVersion: 5, value: 'b' } });
    b.pass(2_000);
    expect(b.sent[1]).toEqual(b.sent[0]);
    await b.answer({ kind: 'saved', version: 6 });
    b.pass(SAVE_PAUSE);
    expect(b.sent[2]).toEqual({ writeId: 'w2', baseVersion: 6, value: 'c' });
  });

  it('comes again after longer and longer pauses, a minute at most, and at once when on line', async () => {
    const b = bench();
    b.type('b');
    b.pass(SAVE_PAUSE);
    for (const pause of [2_000, 4_000, 8_000, 16_000, 32_000, 60_000, 60_000]) {
      await b.answer({ kind: 'offline' });
      const before = b.sent.length;
      b.pass(pause - 1);
      expect(b.sent).toHaveLength(before);
      b.pass(1);
      expect(b.sent).toHaveLength(before + 1);
    }
    await b.answer({ kind: 'offline' });
    const before = b.sent.length;
    b.saver.online();
    expect(b.sent).toHaveLength(before + 1);
    expect(b.timers()).toBe(0);
  });

  it('holds both versions when somebody saved meanwhile, and saves mine on top of theirs when chosen', async () => {
    const b = bench();
    b.type('mine');
    b.pass(SAVE_PAUSE);
    await b.answer({ kind: 'stale', theirs: 'theirs', version: 9, by: 'Ana', at: '2026-01-01T00:00:00Z' });
    expect(b.seen.conflict).toMatchObject({ mine: 'mine', theirs: 'theirs', theirVersion: 9, by: 'Ana' });
    b.type('mine, further');
    b.pass(60_000);
    expect(b.sent).toHaveLength(1);
    b.saver.resolve('mine');
    b.pass(0);
    expect(b.sent[1]).toEqual({ writeId: 'w2', baseVersion: 9, value: 'mine, further' });
    await b.answer({ kind: 'saved', version: 10 });
    expect(b.saver.status()).toBe('saved');
  });

  it('puts theirs on the screen when chosen, and sends nothing', async () => {
    const b = bench();
    b.type('mine');
    b.pass(SAVE_PAUSE);
    await b.answer({ kind: 'stale', theirs: 'theirs', version: 9, by: null, at: '2026-01-01T00:00:00Z' });
    b.saver.resolve('theirs');
    b.pass(60_000);
    expect(b.value()).toBe('theirs');
    expect(b.sent).toHaveLength(1);
    expect([b.saver.status(), b.saver.version(), b.seen.kept]).toEqual(['saved', 9, null]);
  });

  it('takes up a copy kept on the device, with the write that was not answered first', async () => {
    const b = bench('server', 7);
    b.type('later');
    b.saver.resume({ value: 'later', baseVersion: 5, attempt: { writeId: 'old', baseVersion: 5, value: 'earlier' } });
    b.pass(0);
    expect(b.sent[0]).toEqual({ writeId: 'old', baseVersion: 5, value: 'earlier' });
    await b.answer({ kind: 'saved', version: 7 });
    b.pass(SAVE_PAUSE);
    expect(b.sent[1]).toEqual({ writeId: 'w1', baseVersion: 7, value: 'later' });
  });

  it('stops trying what is refused until something changes', async () => {
    const b = bench();
    b.type('b');
    b.pass(SAVE_PAUSE);
    await b.answer({ kind: 'refused' });
    b.pass(600_000);
    expect(b.sent).toHaveLength(1);
    expect(b.saver.status()).toBe('refused');
    expect(b.seen.kept).toMatchObject({ value: 'b' });
  });

  it('saves nothing when the change was undone before the pause ended', () => {
    const b = bench();
    b.type('b');
    b.type('a');
    b.pass(60_000);
    expect(b.sent).toEqual([]);
    expect(b.saver.status()).toBe('saved');
  });

  it('saves at once when asked and says how it went, also for what came while a request was in the air', async () => {
    const b = bench();
    b.type('b');
    let told: SaveStatus | null = null;
    void b.saver.flush().then((status) => {
      told = status;
    });
    expect(b.sent).toHaveLength(1);
    b.type('c');
    await b.answer({ kind: 'saved', version: 6 });
    expect(told).toBe(null);
    b.pass(0);
    await b.answer({ kind: 'saved', version: 7 });
    expect(told).toBe('saved');
    expect(await b.saver.flush()).toBe('saved');
  });

  it('takes over a newer version that was fetched, unless something here is unsaved', () => {
    const b = bench('a', 5);
    b.saver.offer('older', 5);
    expect(b.value()).toBe('a');
    b.saver.offer('restored', 6);
    expect([b.value(), b.saver.version(), b.saver.status()]).toEqual(['restored', 6, 'saved']);
    b.type('mine');
    b.saver.offer('newer', 7);
    expect([b.value(), b.saver.version()]).toEqual(['mine', 6]);
  });

  it('does nothing more once stopped', async () => {
    const b = bench();
    b.type('b');
    b.saver.stop();
    b.pass(60_000);
    b.type('c');
    b.pass(60_000);
    expect(b.sent).toEqual([]);
  });
});
