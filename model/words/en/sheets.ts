export const sheets = {} as const;
