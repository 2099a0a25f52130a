/** Turns a dictionary key and its figures into words; given by whoever prints them, so that the model knows no language. */
export type Say = (key: string, params?: Readonly<Record<string, string | number>>) => string;
