import type { RecordView } from '../../../shared/api/recordDocument';
import { Facts } from '../../components/Facts';
import { Moment } from '../../components/Moment';
import { useWords } from '../../components/words';

const Hash = ({ children }: { children: string }) => (
  <code className="font-mono text-sm break-all">{children}</code>
);

/** The record's place in the site's chain. */
export function SealFacts({ record }: { record: RecordView }) {
  const { t } = useWords();
  return (
    <Facts
      facts={[
        [t('records.sealedAt'), <Moment key="at" at={record.sealedAt} form="exact" />],
        [t('office.digest'), <Hash key="digest">{record.digest}</Hash>],
        [t('records.previousSeal'), record.previousSeal && <Hash>{record.previousSeal}</Hash>],
        [t('records.seal'), <Hash key="seal">{record.seal}</Hash>],
      ]}
    />
  );
}
