/** Stands in, on the web, for the router's tab bars and its trial stack: our bar and rail are our own. */
import { createContext } from 'react';

export const Tabs = undefined;
export const ExperimentalStack = undefined;

/** The router's own error page asks how high a tab bar is; there is none. */
export const BottomTabBarHeightContext = createContext<number | undefined>(undefined);
