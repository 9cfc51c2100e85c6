export const field = {} as const;
