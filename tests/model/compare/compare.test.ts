import { describe, expect, it } from 'vitest';
import { compareDrawings, type ComparedState } from '../../../model/compare/compare';
import type { Change } from '../../../model/compare/types';
import type { Drawing } from '../../../model/drawing/schema';
import { EMPTY_SURVEY, type Survey } from '../../../model/drawing/surveySchema';
import { inches, ticks } from '../../../model/length/ticks';
import { writeLength } from '../../../model/length/write';
import { solve } from '../../../model/setOut';
import { changeKey, wordChange, wordRemark } from '../../../model/words/wordChange';
import { door, ell, rectangle, withOpenings } from '../poles/sites';
import { strictSay } from '../words/speaker';

const say = strictSay();
const write = (length: number) =>
  writeLength(ticks(length), { units: 'imperial', step: inches(1 / 16), style: 'inches' });
const state = (drawing: Drawing, survey: Survey = EMPTY_SURVEY): ComparedState => ({
  drawing,
  survey,
  setOut: solve(drawing, survey),
});
const beam = {
  id: 'beam',
  name: 'Bond beam',
  soffit: inches(84.5),
  depth: inches(6),
  tolerance: inches(1),
  hold: 'soft' as const,
  bars: { count: 2, diameter: inches(0.5), lap: inches(24) },
};
const plate = {
  id: 'plate',
  kind: 'plate' as const,
  name: 'Plate',
  height: inches(96),
  tolerance: inches(1 / 8),
  hold: 'hard' as const,
  weight: 1,
};

function codes(changes: readonly Change[]): string[] {
  return changes.map((change) => change.code);
}

describe('comparing two drawings', () => {
  const before = { ...withOpenings(rectangle(), door('AB', 60)), controlHeights: [plate] };

  it('finds nothing between a drawing and itself', () => {
    const same = compareDrawings(state(before), state(structuredClone(before)));
    expect(same).toEqual({ changes: [], polesToRemark: [], differingBefore: [], differingAfter: [] });
  });

  it('says how far and toward which corner a door moved, and how much wider it is', () => {
    const [old] = before.openings;
    const moved = { ...old!, at: inches(76), width: inches(42) };
    const { changes } = compareDrawings(state(before), state({ ...before, openings: [moved] }));
    expect(changes.slice(0, 2)).toEqual([
      {
        code: 'openingMoved',
        thing: { kind: 'opening', id: 'door-AB-60' },
        names: { kind: 'door', run: 'A–B', toward: 'B' },
        before: inches(60),
        after: inches(76),
      },
      {
        code: 'openingWidth',
        thing: { kind: 'opening', id: 'door-AB-60' },
        names: { kind: 'door', run: 'A–B' },
        before: inches(36),
        after: inches(42),
      },
    ]);
    const worded = changes.map((change) => wordChange(change, before, { ...before, openings: [moved] }, say, write));
    expect(worded[0]).toEqual({ about: 'Door in A–B', what: 'moved 16" toward B' });
    expect(worded[1]).toEqual({ about: 'Door in A–B', what: '6" wider: 42", was 36"' });
  });

  it('says a door moved toward the first corner when it came nearer to it', () => {
    const after = { ...before, openings: [{ ...before.openings[0]!, at: inches(50) }] };
    const [change] = compareDrawings(state(before), state(after)).changes;
    expect(wordChange(change!, before, after, say, write).what).toBe('moved 10" toward A');
  });

  it('tells a door that went to another wall as removed and added, and draws each where it was', () => {
    const after = { ...before, openings: [{ ...before.openings[0]!, runId: 'CD' }] };
    const comparison = compareDrawings(state(before), state(after));
    expect(codes(comparison.changes)).toEqual(['openingRemoved', 'openingAdded']);
    expect(comparison.differingBefore).toEqual([{ kind: 'opening', id: 'door-AB-60' }]);
    expect(comparison.differingAfter).toEqual([{ kind: 'opening', id: 'door-AB-60' }]);
  });

  it('says how far a corner moved and how long its walls became', () => {
    // B and C 12 in further out: 240 in becomes 252 in; the walls between keep their bearings.
    const after = {
      ...before,
      corners: before.corners.map((c) => (c.id === 'B' || c.id === 'C' ? { ...c, x: inches(252) } : c)),
    };
    const { changes } = compareDrawings(state(before), state(after));
    expect(changes.filter((c) => c.code === 'cornerMoved').map((c) => [c.thing.id, c.after])).toEqual([
      ['B', inches(12)],
      ['C', inches(12)],
    ]);
    expect(changes.filter((c) => c.code === 'runLength').map((c) => [c.thing.id, c.before, c.after])).toEqual([
      ['AB', inches(240), inches(252)],
      ['CD', inches(240), inches(252)],
    ]);
    expect(codes(changes)).not.toContain('runTurned');
  });

  it('says by how many degrees a wall turned', () => {
    // C moved 144 in along its wall: B–C leans by 45° over its 144 in.
    const after = { ...before, corners: before.corners.map((c) => (c.id === 'C' ? { ...c, x: inches(384) } : c)) };
    const turned = compareDrawings(state(before), state(after)).changes.filter((c) => c.code === 'runTurned');
    expect(turned.map((c) => [c.thing.id, c.names['degrees']])).toEqual([['BC', '45']]);
  });

  it('lists a brace that turned for an area, and that went back to straight without it', () => {
    const pit = [
      [-20, -60],
      [20, -60],
      [20, -10],
      [-20, -10],
    ].map(([x, y]) => ({ x: inches(x!), y: inches(y!) }));
    const free = rectangle();
    const blocked = { ...free, keepClears: [{ id: 'pit', name: 'pit', points: pit }] };
    const worded = (a: Drawing, b: Drawing) =>
      compareDrawings(state(a), state(b)).changes.map((change) => wordChange(change, a, b, say, write));
    const turned = state(blocked).setOut.poles.poleById.get('A')!.braces[0]!.turned;
    expect(turned).toBeGreaterThan(0);
    expect(worded(free, blocked)).toContainEqual({ about: 'Brace 1 of pole A', what: `now turned ${turned}°` });
    expect(worded(blocked, free)).toContainEqual({ about: 'Brace 1 of pole A', what: 'goes back to straight' });
  });
});

describe('poles to mark again', () => {
  it('keeps every mark where only the plan changed', () => {
    const before = { ...rectangle(), controlHeights: [plate] };
    const after = {
      ...before,
      keepClears: [
        {
          id: 'k',
          name: 'Tree',
          points: [
            { x: inches(900), y: inches(900) },
            { x: inches(910), y: inches(900) },
            { x: inches(900), y: inches(910) },
          ],
        },
      ],
    };
    const comparison = compareDrawings(state(before), state(after));
    expect(codes(comparison.changes)).toEqual(['keepClearAdded']);
    expect(comparison.polesToRemark).toEqual([]);
  });

  it('names the courses from the first whose mark moved and the largest move', () => {
    // 24 courses of 3 1/2 in under a plate at 96 in: a gauge of 4 in. At 97 1/2 in the joints grow by 1/16 in a course,
    // but not under the first, which stays where the high point puts it.
    const low = { ...rectangle(), controlHeights: [plate] };
    const high = { ...low, controlHeights: [{ ...plate, height: inches(96 + 23 / 16) }] };
    const { polesToRemark, changes } = compareDrawings(state(low), state(high));
    expect(codes(changes)).toContain('jointChanged');
    expect(polesToRemark.map((pole) => pole.letter)).toEqual(['A', 'B', 'C', 'D']);
    for (const pole of polesToRemark) {
      expect(pole).toMatchObject({ lift: 1, firstCourse: 2, lastCourse: 24, moved: 23, added: 0, removed: 0 });
      expect(pole.most).toBe(inches(23 / 16));
      expect(wordRemark(pole, say, write)).toEqual({ courses: '2 to 24', by: 'up to 1 7/16" higher' });
    }
  });

  it('moves every mark down from the line when the level line is shot higher', () => {
    const low = { ...rectangle(), controlHeights: [plate] };
    const survey = (down: number): Survey => ({
      version: 1,
      method: 'measureDown',
      readings: low.corners.map((c) => ({
        id: `r${c.id}`,
        station: { kind: 'corner', cornerId: c.id },
        down: inches(down),
      })),
    });
    const { polesToRemark, changes } = compareDrawings(state(low, survey(48)), state(low, survey(50)));
    expect(changes.map((c) => [c.code, c.names['count']])).toEqual([['survey', '4']]);
    expect(polesToRemark.map((pole) => [pole.letter, pole.firstCourse, pole.most])).toEqual(
      ['A', 'B', 'C', 'D'].map((letter) => [letter, 1, inches(-2)]),
    );
  });

  it('counts a change of the benchmark or of the method as one of the survey', () => {
    const low = { ...rectangle(), controlHeights: [plate] };
    const byRod = (height: number): Survey => ({
      version: 1,
      method: 'rod',
      benchmark: { name: 'Nail', height: inches(height) },
      closing: null,
      share: 'distance',
      readings: [{ id: 'r', station: null, sight: 'back', rod: inches(50) }],
    });
    const counts = (before: Survey, after: Survey) =>
      compareDrawings(state(low, before), state(low, after))
        .changes.filter(({ code }) => code === 'survey')
        .map(({ names }) => names['count']);
    expect(counts(byRod(0), byRod(1))).toEqual(['1']);
    expect(counts(byRod(0), byRod(0))).toEqual([]);
    expect(counts(EMPTY_SURVEY, byRod(0))).toEqual(['2']);
  });

  it('has all marks to add on a pole that is new', () => {
    const before = { ...rectangle(), controlHeights: [plate] };
    const after = { ...ell(), controlHeights: [plate] };
    const added = compareDrawings(state(before), state(after)).polesToRemark.filter((pole) => pole.added > 0);
    expect(added.map((pole) => pole.letter)).toEqual(['E', 'F']);
    expect(added[0]).toMatchObject({ moved: 0, added: 24, removed: 0, firstCourse: 1, lastCourse: 24 });
  });
});

describe('changes in words', () => {
  const site = { ...withOpenings(rectangle(), door('AB', 60)), controlHeights: [plate], bondBeams: [beam] };
  const opening = { kind: 'opening', id: 'door-AB-60' } as const;
  const run = { kind: 'run', id: 'AB' } as const;
  const ground = { kind: 'site', id: 'site' } as const;
  const pole = { kind: 'pole', id: 'A' } as const;
  const both = { before: inches(3), after: inches(4) };
  const make = (code: Change['code'], thing: Change['thing'], names = {}, lengths = {}): Change => ({
    code,
    thing,
    names,
    before: null,
    after: null,
    ...lengths,
  });
  /** Every code, in every way that it can go. */
  const samples: Record<Change['code'], readonly Change[]> = {
    runAdded: [make('runAdded', run, { run: 'A–B' }, { after: inches(4) })],
    runRemoved: [make('runRemoved', run, { run: 'A–B' }, { before: inches(4) })],
    runLength: [make('runLength', run, {}, both)],
    runTurned: [make('runTurned', run, { degrees: '3' })],
    cornerMoved: [make('cornerMoved', { kind: 'corner', id: 'A' }, {}, { after: inches(2) })],
    cornerAdded: [make('cornerAdded', { kind: 'corner', id: 'A' })],
    cornerRemoved: [make('cornerRemoved', { kind: 'corner', id: 'A' })],
    openingAdded: [make('openingAdded', opening, {}, { after: inches(4) })],
    openingRemoved: [make('openingRemoved', opening, {}, { before: inches(4) })],
    openingMoved: [make('openingMoved', opening, { toward: 'B' }, both)],
    openingWidth: [
      make('openingWidth', opening, {}, both),
      make('openingWidth', opening, {}, { before: inches(4), after: inches(3) }),
    ],
    openingSill: [make('openingSill', opening, {}, both)],
    openingHead: [make('openingHead', opening, {}, both)],
    openingFrame: [make('openingFrame', opening, {}, both)],
    lintel: [make('lintel', opening, { part: 'depth' }, both), make('lintel', opening, { part: 'bearing' }, both)],
    doorHinge: [make('doorHinge', opening, { corner: 'A' })],
    doorOpens: [make('doorOpens', opening, { opens: 'in' }), make('doorOpens', opening, { opens: 'out' })],
    doorWay: ['used', 'unused', 'size'].map((use) => make('doorWay', opening, { use }, both)),
    keepClearAdded: [make('keepClearAdded', { kind: 'keepClear', id: 'k' })],
    keepClearRemoved: [make('keepClearRemoved', { kind: 'keepClear', id: 'k' })],
    keepClearChanged: [make('keepClearChanged', { kind: 'keepClear', id: 'k' })],
    boundary: ['added', 'removed', 'changed'].map((s) =>
      make('boundary', { kind: 'boundary', id: 'boundary' }, { state: s }),
    ),
    controlAdded: [make('controlAdded', { kind: 'controlHeight', id: 'plate' }, {}, { after: inches(4) })],
    controlRemoved: [make('controlRemoved', { kind: 'controlHeight', id: 'plate' }, {}, { before: inches(4) })],
    controlHeight: [
      make('controlHeight', { kind: 'controlHeight', id: 'plate' }, {}, both),
      make('controlHeight', { kind: 'controlHeight', id: 'plate' }, {}, { before: inches(3), after: inches(3) }),
    ],
    beamAdded: [make('beamAdded', { kind: 'bondBeam', id: 'beam' }, {}, { after: inches(4) })],
    beamRemoved: [make('beamRemoved', { kind: 'bondBeam', id: 'beam' }, {}, { before: inches(4) })],
    beamChanged: ['soffit', 'other'].map((part) =>
      make('beamChanged', { kind: 'bondBeam', id: 'beam' }, { part }, both),
    ),
    wallType: [
      make('wallType', run, { part: 'run', name: 'Brick' }),
      make('wallType', { kind: 'wallType', id: 'earth' }, { part: 'type' }),
    ],
    poleKit: [make('poleKit', ground)],
    rule: [
      make('rule', ground, { rule: 'lineMost', was: '1', now: '2' }, both),
      make('rule', ground, { rule: 'braceAngleLeast', was: '60', now: '70' }),
    ],
    units: [make('units', ground, { units: 'metric' }), make('units', ground, { units: 'imperial' })],
    tapeStep: [make('tapeStep', ground, {}, both)],
    survey: [make('survey', ground, { count: '1' }), make('survey', ground, { count: '3' })],
    jointChanged: [
      ...['head', 'sill'].map((goal) => make('jointChanged', opening, { goal, from: '1', to: '9' }, both)),
      make('jointChanged', { kind: 'controlHeight', id: 'plate' }, { goal: 'plate', from: '1', to: '9' }, both),
      make('jointChanged', { kind: 'lift', id: '1' }, { goal: 'top', from: '1', to: '9' }, both),
    ],
    poleSetOff: [
      make('poleSetOff', pole, {}, both),
      make('poleSetOff', pole, {}, { before: inches(3), after: ticks(0) }),
    ],
    braceTurned: [make('braceTurned', { kind: 'brace', id: 'A.1' }, { degrees: '29' })],
    braceStraight: [make('braceStraight', { kind: 'brace', id: 'A.1' }, { degrees: '0' })],
  };

  it.each(Object.entries(samples))('%s has words for every way that it can go', (_, ways) => {
    expect(new Set(ways.map((change) => wordChange(change, site, site, say, write).what)).size).toBeGreaterThan(0);
    for (const change of ways) {
      const { about, what } = wordChange(change, site, site, say, write);
      expect(about).toMatch(/^\S/);
      expect(what).not.toMatch(/\{\{|was $|, ,/);
    }
  });

  it('has no wording that no change uses', async () => {
    const { revisions } = await import('../../../model/words/en/revisions');
    const used = new Set(Object.values(samples).flatMap((ways) => ways.map(changeKey)));
    const worded = new Set(Object.keys(revisions.change).map((key) => key.replace(/_(one|other)$/, '')));
    expect([...worded].sort()).toEqual([...used].sort());
  });

  it('words a joint by what its courses run up to', () => {
    const [head] = samples.jointChanged;
    expect(wordChange(head!, site, site, say, write)).toEqual({
      about: 'Bed joint to the head of the door in A–B',
      what: '4", was 3", in courses 1 to 9',
    });
  });
});
