/** Every sentence a person reads, in Spanish, gathered from one file an area. */
import type { en } from './en';
import { findings } from './es/findings';
import { isolation } from './es/isolation';
import { checklist } from './es/checklist';
import { job } from './es/job';
import { diagram } from './es/diagram';
import { app } from './es/app';
import { field } from './es/field';
import { device } from './es/device';
import { office } from './es/office';
import { records } from './es/records';
import { mail } from './es/mail';
import { problems } from './es/problems';
import { check } from './es/check';

export const es = {
  ...findings,
  ...isolation,
  ...checklist,
  ...job,
  ...diagram,
  ...app,
  ...field,
  ...device,
  ...office,
  ...records,
  ...mail,
  ...problems,
  ...check,
} as const satisfies Record<keyof typeof en, string>;
