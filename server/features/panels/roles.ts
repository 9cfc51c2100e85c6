import type { Role } from '../../../shared/api/common';

/** Electricians get a panel with the pack of their job. */
export const panelReaders: Role[] = ['panel-engineer', 'foreman', 'safety-officer', 'administrator'];
export const panelEditors: Role[] = ['panel-engineer'];
