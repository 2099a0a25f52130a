/**
 * Stands in, in what is built, for parts of React Native that the router would bring along by asking for the whole of it. A screen
 * of ours that uses one of them asks for that one alone, and gets the real one.
 */
export default class LeftOutPart {
  constructor() {
    throw new Error(
      'this part of React Native is left out for the router: take it off the stand-ins in metro.config.js',
    );
  }
}
