/** The messages of the screens that work without a network; those of a job's steps and findings travel in its pack. */
import { app } from './app';
import { device } from './device';
import { diagram } from './diagram';
import { field } from './field';
import { isolation } from './isolation';
import { job } from './job';

export const phone = { ...app, ...device, ...diagram, ...field, ...isolation, ...job } as const;
