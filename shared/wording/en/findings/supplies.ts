export const supplies = {} as const;
