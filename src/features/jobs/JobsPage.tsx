import { useLocation } from 'react-router-dom';
import type { JobRow } from '../../../shared/api/jobs';
import { paths } from '../../app/paths';
import { useCurrentSite } from '../../api/currentSite';
import { useJobs } from '../../api/jobs';
import { Answered } from '../../components/Answered';
import { ButtonLink } from '../../components/ButtonLink';
import { EmptyState } from '../../components/EmptyState';
import { MoreButton } from '../../components/MoreButton';
import { SheetPage } from '../../components/sheet/SheetPage';
import { SheetSection } from '../../components/sheet/SheetSection';
import { Table, type Column } from '../../components/Table';
import { useWords } from '../../components/words';
import { doneColumns, plannedColumns, runningColumns, waitingColumns } from './jobColumns';
import { jobSections } from './jobSections';

interface SectionProps {
  title: string;
  jobs: readonly JobRow[];
  columns: Column<JobRow>[];
  empty?: string;
}

function Section({ title, jobs, columns, empty }: SectionProps) {
  if (jobs.length === 0 && empty === undefined) return null;
  return (
    <SheetSection title={title}>
      {jobs.length === 0 ? (
        <p className="m-0 text-muted">{empty}</p>
      ) : (
        <Table caption={title} columns={columns} rows={jobs} keyOf={(job) => job.id} />
      )}
    </SheetSection>
  );
}

function Board({ jobs, asOf }: { jobs: readonly JobRow[]; asOf: number }) {
  const { t } = useWords();
  const sections = jobSections(jobs);
  const pointsOf = (job: JobRow) => t('office.pointsOf', { n: job.points, of: job.of });
  if (jobs.length === 0)
    return (
      <EmptyState
        title={t('office.jobs.empty')}
        action={
          <ButtonLink look="primary" to={paths.newJob}>
            {t('office.jobs.new')}
          </ButtonLink>
        }
      >
        {t('office.jobs.empty.first')}
      </EmptyState>
    );
  return (
    <>
      <Section
        title={t('office.jobs.waiting')}
        jobs={sections.waiting}
        columns={waitingColumns(t)}
        empty={t('office.jobs.waiting.none')}
      />
      <Section title={t('office.jobs.running')} jobs={sections.running} columns={runningColumns(t, asOf)} />
      <Section
        title={t('office.jobs.planned')}
        jobs={sections.planned}
        columns={plannedColumns(t, pointsOf)}
      />
      <Section title={t('office.jobs.done')} jobs={sections.done} columns={doneColumns(t)} />
    </>
  );
}

/** The foreman's sheet: what waits for them, what runs, what is planned, what is done. Read again every 5 seconds. */
export function JobsPage() {
  const { t } = useWords();
  const { site } = useCurrentSite();
  const jobs = useJobs(site?.id);
  const { state } = useLocation() as { state: { made?: 'sent' | 'planned' } | null };
  return (
    <SheetPage
      title={t('app.tab.jobs')}
      titleHidden
      asOf={jobs.dataUpdatedAt}
      cells={[
        { label: t('app.sheet'), value: t('app.tab.jobs') },
        { label: t('app.site'), value: site?.name },
      ]}
      actions={
        <ButtonLink look="outlined" to={paths.newJob}>
          {t('office.jobs.new')}
        </ButtonLink>
      }
    >
      {state?.made && (
        <p role="status" className="mt-0 border-l-8 border-ink bg-paper px-3 py-2 font-bold">
          {t(`office.new.done.${state.made}`)}
        </p>
      )}
      <Answered query={jobs}>
        {(data) => <Board jobs={data.pages.flatMap((page) => page.items)} asOf={jobs.dataUpdatedAt} />}
      </Answered>
      <MoreButton query={jobs} />
    </SheetPage>
  );
}
