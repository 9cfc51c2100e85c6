export const findings = {} as const;
