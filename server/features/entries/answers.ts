import type { z } from 'zod';
import type { acknowledgement } from '../../../shared/api/jobs';

export type Acknowledged = z.infer<typeof acknowledgement>;
