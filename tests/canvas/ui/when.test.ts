import { describe, expect, it } from 'vitest';
import { sayDate, sayWhen } from '../../../canvas/ui/when';
import type { Words } from '../../../canvas/ui/words';

/** Words that show which key and count were asked for. */
const t = ((key: string, params?: { count?: number }) =>
  params?.count === undefined ? key : `${key} ${params.count}`) as unknown as Words;

/** A time of the local day, so that "today" and "yesterday" hold in any time zone. */
function local(day: number, hour: number, minute = 0): Date {
  return new Date(2026, 10, day, hour, minute);
}

describe('saying when', () => {
  const now = local(20, 15).getTime();
  const said = (at: Date) => sayWhen(t, at.toISOString(), now);

  it('says just now below a minute, either way', () => {
    expect(said(new Date(now - 59_000))).toBe('common.when.now');
    expect(said(new Date(now + 30_000))).toBe('common.when.now');
  });

  it('counts whole minutes and, today, whole hours', () => {
    expect(said(local(20, 14, 55))).toBe('common.when.minutes 5');
    expect(said(local(20, 14, 1))).toBe('common.when.minutes 59');
    expect(said(local(20, 12, 30))).toBe('common.when.hours 2');
    expect(said(local(20, 0, 0))).toBe('common.when.hours 15');
  });

  it('says yesterday for the whole day before, however few hours ago', () => {
    expect(said(local(19, 23, 59))).toBe('common.when.yesterday');
    expect(said(local(19, 0, 0))).toBe('common.when.yesterday');
  });

  it('gives the date before that, and for what lies ahead', () => {
    expect(said(local(18, 23, 59))).toBe('18 November 2026');
    expect(said(local(25, 12))).toBe('25 November 2026');
    expect(sayDate(local(1, 12).toISOString())).toBe('1 November 2026');
  });

  it('gives back what is no time at all', () => {
    expect(sayWhen(t, 'soon', now)).toBe('soon');
  });
});
