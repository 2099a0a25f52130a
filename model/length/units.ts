/** What lengths are shown and typed in: feet and inches, or millimetres and metres. */
export type LengthUnits = 'imperial' | 'metric';
