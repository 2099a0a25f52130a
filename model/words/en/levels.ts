export const levels = {} as const;
