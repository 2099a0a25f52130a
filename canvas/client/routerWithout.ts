/**
 * Stands in, on the web, for what the router brings along and none of our routes reaches: tab bars, its trial stack, its
 * page of all routes and its page for none, tool bars, previews and zooms of links, routes described by an object, and the navigation
 * that it has replaced by a version of its own. Whatever is reached after all says so.
 */
import { createContext } from 'react';

function leftOut(name: string) {
  return function LeftOut(): never {
    throw new Error(`the router's ${name} is left out of the web client: take it off the stand-ins in metro.config.js`);
  };
}

export const Tabs = leftOut('Tabs');
export const ExperimentalStack = leftOut('ExperimentalStack');
export const Sitemap = leftOut('Sitemap');
export const Unmatched = leftOut('Unmatched');
export const StackToolbar = leftOut('StackToolbar');
export const StackSearchBar = leftOut('StackSearchBar');
export const LinkWithPreview = leftOut('LinkWithPreview');
export const LinkPreview = leftOut('LinkPreview');
export const LinkMenu = leftOut('LinkMenu');
export const LinkMenuAction = leftOut('LinkMenuAction');
export const LinkTrigger = leftOut('LinkTrigger');
export const LinkAppleZoom = leftOut('LinkAppleZoom');
export const LinkAppleZoomTarget = leftOut('LinkAppleZoomTarget');
export const NavigationContainer = leftOut("second NavigationContainer (the router's own is in fork/)");
export const createStaticNavigation = leftOut('createStaticNavigation');
export const getStateFromPath = leftOut("second getStateFromPath (the router's own is in fork/)");
export const getPathFromState = leftOut("second getPathFromState (the router's own is in fork/)");
export const DrawerRouter = leftOut('DrawerRouter');
export const TabRouter = leftOut('TabRouter');

export function getNavOptions(): object {
  return {};
}

/** Tabs are asked of every child of a layout whether it is theirs; without tabs none is. */
export function isNativeTabTrigger(): boolean {
  return false;
}

/** The router's own error page asks how high a tab bar is; there is none. */
export const BottomTabBarHeightContext = createContext<number | undefined>(undefined);

/** Where the router writes what it wants of native screens; there are none. */
export const featureFlags = { experiment: {} };
