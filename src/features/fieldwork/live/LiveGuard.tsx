import type { ReactNode } from 'react';
import { Navigate, useLocation } from 'react-router-dom';
import { paths } from '../../../app/paths';
import { useLocalJobs } from '../../../offline/useDevice';
import { liveReading } from './liveReading';

// A job that is over is measured no more: its red screen would have no way out.
const over: ReadonlySet<string> = new Set(['sealed', 'cancelled']);

/** A reload, the back button or another address all lead back to the red screen while the reading stands. */
export function LiveGuard({ person, children }: { person: string; children: ReactNode }) {
  const jobs = useLocalJobs(person);
  const { pathname } = useLocation();
  if (!jobs) return null;
  for (const { pack, entries, facts, status } of jobs) {
    if (over.has(status)) continue;
    const live = liveReading(pack.checklist, entries, facts, person);
    if (!live) continue;
    const path = paths.live(pack.job.id, live.step.id);
    return pathname === path ? children : <Navigate to={path} replace />;
  }
  return children;
}
