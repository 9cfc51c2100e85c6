export const diagram = {} as const;
