import { describe, expect, it } from 'vitest';
import { inches, ticks } from '../../../model/length/ticks';
import { writeLength } from '../../../model/length/write';
import type { Survey } from '../../../model/drawing/surveySchema';
import type { Reason } from '../../../model/reasons';
import { en } from '../../../model/words/en';
import { nameThing } from '../../../model/words/naming';
import { REASON_CODES, wordBrace, wordFix, wordReason } from '../../../model/words/wordReason';
import type { Brace } from '../../../model/poles/types';
import { door, ell, withOpenings } from '../poles/sites';
import { strictSay } from './speaker';

const say = strictSay();
const write = (length: number) =>
  writeLength(ticks(length), { units: 'imperial', step: inches(1 / 16), style: 'inches' });
const site = withOpenings(ell(), door('AB', 14), door('AB', 100), door('CD', 60));

describe('names of things', () => {
  const table = [
    [{ kind: 'corner', id: 'C' }, 'Corner C', 'corner C'],
    [{ kind: 'run', id: 'AB' }, 'Wall A–B', 'wall A–B'],
    [{ kind: 'opening', id: 'door-CD-60' }, 'Door in C–D', 'the door in C–D'],
    [{ kind: 'opening', id: 'door-AB-14' }, 'Door 1 in A–B', 'door 1 in A–B'],
    [{ kind: 'opening', id: 'door-AB-100' }, 'Door 2 in A–B', 'door 2 in A–B'],
    [{ kind: 'pole', id: 'A' }, 'Pole A', 'pole A'],
    [{ kind: 'pole', id: `AB@${inches(144)}` }, 'Pole in A–B', 'the pole in A–B'],
    [{ kind: 'pole', id: `AB@${inches(288)}` }, 'Second pole at B', 'the second pole at B'],
    [{ kind: 'brace', id: 'A.2' }, 'Brace 2 of pole A', 'brace 2 of pole A'],
    [{ kind: 'lift', id: '2' }, 'Lift 2', 'lift 2'],
    [{ kind: 'opening', id: 'no-such' }, 'Something no longer drawn', 'something no longer drawn'],
    [{ kind: 'brace', id: 'Z.1' }, 'Something no longer drawn', 'something no longer drawn'],
  ] as const;
  it.each(table)('%o is named alone and within a sentence', (thing, title, running) => {
    expect(nameThing(thing, site, say)).toBe(title);
    expect(nameThing(thing, site, say, { form: 'running' })).toBe(running);
  });

  it('has the same names alone and within a sentence', () => {
    expect(Object.keys(en.reasons.running)).toEqual(Object.keys(en.reasons.title));
  });

  it('says where a reading was taken when it has the survey', () => {
    const survey: Survey = {
      version: 1,
      method: 'measureDown',
      readings: [{ id: 'r1', station: { kind: 'corner', cornerId: 'E' }, down: inches(48) }],
    };
    const thing = { kind: 'station', id: 'r1' } as const;
    expect(nameThing(thing, site, say)).toBe('Reading');
    expect(nameThing(thing, site, say, { survey })).toBe('Reading at E');
  });
});

describe('reasons in words', () => {
  const thing = { kind: 'pole', id: 'A' } as const;
  const against = [
    { kind: 'opening', id: 'door-AB-14' },
    { kind: 'run', id: 'FA' },
    { kind: 'boundary', id: 'boundary' },
  ] as const;

  it.each(REASON_CODES)('%s has words with and without its figures', (code) => {
    const bare = wordReason({ code, weight: 'note', thing }, site, say, write);
    const full = wordReason({ code, weight: 'note', thing, against, amount: inches(2) }, site, say, write);
    for (const text of [bare, full]) {
      expect(text).toMatch(/^\p{Lu}.*\.$/u);
      expect(text).not.toContain('{{');
      expect(text).not.toMatch(/ {2}|: \.|by \.| \./);
    }
  });

  it('names the thing, the amount and what is in the way', () => {
    const reason: Reason = {
      code: 'poleBlockedByFrame',
      weight: 'blocked',
      thing,
      against: [against[0]],
      amount: inches(1.5),
    };
    expect(wordReason(reason, site, say, write)).toBe(
      'Pole A stands 1 1/2" too near door 1 in A–B, and can’t be set off along the wall line.',
    );
  });

  it('lists what is in the way as a sentence does', () => {
    expect(wordReason({ code: 'braceBlocked', weight: 'blocked', thing, against }, site, say, write)).toBe(
      'Pole A can’t be braced both ways with door 1 in A–B, wall F–A and the site boundary in the way.',
    );
  });

  it.each(['swapHinge', 'openOtherWay', 'notUsedDuringWork'] as const)('%s is said of its door', (kind) => {
    const change = { kind, thing: against[0] };
    expect(wordFix({ code: 'braceBlocked', weight: 'blocked', thing, change }, site, say, write)).toContain(
      'door 1 in A–B',
    );
  });

  it.each(['setOff', 'shorterLeg', 'longerLeg', 'move'] as const)('%s is said with its length', (kind) => {
    const change = { kind, thing, by: inches(3.25) };
    expect(wordFix({ code: 'braceBlocked', weight: 'blocked', thing, change }, site, say, write)).toContain('3 1/4"');
  });

  it('gives the nearest that does, on one side or both', () => {
    const base = { code: 'runDoesNotBond', weight: 'blocked', thing } as const;
    const fix = (below: number | null, above: number | null) =>
      wordFix(
        {
          ...base,
          nearest: { below: below === null ? null : inches(below), above: above === null ? null : inches(above) },
        },
        site,
        say,
        write,
      );
    expect(fix(10, 12)).toBe('Nearest that does: 10" or 12".');
    expect(fix(10, null)).toBe('Nearest that does: 10".');
    expect(fix(null, 12)).toBe('Nearest that does: 12".');
    expect(fix(null, null)).toBeNull();
  });

  it('says how a brace stands', () => {
    const brace = {
      turned: 29,
      turnedFor: { kind: 'opening', id: 'door-CD-60' },
      inLineWith: 'AB',
    } as unknown as Brace;
    expect(wordBrace(brace, site, say)).toBe('turned 29° for the door in C–D');
    expect(wordBrace({ ...brace, turnedFor: null }, site, say)).toBe('turned 29°');
    expect(wordBrace({ ...brace, turned: 0 }, site, say)).toBe('straight in line with wall A–B');
  });
});
