/** A log is one key's entries on one job: its id follows from both, so nobody can claim another's log. */
import { v5 } from 'uuid';

export const logId = (job: string, key: string): string => v5(job, key);
