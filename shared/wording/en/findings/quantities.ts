export const quantities = {} as const;
