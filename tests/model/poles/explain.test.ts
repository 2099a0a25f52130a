/** Why a pole can't be braced: the smallest cause against every smaller set of obstacles, and that the change told frees it. */
import { assert as check, array, boolean, constantFrom, integer, property, record, type Arbitrary } from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Door, Drawing } from '../../../model/drawing/schema';
import { inches } from '../../../model/length/ticks';
import { reachLimits, WIDE_CANDIDATES } from '../../../model/poles/candidates';
import { culpritsOf } from '../../../model/poles/culprits';
import { Nearby } from '../../../model/poles/nearby';
import { groundOf, obstacleOf, obstaclesOf, type Obstacle } from '../../../model/poles/obstacles';
import { placePoles } from '../../../model/poles/placePoles';
import { PoleBraces, type PoleSite } from '../../../model/poles/poleBraces';
import { seatsAtCorners } from '../../../model/poles/seats';
import type { Reason } from '../../../model/reasons';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import { door, ell, emptySite, KIT, rectangle, withOpenings, withWalls } from './sites';

const place = (drawing: Drawing) => placePoles(drawing, layOutWalls(drawing));

const square = (id: string, x: number, y: number, width: number, height = width) => ({
  id,
  name: id,
  points: [
    [x, y],
    [x + width, y],
    [x + width, y + height],
    [x, y + height],
  ].map(([px, py]) => ({ x: inches(px!), y: inches(py!) })),
});

/** An L hemmed in by up to ten areas round A and D, with a door near D. */
const hemmed: Arbitrary<Drawing> = record({
  areas: array(
    record({
      corner: constantFrom([0, 0] as const, [168, 144] as const),
      x: integer({ min: -70, max: 40 }),
      y: integer({ min: -70, max: 40 }),
      width: integer({ min: 10, max: 60 }),
      height: integer({ min: 10, max: 60 }),
    }),
    { minLength: 4, maxLength: 10 },
  ),
  used: boolean(),
  at: integer({ min: 30, max: 70 }),
  opens: constantFrom('in' as const, 'out' as const),
}).map(({ areas, used, at, opens }) => ({
  ...withOpenings(
    ell(),
    door('CD', at, { way: { used, width: inches(44), depth: inches(60) }, swing: { hinge: 'far', opens } }),
  ),
  keepClears: areas
    .map(({ corner: [cx, cy], x, y, width, height }, i) => square(`k${i}`, cx + x, cy + y, width, height))
    // None stands on a pole itself: that is another reason.
    .filter(({ points }) => {
      const [a, , c] = points;
      const holds = (px: number, py: number) =>
        a!.x < inches(px + 4) && c!.x > inches(px - 4) && a!.y < inches(py + 4) && c!.y > inches(py - 4);
      return !holds(0, 0) && !holds(168, 144);
    }),
}));

/** Every pole of a drawing with what stands round it. */
function poleSites(drawing: Drawing) {
  const walls = layOutWalls(drawing);
  const placed = placePoles(drawing, walls);
  const poles = placed.poles.map((pole) => obstacleOf('pole', { kind: 'pole', id: pole.id }, pole.section));
  const obstacles = [...obstaclesOf(drawing, walls), ...poles];
  const sites = seatsAtCorners(walls).map((seat): PoleSite => {
    const at = placed.poleById.get(seat.id)!.at;
    const limits = { least: 60, most: 120 };
    return { poleId: seat.id, seat, at, kit: KIT, reach: reachLimits(KIT)!, limits, options: WIDE_CANDIDATES };
  });
  return { obstacles, sites };
}

function* subsets<T>(all: readonly T[], size: number, from = 0): Generator<readonly T[]> {
  if (size === 0) yield [];
  else
    for (let i = from; i <= all.length - size; i += 1)
      for (const rest of subsets(all, size - 1, i + 1)) yield [all[i]!, ...rest];
}

describe('the cause of a pole that can’t be braced', () => {
  it('blocks the pole by itself, and no smaller set of obstacles does', () => {
    const sizes = new Map<number, number>();
    check(
      property(hemmed, (drawing) => {
        const { obstacles, sites } = poleSites(drawing);
        for (const site of sites) {
          const ground = groundOf(obstacles, null);
          const braces = new PoleBraces(site, ground);
          const nearby = new Nearby(site.at, site.poleId, KIT, ground, braces.longestReach);
          const found = culpritsOf(braces, nearby, { left: 10_000_000 });
          if (braces.own()) {
            expect(found).toBeNull();
            continue;
          }
          expect(found?.smallest).toBe(true);
          const own = new Set(site.seat.faces.map((face) => face.runId));
          const key = ({ thing }: Pick<Obstacle, 'thing'>) => `${thing.kind} ${thing.id}`;
          const given = (each: Obstacle) => each.thing.kind === 'run' && own.has(each.thing.id);
          const others = [...new Set(obstacles.filter((each) => !given(each) && each.kind !== 'frame').map(key))];
          const blocks = (named: ReadonlySet<string>) => {
            const some = obstacles.filter((each) => given(each) || named.has(key(each)));
            return new PoleBraces(site, groundOf(some, null)).own() === null;
          };
          const things = found!.things.map((thing) => key({ thing }));
          expect(blocks(new Set(things))).toBe(true);
          if (things.length <= 3)
            for (let size = 0; size < things.length; size += 1)
              for (const some of subsets(others, size)) expect(blocks(new Set(some))).toBe(false);
          sizes.set(things.length, (sizes.get(things.length) ?? 0) + 1);
        }
      }),
      { numRuns: 60, seed: 11 },
    );
    // Causes of one thing and of two were both met.
    expect([1, 2].map((size) => (sizes.get(size) ?? 0) > 0)).toEqual([true, true]);
  });

  it('is three areas where each leaves a quarter open without the others’ help', () => {
    // Sectors round A's heel, from 12 to 130 in out, that lap over one another by two degrees.
    const sector = (id: string, from: number, to: number) => {
      const at = (degrees: number, radius: number) => {
        const angle = (degrees * Math.PI) / 180;
        return { x: inches(radius * Math.cos(angle) - 19 / 16), y: inches(radius * Math.sin(angle) - 19 / 16) };
      };
      const middle = (from + to) / 2;
      return { id, name: id, points: [at(from, 12), at(from, 130), at(middle, 180), at(to, 130), at(to, 12)] };
    };
    const spare = sector('spare', 190, 200);
    const areas = [sector('west', 85, 181), sector('south', 179, 271), sector('east', 269, 365), spare];
    const reason = place({ ...rectangle(), keepClears: areas }).reasons.find((each) => each.thing.id === 'A');
    expect(reason?.code).toBe('braceBlocked');
    expect(reason?.against?.map((thing) => thing.id).sort()).toEqual(['east', 'south', 'west']);
  });

  it('says a change after which the pole is braced', () => {
    const met = new Set<string>();
    check(
      property(hemmed, (drawing) => {
        for (const reason of place(drawing).reasons) {
          const { change, thing } = reason;
          if (!change || (reason.code !== 'braceBlocked' && reason.code !== 'braceAngleOut')) continue;
          const changed = applied(drawing, change);
          if (!changed) continue;
          met.add(change.kind);
          const still = place(changed).reasons.filter((each) => each.thing.id === thing.id);
          expect(
            still.filter((each) => each.code === reason.code && each.against?.length !== 0 && isOwn(each)),
          ).toEqual([]);
        }
      }),
      { numRuns: 60, seed: 5 },
    );
    expect([...met].sort()).toEqual(['notUsedDuringWork', 'openOtherWay']);
  });

  it('takes the walls of the pole’s own corner as given, and names them where they alone leave no room', () => {
    // The open side at D is 2 × atan(100 / 270) = 40.6° wide: no two braces in it are 60° apart.
    const narrow = withWalls(emptySite(), [
      [0, 0],
      [400, 0],
      [300, 300],
      [200, 30],
      [100, 300],
    ]);
    const reason = place(narrow).reasons.find((each) => each.thing.id === 'D');
    expect(reason?.code).toBe('braceAngleOut');
    expect(reason?.against?.map((thing) => thing.id).sort()).toEqual(['CD', 'DE']);
    expect(reason?.change).toBeUndefined();
  });
});

/** Not for the braces of other poles. */
const isOwn = (reason: Reason) => (reason.against ?? []).every((thing) => thing.kind !== 'pole');

function applied(drawing: Drawing, change: NonNullable<Reason['change']>): Drawing | null {
  const onDoor = (edit: (each: Door) => Door): Drawing => ({
    ...drawing,
    openings: drawing.openings.map((each) => (each.id === change.thing.id && each.kind === 'door' ? edit(each) : each)),
  });
  switch (change.kind) {
    case 'openOtherWay':
      return onDoor((each) => ({
        ...each,
        swing: { ...each.swing, opens: each.swing.opens === 'in' ? 'out' : 'in' },
      }));
    case 'swapHinge':
      return onDoor((each) => ({
        ...each,
        swing: { ...each.swing, hinge: each.swing.hinge === 'near' ? 'far' : 'near' },
      }));
    case 'notUsedDuringWork':
      return onDoor((each) => ({ ...each, way: { ...each.way, used: false } }));
    default:
      return null;
  }
}
