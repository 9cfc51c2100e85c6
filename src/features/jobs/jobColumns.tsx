import { Link } from 'react-router-dom';
import type { JobRow } from '../../../shared/api/jobs';
import { paths } from '../../app/paths';
import { ButtonLink } from '../../components/ButtonLink';
import { Moment } from '../../components/Moment';
import type { Column } from '../../components/Table';
import type { WordingKey } from '../../../shared/wording/render';
import { JobNumber, LastHeard, LocksOn, PanelName, Progress, WaitingFor } from './JobCells';
import { SendButton } from './SendButton';

type T = (key: WordingKey) => string;

const lead = (t: T): Column<JobRow>[] => [
  { head: t('office.job'), className: 'md:w-[9%]', cell: (job) => <JobNumber job={job} /> },
  { head: t('office.panel'), className: 'md:w-[19%] lg:w-[23%]', cell: (job) => <PanelName job={job} /> },
];
const last = (t: T, cell: Column<JobRow>['cell']): Column<JobRow> => ({
  head: t('office.act'),
  headHidden: true,
  className: 'md:w-[17%] lg:w-[13%]',
  cell,
});
const oldest = (job: JobRow): string => job.waiting.map((each) => each.since).sort()[0] ?? '';

/** Deciding and countersigning are signed acts: they happen on the field screen, with the foreman's own key. */
export const waitingColumns = (t: T): Column<JobRow>[] => [
  ...lead(t),
  {
    head: t('office.needs'),
    cell: (job) => (
      <>
        <WaitingFor job={job} />
        {job.locks.length > 0 && <LocksOn job={job} />}
      </>
    ),
  },
  { head: t('office.since'), className: 'md:w-[15%]', cell: (job) => <Moment at={oldest(job)} /> },
  last(t, (job) => {
    const sign = job.waiting.some((each) => each.what === 'countersign');
    const late = job.waiting.every((each) => each.what === 'late');
    return (
      <ButtonLink look={sign ? 'primary' : 'outlined'} to={late ? paths.job(job.id) : paths.review(job.id)}>
        {t(sign ? 'office.readIt' : late ? 'office.open' : 'office.decide')}
      </ButtonLink>
    );
  }),
];

export const runningColumns = (t: T, now: number): Column<JobRow>[] => [
  ...lead(t),
  { head: t('office.stage'), className: 'md:w-[22%] lg:w-[18%]', cell: (job) => <Progress job={job} /> },
  { head: t('office.locksOn'), cell: (job) => <LocksOn job={job} /> },
  { head: t('office.lastHeard'), className: 'md:w-[15%]', cell: (job) => <LastHeard job={job} now={now} /> },
  last(t, (job) => <ButtonLink to={paths.job(job.id)}>{t('office.open')}</ButtonLink>),
];

export const plannedColumns = (t: T, pointsOf: (job: JobRow) => string): Column<JobRow>[] => [
  ...lead(t),
  { head: t('office.points'), className: 'md:w-[18%]', cell: pointsOf },
  {
    head: t('office.toLock'),
    cell: (job) => <span className="font-mono">{job.isolators.join(', ')}</span>,
  },
  { head: t('office.due'), className: 'md:w-[15%]', cell: (job) => <Moment at={job.due} form="date" /> },
  last(t, (job) => <SendButton job={job} />),
];

export const doneColumns = (t: T): Column<JobRow>[] => [
  ...lead(t),
  { head: t('office.howItEnded'), cell: (job) => t(`office.status.${job.status}`) },
  {
    head: t('office.record'),
    className: 'md:w-[15%]',
    cell: (job) =>
      job.record === null ? '' : <Link to={paths.record(job.record)}>{t('office.openRecord')}</Link>,
  },
  last(t, (job) => <ButtonLink to={paths.job(job.id)}>{t('office.open')}</ButtonLink>),
];
