export const checklist = {} as const;
