export const walls = {} as const;
