export const takeoff = {} as const;
