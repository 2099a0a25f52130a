import { describe, expect, it } from 'vitest';
import { newOpening } from '../../../model/drawing/defaults';
import type { Opening } from '../../../model/drawing/schema';
import { inches, ticks } from '../../../model/length/ticks';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import { openingBody } from '../../../model/walls/openingBody';
import { outline, plan } from './shapes';

interface Sizes {
  readonly runId?: string;
  readonly sill?: number;
  readonly head?: number;
  readonly bearing?: number;
  readonly depth?: number;
}

function opening(id: string, at: number, width: number, sizes: Sizes = {}): Opening {
  const { runId = 'A-B', sill = 0, head = 84, bearing = 0, depth = 8 } = sizes;
  return {
    ...newOpening('imperial', 'window', { id, runId, at: inches(at) }),
    width: inches(width),
    sill: inches(sill),
    head: inches(head),
    lintel: { depth: inches(depth), bearing: inches(bearing) },
  };
}

const ROOM = outline([
  [0, 0],
  [300, 0],
  [300, 200],
  [0, 200],
]);

function lay(...openings: Opening[]) {
  return layOutWalls({ ...ROOM, openings });
}

const thing = (id: string) => ({ kind: 'opening', id }) as const;

describe('openings', () => {
  it('are kept in order along their run', () => {
    const walls = lay(opening('far', 200, 40), opening('near', 20, 40), opening('side', 50, 30, { runId: 'B-C' }));
    expect(walls.openingsByRun.get('A-B')).toEqual(['near', 'far']);
    expect(walls.openingsByRun.get('B-C')).toEqual(['side']);
    expect(walls.openingsByRun.get('C-D')).toEqual([]);
    expect(walls.reasons).toEqual([]);
  });

  it('give running dimensions along the outside face, jambs and end', () => {
    const { running } = lay(opening('far', 200, 40), opening('near', 20, 40));
    expect(running.filter((one) => one.runId === 'A-B').map((one) => [one.at, one.what, one.openingId])).toEqual([
      [inches(20), 'jamb', 'near'],
      [inches(60), 'jamb', 'near'],
      [inches(200), 'jamb', 'far'],
      [inches(240), 'jamb', 'far'],
      [inches(300), 'end', null],
    ]);
  });

  it('may start where the body of the other wall ends, and no sooner', () => {
    expect(lay(opening('o', 12, 40)).reasons).toEqual([]);
    expect(lay(opening('o', 11, 40)).reasons).toEqual([
      {
        code: 'openingPastEnd',
        weight: 'blocked',
        thing: thing('o'),
        against: [{ kind: 'run', id: 'A-B' }],
        amount: inches(1),
      },
    ]);
    expect(lay(opening('o', 248, 40)).reasons).toEqual([]);
    expect(lay(opening('o', 250, 40)).reasons).toMatchObject([{ code: 'openingPastEnd', amount: inches(2) }]);
    expect(lay(opening('o', 250, 40)).openingsByRun.get('A-B')).toEqual([]);
  });

  it('may start at a reentrant corner and at a free end', () => {
    const ell = outline([
      [0, 0],
      [300, 0],
      [300, 100],
      [150, 100],
      [150, 250],
      [0, 250],
    ]);
    expect(layOutWalls({ ...ell, openings: [opening('o', 0, 30, { runId: 'D-E' })] }).reasons).toEqual([]);
    const wall = plan({ A: [0, 0], B: [100, 0] }, ['A-B']);
    expect(layOutWalls({ ...wall, openings: [opening('o', 0, 30)] }).reasons).toEqual([]);
    expect(layOutWalls({ ...wall, openings: [opening('o', -1, 30)] }).reasons).toMatchObject([{ amount: inches(1) }]);
  });

  it('keep clear of a stem that stops against their wall', () => {
    const drawing = plan({ A: [0, 0], T: [100, 0], B: [200, 0], S: [100, 90] }, ['A-T', 'T-B', 'T-S']);
    // The stem's body lies to the left of T–S: between 88 and 100 in of A–T.
    const on = (runId: string, at: number) =>
      layOutWalls({ ...drawing, openings: [opening('o', at, 30, { runId })] }).reasons.map((reason) => reason.amount);
    expect(on('A-T', 58)).toEqual([]);
    expect(on('A-T', 60)).toEqual([inches(2)]);
    expect(on('T-B', 0)).toEqual([]);
  });

  it('are named where they overlap; the further one is left out', () => {
    const walls = lay(opening('b', 90, 40), opening('a', 60, 40));
    expect(walls.reasons).toEqual([
      { code: 'openingsOverlap', weight: 'blocked', thing: thing('b'), against: [thing('a')], amount: inches(10) },
    ]);
    expect(walls.openingsByRun.get('A-B')).toEqual(['a']);
    expect(lay(opening('a', 60, 40), opening('b', 100, 40)).reasons).toEqual([]);
  });

  it('may stand over one another, above the lower one’s lintel', () => {
    expect(lay(opening('low', 60, 40), opening('high', 50, 60, { sill: 92, head: 130 })).reasons).toEqual([]);
    expect(lay(opening('low', 60, 40), opening('high', 50, 60, { sill: 91, head: 130 })).reasons).toMatchObject([
      { code: 'openingsOverlap', thing: thing('low'), against: [thing('high')] },
    ]);
  });

  it('are named where their head is not over their sill', () => {
    expect(lay(opening('o', 60, 40, { sill: 84, head: 80 })).reasons).toEqual([
      { code: 'openingUpsideDown', weight: 'blocked', thing: thing('o'), amount: inches(4) },
    ]);
  });

  it('are named where their lintel bears past the end of the run, but stand', () => {
    const walls = lay(opening('o', 14, 40, { bearing: 16 }));
    expect(walls.reasons).toEqual([
      {
        code: 'lintelBearingPastEnd',
        weight: 'warning',
        thing: thing('o'),
        against: [{ kind: 'run', id: 'A-B' }],
        amount: inches(2),
      },
    ]);
    expect(walls.openingsByRun.get('A-B')).toEqual(['o']);
    expect(lay(opening('o', 16, 40, { bearing: 16 })).reasons).toEqual([]);
  });

  it('are named where their lintel bears on a taller opening beside them', () => {
    expect(lay(opening('a', 60, 40, { bearing: 16 }), opening('b', 110, 40, { head: 100 })).reasons).toMatchObject([
      { code: 'lintelBearingPastEnd', thing: thing('a'), against: [thing('b')], amount: inches(6) },
    ]);
  });

  it('take a rectangle out of the wall', () => {
    const run = layOutWalls(ROOM).runById.get('B-C');
    if (!run) throw new Error('no run B-C');
    const body = openingBody(run, { at: inches(50), width: inches(30) });
    expect(body.map((point) => [point.x, point.y])).toEqual(
      [
        [300, 50],
        [300, 80],
        [288, 80],
        [288, 50],
      ].map((place) => place.map((value) => inches(value))),
    );
    expect(layOutWalls(ROOM).running).toContainEqual({ runId: 'A-B', at: inches(300), what: 'end', openingId: null });
    expect(ticks(0)).toBe(0);
  });
});
