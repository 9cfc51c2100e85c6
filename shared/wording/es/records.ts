export const records = {} as const;
