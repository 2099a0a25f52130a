export const plan = {} as const;
