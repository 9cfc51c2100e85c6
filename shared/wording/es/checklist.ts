import { beforePower } from './checklist/beforePower';
import { choices } from './checklist/choices';
import { livePanel } from './checklist/livePanel';
import { warningsAndLimits } from './checklist/warningsAndLimits';
import { wiring } from './checklist/wiring';

export const checklist = {
  ...beforePower,
  ...wiring,
  ...livePanel,
  ...warningsAndLimits,
  ...choices,
} as const;
