/**
 * Stands in, on the web, for what reanimated's views bring along and none of ours uses: entering, leaving and changing
 * places, shared transitions, animations written as styles, and animated kinds of views besides the plain one.
 */
function leftOut(name: string) {
  return function LeftOut(): never {
    throw new Error(`${name} is left out of the web client: take it off the stand-ins in metro.config.js`);
  };
}

export const ReanimatedFlatList = leftOut('an animated list');
export const AnimatedImage = leftOut('an animated image');
export const AnimatedScrollView = leftOut('an animated scroll view');
export const AnimatedText = leftOut('an animated text');

export const SharedTransition = leftOut('a shared transition');
export const startWebLayoutAnimation = leftOut('an animation of entering or leaving');
export const tryActivateLayoutTransition = leftOut('an animation of changing places');
export const addHTMLMutationObserver = leftOut('an animation of leaving');
export const saveSnapshot = leftOut('an animation of leaving');
export const getReducedMotionFromConfig = leftOut('an animation of entering, leaving or changing places');

/** Would write the style sheet of those animations. */
export function configureWebLayoutAnimations(): void {}

/** Would register how animations written as styles move shapes of SVG. */
export function initSvgCssSupport(): void {}

const ANIMATED_BY_STYLE = /^(?:animation|transition)/;

/** Every animated view tells this its style. */
export class CSSManager {
  update(style: object): void {
    if (Object.keys(style).some((key) => ANIMATED_BY_STYLE.test(key))) leftOut('an animation written as a style')();
  }
  unmountCleanup(): void {}
}
