/** The messages that only the desk's pages show. */
import { checklist } from './checklist';
import { findings } from './findings';
import { office } from './office';
import { problems } from './problems';
import { records } from './records';

export const desk = { ...checklist, ...findings, ...office, ...problems, ...records } as const;
