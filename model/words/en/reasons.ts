export const reasons = {} as const;
