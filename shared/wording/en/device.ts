export const device = {} as const;
