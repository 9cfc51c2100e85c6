import type { LocalJob } from '../../../offline/types';
import { StopButton } from '../more/StopButton';

/** *Stop work* outside a job: the numbers of the site this phone has work on; nothing to show without one. */
export function SiteStop({ jobs }: { jobs: LocalJob[] }) {
  const pack = jobs[0]?.pack;
  return pack ? <StopButton pack={pack} /> : null;
}
