/** Things of two drawings matched by id. */

export interface Matched<T> {
  readonly removed: readonly T[];
  readonly added: readonly T[];
  readonly both: readonly (readonly [T, T])[];
}

/** Removed in the order of `before`; added and kept in the order of `after`. */
export function matchById<T extends { readonly id: string }>(before: readonly T[], after: readonly T[]): Matched<T> {
  const old = new Map(before.map((item) => [item.id, item]));
  const now = new Set(after.map((item) => item.id));
  const both: [T, T][] = [];
  const added: T[] = [];
  for (const item of after) {
    const was = old.get(item.id);
    if (was) both.push([was, item]);
    else added.push(item);
  }
  return { removed: before.filter((item) => !now.has(item.id)), added, both };
}

/** Deep equality of plain data, whatever the order of its keys. */
export function sameData(a: unknown, b: unknown): boolean {
  if (Object.is(a, b)) return true;
  if (typeof a !== 'object' || typeof b !== 'object' || a === null || b === null) return false;
  if (Array.isArray(a) !== Array.isArray(b)) return false;
  const keys = Object.keys(a);
  return (
    keys.length === Object.keys(b).length &&
    keys.every((key) => key in b && sameData(a[key as keyof typeof a], b[key as keyof typeof b]))
  );
}
