import type { RecordDocument } from '../../../shared/api/recordDocument';
import { Facts } from '../../components/Facts';
import { Moment } from '../../components/Moment';
import { useWords } from '../../components/words';

/** Panel, people and times. */
export function RecordFacts({ document }: { document: RecordDocument }) {
  const { t } = useWords();
  const names = (part: 'electrician' | 'foreman') =>
    document.people
      .filter((person) => person.part === part)
      .map((person) => person.name)
      .join(', ');
  const time = (at: string | null) => at && <Moment at={at} form="exact" />;
  return (
    <Facts
      facts={[
        [t('app.site'), document.site.name],
        [t('office.panel'), `${document.panel.tag} ${document.panel.name}`],
        [t('office.panel.location'), document.panel.location],
        [t('office.new.electricians'), names('electrician')],
        [t('office.new.foreman'), names('foreman')],
        [t('office.job.sentAt'), time(document.times.sentAt)],
        [t('records.startedAt'), time(document.times.startedAt)],
        [t('records.signedAt'), time(document.times.signedAt)],
        [t('records.countersignedAt'), time(document.times.countersignedAt)],
        [
          t('records.scope'),
          <span key="scope" className="font-mono">
            {document.scope.join(', ')}
          </span>,
        ],
        [t('office.new.words'), document.job.words],
      ]}
    />
  );
}
