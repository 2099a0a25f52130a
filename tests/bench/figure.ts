/** One measured figure, and the most it may be where there is a limit. */
export interface Figure {
  readonly name: string;
  readonly value: number;
  readonly unit: string;
  readonly most: number | null;
}
