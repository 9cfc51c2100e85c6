/** The time zone of this device, by name, as a signature states it. */
export const zone = (): string => Intl.DateTimeFormat().resolvedOptions().timeZone || 'UTC';
