export const sites = {} as const;
