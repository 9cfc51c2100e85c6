import type { Role } from '../../shared/api/common';
import { paths } from './paths';

// The first role that fits decides: who works in the basement comes before who sits at a desk.
const landings: readonly (readonly [Role, string])[] = [
  ['electrician', paths.myJobs],
  ['foreman', paths.jobs],
  ['panel-engineer', paths.panels],
  ['safety-officer', paths.records],
  ['administrator', paths.people],
];

/** Where a person's work is. Somebody without any role can still verify a record. */
export const landing = (held: readonly Role[]): string =>
  landings.find(([role]) => held.includes(role))?.[1] ?? paths.verify;
