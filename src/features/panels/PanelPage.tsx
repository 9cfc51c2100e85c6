import { useState } from 'react';
import { useParams } from 'react-router-dom';
import type { PanelView } from '../../../shared/api/panels';
import { useDraftFindings, usePanel } from '../../api/panels';
import { holds, useSession } from '../../api/session';
import { Answered } from '../../components/Answered';
import { Button } from '../../components/Button';
import { FindingsList } from '../../components/findings/FindingsList';
import { SheetPage } from '../../components/sheet/SheetPage';
import { SheetSection } from '../../components/sheet/SheetSection';
import { useWords } from '../../components/words';
import { DraftUpload } from './DraftUpload';
import { IsolationSection } from './IsolationSection';
import { IssueDialog } from './IssueDialog';
import { PointsTable } from './PointsTable';
import { RevisionsTable } from './RevisionsTable';

/** A panel's draft: its findings with their sums, what stays live, its points, and its issued revisions. */
export function PanelPage() {
  const { t } = useWords();
  const { panel = '' } = useParams();
  const query = usePanel(panel);
  return query.data ? (
    <PanelSheet panel={query.data} asOf={query.dataUpdatedAt} />
  ) : (
    <SheetPage title={t('office.panel')}>
      <Answered query={query}>{() => null}</Answered>
    </SheetPage>
  );
}

function PanelSheet({ panel, asOf }: { panel: PanelView; asOf: number }) {
  const { t, language } = useWords();
  const session = useSession();
  const findings = useDraftFindings(panel.id, panel.draft.version, language);
  const [issuing, setIssuing] = useState(false);
  const [issued, setIssued] = useState<number>();
  const draft = panel.draft.panel;
  const mayEdit = session.data ? holds(session.data, 'panel-engineer', panel.site) : false;
  return (
    <SheetPage
      title={`${draft.tag} ${draft.name}`}
      asOf={asOf}
      actions={
        mayEdit && (
          <Button look="primary" onClick={() => setIssuing(true)} disabled={!findings.data}>
            {t('office.issue')}
          </Button>
        )
      }
      cells={[
        { label: t('office.panel'), value: draft.tag },
        { label: t('office.panel.drawing'), value: `${draft.drawing.number} ${draft.drawing.revision}` },
        { label: t('office.panel.draft'), value: panel.draft.version },
        { label: t('office.panel.revision'), value: panel.revision ?? t('office.panel.neverIssued') },
      ]}
    >
      {issued !== undefined && (
        <p role="status" className="mt-0 border-l-8 border-ink bg-paper px-3 py-2 font-bold">
          {t('office.issue.done', { n: issued })}
        </p>
      )}
      <p className="m-0 mb-6 text-muted">
        {draft.location} · {draft.practice} · {draft.frequencyHz} Hz
      </p>
      <SheetSection title={t('office.findings')} note={t('office.findings.note')}>
        <Answered query={findings}>{(data) => <FindingsList answer={data} />}</Answered>
      </SheetSection>
      <IsolationSection panel={draft} version={`${panel.id} ${panel.draft.version}`} />
      <SheetSection title={t('office.points')}>
        <PointsTable panel={draft} findings={findings.data?.findings} />
      </SheetSection>
      <SheetSection title={t('office.revisions')} note={t('office.revisions.note')}>
        <RevisionsTable panel={panel.id} revisions={panel.revisions} />
      </SheetSection>
      {mayEdit && <DraftUpload panel={panel} />}
      {findings.data && issuing && (
        <IssueDialog
          panel={panel}
          findings={findings.data}
          onClose={() => setIssuing(false)}
          onIssued={(number) => {
            setIssuing(false);
            setIssued(number);
          }}
        />
      )}
    </SheetPage>
  );
}
