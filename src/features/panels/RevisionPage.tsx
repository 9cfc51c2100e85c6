import { useParams } from 'react-router-dom';
import type { RevisionView } from '../../../shared/api/panels';
import { useRevision, useRevisionFindings } from '../../api/panels';
import { Answered } from '../../components/Answered';
import { FindingsList } from '../../components/findings/FindingsList';
import { Moment } from '../../components/Moment';
import { SheetPage } from '../../components/sheet/SheetPage';
import { SheetSection } from '../../components/sheet/SheetSection';
import { useWords } from '../../components/words';
import { IsolationSection } from './IsolationSection';
import { PointsTable } from './PointsTable';

/** An issued revision as it will always be. */
export function RevisionPage() {
  const { t } = useWords();
  const { panel = '', revision = '' } = useParams();
  const query = useRevision(panel, Number(revision));
  return query.data ? (
    <RevisionSheet panel={panel} revision={query.data} />
  ) : (
    <SheetPage title={t('office.panel.revision')}>
      <Answered query={query}>{() => null}</Answered>
    </SheetPage>
  );
}

function RevisionSheet({ panel, revision }: { panel: string; revision: RevisionView }) {
  const { t, language } = useWords();
  const findings = useRevisionFindings(panel, revision.number, language);
  const issued = revision.panel;
  return (
    <SheetPage
      title={t('office.revision.title', { tag: issued.tag, n: revision.number })}
      cells={[
        { label: t('office.panel'), value: issued.tag },
        { label: t('office.panel.drawing'), value: `${issued.drawing.number} ${issued.drawing.revision}` },
        { label: t('office.panel.revision'), value: revision.number },
      ]}
    >
      <p>
        {t('office.revision.by', { name: revision.issuedBy })} <Moment at={revision.issuedAt} form="exact" />
      </p>
      <p className="text-sm">
        {t('office.digest')} <code className="font-mono break-all">{revision.digest}</code>
      </p>
      <SheetSection title={t('office.findings')}>
        <Answered query={findings}>{(data) => <FindingsList answer={data} />}</Answered>
      </SheetSection>
      <IsolationSection panel={issued} version={revision.digest} />
      <SheetSection title={t('office.points')}>
        <PointsTable panel={issued} findings={findings.data?.findings} />
      </SheetSection>
    </SheetPage>
  );
}
