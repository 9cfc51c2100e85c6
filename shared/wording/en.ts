/** Every sentence a person reads, in English, gathered from one file an area. */
import { findings } from './en/findings';
import { isolation } from './en/isolation';
import { checklist } from './en/checklist';
import { job } from './en/job';
import { diagram } from './en/diagram';
import { app } from './en/app';
import { field } from './en/field';
import { device } from './en/device';
import { office } from './en/office';
import { records } from './en/records';
import { mail } from './en/mail';
import { problems } from './en/problems';
import { check } from './en/check';

export const en = {
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
} as const;
