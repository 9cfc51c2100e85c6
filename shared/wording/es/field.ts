import { frame } from './field/frame';
import { person } from './field/person';
import { jobs } from './field/jobs';
import { job } from './field/job';
import { step } from './field/step';
import { live } from './field/live';
import { sign } from './field/sign';

export const field = {
  ...frame,
  ...person,
  ...jobs,
  ...job,
  ...step,
  ...live,
  ...sign,
} as const;
