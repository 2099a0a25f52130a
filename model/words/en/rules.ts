export const rules = {} as const;
