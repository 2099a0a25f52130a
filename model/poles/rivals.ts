/** The fewest other poles whose braces leave a pole no place for its own. */
import { distance } from '../geometry/vec';
import { solveGroup, type Member } from './group';
import type { PoleBraces } from './poleBraces';

/** Sets of rivals tried for one pole, the steps for each, and how many rivals a set may have before it is no help. */
const TRIES = 40;
const STEPS = 20_000;
const RIVALS_MOST = 2;
/** How many of the nearest are named where no small set is found. */
const NAMED_MOST = 6;

function memberOf(index: number, pole: PoleBraces): Member[] {
  const own = pole.own();
  return own ? [{ index, pole, own, relevant: [0, 0] }] : [];
}

function* setsOf(all: readonly number[], size: number, from = 0): Generator<readonly number[]> {
  if (size === 0) yield [];
  else
    for (let i = from; i < all.length; i += 1)
      for (const rest of setsOf(all, size - 1, i + 1)) yield [all[i] ?? 0, ...rest];
}

/**
 * The smallest set of the group's poles that can't all be braced together with the pole `index`, of two poles at most: each
 * set is solved exactly. Where none is found within the count, the nearest poles that its braces can meet.
 */
export function rivalsOf(
  index: number,
  group: readonly number[],
  poles: readonly PoleBraces[],
  clearance: number,
): readonly number[] {
  const pole = poles[index];
  if (!pole) return [];
  const near = group
    .flatMap((j) => {
      const other = poles[j];
      if (!other || j === index || !other.own()) return [];
      const far = distance(pole.at, other.at);
      return far <= pole.longestReach + other.longestReach + clearance ? [{ j, far }] : [];
    })
    .sort((a, b) => a.far - b.far)
    .map(({ j }) => j);
  let tries = TRIES;
  for (let size = 1; size <= RIVALS_MOST; size += 1)
    for (const set of setsOf(near, size)) {
      if ((tries -= 1) < 0) break;
      const members = [index, ...set].flatMap((j) => (poles[j] ? memberOf(j, poles[j]) : []));
      const parts = members.map((member) => ({ members: [member], lower: member.own.cost }));
      const solved = solveGroup(parts, clearance, { most: STEPS, inAll: STEPS });
      if (solved.exact && solved.pairs.size < members.length) return set;
    }
  return near.slice(0, NAMED_MOST);
}
