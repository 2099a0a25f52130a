/** Lengths in ticks: 1/640 mm, whole numbers. The inch is exactly 25.4 mm (NIST SP 811, B.8), so 1/128 in is 127 ticks. */

declare const ticksBrand: unique symbol;

/** A length or coordinate in ticks (1/640 mm); always a whole number. */
export type Ticks = number & { readonly [ticksBrand]: 'ticks' };

export const TICKS_PER_MM = 640;
export const TICKS_PER_INCH = 16_256;
export const TICKS_PER_FOOT = 12 * TICKS_PER_INCH;

/** Marks a number already known to be whole as ticks; it does not round. */
export function ticks(whole: number): Ticks {
  return whole as Ticks;
}

/** The one rounding from floating point back to ticks: half away from zero, never −0. */
export function roundTicks(value: number): Ticks {
  return (Math.sign(value) * Math.floor(Math.abs(value) + 0.5) + 0) as Ticks;
}

/** Millimetres to ticks, rounded once. */
export function mm(millimetres: number): Ticks {
  return roundTicks(millimetres * TICKS_PER_MM);
}

/** Inches to ticks, rounded once. */
export function inches(value: number): Ticks {
  return roundTicks(value * TICKS_PER_INCH);
}

/** Feet and inches to ticks, rounded once. */
export function feet(whole: number, inch = 0): Ticks {
  return roundTicks(whole * TICKS_PER_FOOT + inch * TICKS_PER_INCH);
}

/** The multiple of `step` nearest to `value`, half away from zero; `step` above zero. */
export function roundToStep(value: number, step: Ticks): Ticks {
  return (roundTicks(value / step) * step) as Ticks;
}
