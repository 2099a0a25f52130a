import { useLayoutEffect, useState } from 'react';

interface Box<T> {
  get(): T;
  set(value: T): void;
}

function boxOf<T>(first: T): Box<T> {
  let held = first;
  return {
    get: () => held,
    set(value) {
      held = value;
    },
  };
}

/** A way to what was last rendered, for listeners that outlive a render; the same function always. */
export function useLatest<T>(value: T): () => T {
  const [box] = useState(() => boxOf(value));
  useLayoutEffect(() => box.set(value));
  return box.get;
}
