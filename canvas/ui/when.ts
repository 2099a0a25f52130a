import { useSyncExternalStore } from 'react';
import type { Words } from './words';

const MINUTE = 60_000;
const HOUR = 60 * MINUTE;

function startOfDay(at: number): number {
  const day = new Date(at);
  day.setHours(0, 0, 0, 0);
  return day.getTime();
}

/** A moment as people say it: just now, 5 minutes ago, yesterday, 12 November 2026. `at` as ISO 8601, `now` in ms. */
export function sayWhen(t: Words, at: string, now: number): string {
  const then = Date.parse(at);
  if (Number.isNaN(then)) return at;
  const past = now - then;
  if (past < MINUTE) return past > -MINUTE ? t('common.when.now') : sayDate(at);
  if (past < HOUR) return t('common.when.minutes', { count: Math.floor(past / MINUTE) });
  if (then >= startOfDay(now)) return t('common.when.hours', { count: Math.floor(past / HOUR) });
  if (then >= startOfDay(startOfDay(now) - HOUR)) return t('common.when.yesterday');
  return sayDate(at);
}

/** A day: 12 November 2026. */
export function sayDate(at: string): string {
  return new Date(at).toLocaleDateString('en-GB', { day: 'numeric', month: 'long', year: 'numeric' });
}

let minute = Date.now();

function watchMinutes(changed: () => void): () => void {
  const timer = setInterval(() => {
    minute = Date.now();
    changed();
  }, MINUTE / 2);
  return () => clearInterval(timer);
}

/** Now, in ms, moving on every half minute while something shows it. */
export function useNow(): number {
  return useSyncExternalStore(watchMinutes, () => minute);
}
