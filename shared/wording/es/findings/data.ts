export const data = {} as const;
