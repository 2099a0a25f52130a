export const revisions = {} as const;
