/** Where someone was going when they were asked to sign in, so that they get there afterwards. */
const KEPT_AS = 'polewright.whereTo';
const OPEN_TO_ALL = /^\/(?:$|sign-in|sign-up|forgot|reset|invitation\/|mail)/;

/** Keeps the page in the address bar, or the given one, unless it is one that needs no signing in. */
export function rememberWhereTo(path?: string): void {
  const wanted = path ?? globalThis.location?.pathname ?? '/';
  try {
    if (path !== undefined || !OPEN_TO_ALL.test(wanted)) globalThis.sessionStorage?.setItem(KEPT_AS, wanted);
  } catch {
    // No storage: they begin at the list of sites.
  }
}

/** The page kept, once. Only ever a path of our own. */
export function takeWhereTo(): string | null {
  try {
    const kept = globalThis.sessionStorage?.getItem(KEPT_AS) ?? null;
    globalThis.sessionStorage?.removeItem(KEPT_AS);
    return kept !== null && /^\/(?!\/)/.test(kept) ? kept : null;
  } catch {
    return null;
  }
}
