import type { Role } from '../../../shared/api/common';

/** Who plans, sends and cancels jobs. */
export const jobMakers: Role[] = ['foreman'];
/** Who sees every job of their sites; an electrician sees those they are on. */
export const jobReaders: Role[] = ['foreman', 'safety-officer', 'panel-engineer', 'administrator'];
