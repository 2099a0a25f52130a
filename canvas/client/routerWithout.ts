/**
 * Stands in, on the web, for the router's tab bars, its trial stack, its page of all routes and its
 * page for none: ours are our own, or not wanted.
 */
import { createContext } from 'react';

export const Tabs = undefined;
export const ExperimentalStack = undefined;
export const Sitemap = undefined;
export const Unmatched = undefined;

export function getNavOptions(): object {
  return {};
}

/** The router's own error page asks how high a tab bar is; there is none. */
export const BottomTabBarHeightContext = createContext<number | undefined>(undefined);
