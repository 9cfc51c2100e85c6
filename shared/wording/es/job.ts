export const job = {} as const;
