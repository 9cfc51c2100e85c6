import { useParams } from 'react-router-dom';
import type { JobView } from '../../../shared/api/jobs';
import { paths } from '../../app/paths';
import { useJob } from '../../api/jobs';
import { Answered } from '../../components/Answered';
import { ButtonLink } from '../../components/ButtonLink';
import { SheetPage } from '../../components/sheet/SheetPage';
import { SheetSection } from '../../components/sheet/SheetSection';
import { Tag } from '../../components/Tag';
import { useWords } from '../../components/words';
import { CancelJob } from './CancelJob';
import { JobDetails } from './JobDetails';
import { LastHeard, LocksOn, Progress, WaitingFor } from './JobCells';
import { JobSteps } from './JobSteps';
import { SendButton } from './SendButton';

/** One job as the server has heard it. */
export function JobPage() {
  const { t } = useWords();
  const { job = '' } = useParams();
  const query = useJob(job);
  return query.data ? (
    <JobSheet job={query.data} asOf={query.dataUpdatedAt} />
  ) : (
    <SheetPage title={t('office.job')}>
      <Answered query={query}>{() => null}</Answered>
    </SheetPage>
  );
}

function Actions({ job }: { job: JobView }) {
  const { t } = useWords();
  return (
    <>
      {job.status === 'planned' && <SendButton job={job} />}
      {job.waiting.length > 0 && (
        <ButtonLink look="primary" to={paths.review(job.id)}>
          {t('office.readIt')}
        </ButtonLink>
      )}
      {job.record !== null && <ButtonLink to={paths.record(job.record)}>{t('office.openRecord')}</ButtonLink>}
      {!['sealed', 'cancelled', 'countersigned'].includes(job.status) && <CancelJob job={job} />}
    </>
  );
}

function JobSheet({ job, asOf }: { job: JobView; asOf: number }) {
  const { t } = useWords();
  return (
    <SheetPage
      title={t('office.job.title', { number: job.number, tag: job.panelTag })}
      asOf={asOf}
      actions={<Actions job={job} />}
      cells={[
        { label: t('office.panel'), value: job.panelTag },
        { label: t('office.panel.revision'), value: job.revision },
        { label: t('office.job'), value: job.number },
      ]}
    >
      <div className="grid items-start gap-x-10 md:grid-cols-2">
        <SheetSection title={t('office.job.now')}>
          <Progress job={job} />
          <WaitingFor job={job} />
          <p className="mb-1 text-sm text-muted">{t('office.locksHeard')}</p>
          <LocksOn job={job} />
          <p className="mb-0">
            {t('office.lastHeard')}: <LastHeard job={job} now={asOf} />
          </p>
          {job.newerRevision && <p className="font-bold">{t('office.job.newer')}</p>}
        </SheetSection>
        <SheetSection title={t('office.job.details')}>
          <JobDetails job={job} />
        </SheetSection>
      </div>
      <SheetSection title={t('office.job.scope', { n: job.scope.length })}>
        <p className="m-0 flex max-h-52 flex-wrap gap-1 overflow-auto" tabIndex={0}>
          {job.scope.map((address) => (
            <Tag key={address}>{address}</Tag>
          ))}
        </p>
      </SheetSection>
      {job.pack !== null && <JobSteps job={job.id} />}
    </SheetPage>
  );
}
