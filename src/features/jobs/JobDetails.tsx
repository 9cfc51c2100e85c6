import type { JobView } from '../../../shared/api/jobs';
import { Facts } from '../../components/Facts';
import { Moment } from '../../components/Moment';
import { useWords } from '../../components/words';

/** Who, until when, what to lock, what was accepted, and why it was cancelled if it was. */
export function JobDetails({ job }: { job: JobView }) {
  const { t } = useWords();
  return (
    <>
      <Facts
        facts={[
          [t('office.panel'), `${job.panelTag} ${job.panelName}`],
          [t('office.job.status'), t(`office.status.${job.status}`)],
          [t('office.new.electricians'), job.electricians.map((person) => person.name).join(', ')],
          [t('office.new.foreman'), job.foreman.name],
          [t('office.due'), <Moment key="due" at={job.due} form="date" />],
          [t('office.job.sentAt'), job.sentAt && <Moment at={job.sentAt} form="exact" />],
          [
            t('office.toLock'),
            <span key="lock" className="font-mono">
              {job.isolators.join(', ')}
            </span>,
          ],
          [t('office.new.words'), job.words],
        ]}
      />
      {job.acceptances.length > 0 && (
        <>
          <h3 className="mt-4 mb-1 font-bold">{t('office.job.accepted')}</h3>
          <ul className="m-0 list-disc pl-5">
            {job.acceptances.map((each) => (
              <li key={`${each.rule} ${each.place ?? ''}`}>
                <code className="font-mono text-sm">
                  {each.rule} {each.place}
                </code>{' '}
                {t('office.acceptedBy', { name: each.by, reason: each.reason })}
              </li>
            ))}
          </ul>
        </>
      )}
      {job.cancelled && (
        <p>
          {t('office.job.cancelledBy', { name: job.cancelled.by, reason: job.cancelled.words })}{' '}
          <Moment at={job.cancelled.at} form="exact" />
        </p>
      )}
    </>
  );
}
