export const inputs = {} as const;
