import { Link } from 'react-router-dom';
import type { JobRow } from '../../../shared/api/jobs';
import { stages } from '../../../shared/checklist/types';
import { paths } from '../../app/paths';
import { Moment } from '../../components/Moment';
import { StageBar } from '../../components/StageBar';
import { Tag } from '../../components/Tag';
import { useWords } from '../../components/words';

export const JobNumber = ({ job }: { job: JobRow }) => (
  <Link to={paths.job(job.id)} className="inline-block py-1.5 font-mono">
    {job.number}
  </Link>
);

export const PanelName = ({ job }: { job: JobRow }) => (
  <>
    <strong className="font-mono">{job.panelTag}</strong> {job.panelName}
    <span className="block text-sm text-muted">{job.electricians.map(({ name }) => name).join(', ')}</span>
  </>
);

/** Every reason why the job waits, a sentence each. */
export function WaitingFor({ job }: { job: JobRow }) {
  const { t } = useWords();
  return (
    <>
      {job.waiting.map((each) => (
        <span key={each.what} className="block">
          {t(`office.waiting.${each.what}`, { n: each.count, points: job.points })}
        </span>
      ))}
    </>
  );
}

/** The name of a stage; a stage this version does not know is shown as it came. */
export function useStageWords(): (stage: string | null) => string {
  const { t } = useWords();
  return (stage) => {
    const known = stages.find((each) => each === stage);
    return known ? t(`office.stage.${known}`) : (stage ?? t('office.stage.none'));
  };
}

export function Progress({ job }: { job: JobRow }) {
  const { t } = useWords();
  const stageWords = useStageWords();
  const words =
    job.stage === null
      ? t(`office.status.${job.status}`)
      : t('office.progress', { stage: stageWords(job.stage), done: job.stageDone, of: job.stageOf });
  return <StageBar done={job.stagesDone} of={stages.length} words={words} />;
}

/** Locks as the server has heard of them: isolator · lock. */
export function LocksOn({ job }: { job: JobRow }) {
  const { t } = useWords();
  if (job.locks.length === 0) return <span className="text-muted">{t('office.locks.noneHeard')}</span>;
  return (
    <span className="flex flex-wrap gap-1">
      {job.locks.map((lock) => (
        <Tag key={`${lock.isolator} ${lock.lock}`}>
          {lock.isolator} · {lock.lock}
        </Tag>
      ))}
    </span>
  );
}

// A phone with signal speaks every few seconds; after ten minutes without a word it counts as out of reach.
const silentMs = 10 * 60_000;

export function LastHeard({ job, now }: { job: JobRow; now: number }) {
  const { t } = useWords();
  if (job.lastHeard === null) return <span className="text-muted">{t('office.heard.never')}</span>;
  const silent = now - Date.parse(job.lastHeard) > silentMs;
  return (
    <>
      <Moment at={job.lastHeard} />
      {silent && `, ${t('office.heard.silent')}`}
    </>
  );
}
