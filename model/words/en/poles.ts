export const poles = {} as const;
