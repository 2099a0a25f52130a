export const crew = {} as const;
