export const isolation = {} as const;
