/** A reference to anything in a drawing or its set-out that can be shown, selected or complained about. */
export type ThingKind =
  | 'corner'
  | 'run'
  | 'opening'
  | 'keepClear'
  | 'boundary'
  | 'controlHeight'
  | 'bondBeam'
  | 'pole'
  | 'brace'
  | 'station'
  | 'lift'
  | 'course'
  | 'wallType'
  | 'site';

export interface ThingRef {
  readonly kind: ThingKind;
  readonly id: string;
}
