import { useParams } from 'react-router-dom';
import type { RecordView } from '../../../shared/api/recordDocument';
import { useRecord } from '../../api/records';
import { Answered } from '../../components/Answered';
import { buttonClass } from '../../components/buttonClass';
import { SheetPage } from '../../components/sheet/SheetPage';
import { SheetSection } from '../../components/sheet/SheetSection';
import { useWords } from '../../components/words';
import { DeadTestTable } from './DeadTestTable';
import { ExceptionsSection } from './ExceptionsSection';
import { LockOutTable } from './LockOutTable';
import { PointAnswers } from './PointAnswers';
import { RecordFacts } from './RecordFacts';
import { SealFacts } from './SealFacts';
import { SignaturesList } from './SignaturesList';

/** One sealed record, as it was sealed. */
export function RecordPage() {
  const { t } = useWords();
  const { record = '' } = useParams();
  const query = useRecord(record);
  return query.data ? (
    <RecordSheet record={query.data} asOf={query.dataUpdatedAt} />
  ) : (
    <SheetPage title={t('office.record')}>
      <Answered query={query}>{() => null}</Answered>
    </SheetPage>
  );
}

function Downloads({ record }: { record: string }) {
  const { t } = useWords();
  return (
    <>
      <a className={buttonClass('primary')} href={`/api/records/${record}.pdf`} download>
        {t('records.pdf')}
      </a>
      <a className={buttonClass('outlined')} href={`/api/records/${record}.json`} download>
        {t('records.json')}
      </a>
    </>
  );
}

function RecordSheet({ record, asOf }: { record: RecordView; asOf: number }) {
  const { t } = useWords();
  const { document } = record;
  return (
    <SheetPage
      title={t('records.title', { number: record.number, tag: record.panelTag })}
      asOf={asOf}
      actions={<Downloads record={record.id} />}
      cells={[
        { label: t('office.panel'), value: document.panel.tag },
        {
          label: t('office.panel.drawing'),
          value: `${document.panel.drawing.number} ${document.panel.drawing.revision}`,
        },
        { label: t('office.panel.revision'), value: document.panel.revision },
        { label: t('office.job'), value: document.job.number },
        { label: t('office.record'), value: record.number },
      ]}
    >
      {record.amendedBy.length > 0 && (
        <p className="font-bold">{t('records.amendedBy', { numbers: record.amendedBy.join(', ') })}</p>
      )}
      <div className="grid items-start gap-x-10 md:grid-cols-2">
        <SheetSection title={t('records.what')}>
          <RecordFacts document={document} />
        </SheetSection>
        <SheetSection title={t('records.signatures')}>
          <SignaturesList signatures={document.signatures} />
        </SheetSection>
      </div>
      <ExceptionsSection document={document} />
      <SheetSection title={t('records.lockOut')}>
        <LockOutTable locks={document.lockOut} />
      </SheetSection>
      <SheetSection title={t('records.deadTests')}>
        <DeadTestTable tests={document.deadTests} />
      </SheetSection>
      <SheetSection title={t('office.points')}>
        <PointAnswers document={document} />
      </SheetSection>
      <SheetSection title={t('records.seal')}>
        <SealFacts record={record} />
      </SheetSection>
    </SheetPage>
  );
}
