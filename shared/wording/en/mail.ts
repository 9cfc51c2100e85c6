export const mail = {} as const;
