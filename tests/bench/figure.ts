/** One measured figure, and the most or the least it may be where there is a limit. */
export interface Figure {
  readonly name: string;
  readonly value: number;
  readonly unit: string;
  readonly most: number | null;
  readonly least?: number;
}

export function isMissed({ value, most, least }: Figure): boolean {
  return (most !== null && value > most) || (least !== undefined && value < least);
}
