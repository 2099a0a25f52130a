/**
 * Stands in, on the web, for what gesture handler brings along and the drawing does not use: worklets, its older web
 * implementation, and every gesture besides the manual one, which the drawing's own hand is built on.
 */
export default class LeftOutGesture {
  constructor() {
    throw new Error('this gesture is left out of the web client: take it off the stand-ins in metro.config.js');
  }
}
