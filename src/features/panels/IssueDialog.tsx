import { useState } from 'react';
import type { FindingsAnswer, PanelView } from '../../../shared/api/panels';
import { useIssueRevision } from '../../api/panels';
import { Button } from '../../components/Button';
import { Dialog } from '../../components/Dialog';
import {
  acceptanceKey,
  acceptancesOf,
  mayBeAccepted,
  type Reasons,
} from '../../components/findings/acceptances';
import { AcceptFindings } from '../../components/findings/AcceptFindings';
import { byHarm } from '../../components/findings/byHarm';
import { ProblemMessage } from '../../components/ProblemMessage';
import { useWords } from '../../components/words';
import { IssueBlocked } from './IssueBlocked';
import { oneLine } from '../../components/field/oneLine';

interface IssueDialogProps {
  panel: PanelView;
  findings: FindingsAnswer;
  onClose: () => void;
  onIssued: (revision: number) => void;
}

/** Issues the draft as a revision nobody can change: what may stand is accepted here, by name, with a reason. */
export function IssueDialog({ panel, findings, onClose, onIssued }: IssueDialogProps) {
  const { t } = useWords();
  const issue = useIssueRevision(panel.id);
  const [reasons, setReasons] = useState<Reasons>({});
  const [tried, setTried] = useState(false);
  const toAccept = byHarm(findings.findings).filter((each) => mayBeAccepted(each) && each.accepted === null);
  const complete = toAccept.every((each) => oneLine(reasons[acceptanceKey(each)] ?? ''));
  const blocked = findings.problems.length > 0;
  const send = () => {
    setTried(true);
    if (!complete) return;
    const acceptances = acceptancesOf(toAccept, reasons);
    issue.mutate(
      { version: panel.draft.version, acceptances },
      { onSuccess: ({ number }) => onIssued(number) },
    );
  };
  return (
    <Dialog
      open
      title={t('office.issue.title', { n: (panel.revision ?? 0) + 1 })}
      onClose={onClose}
      closeWords={t('app.cancel')}
      actions={
        <Button look="primary" onClick={send} busy={issue.isPending} disabled={blocked}>
          {t('office.issue')}
        </Button>
      }
    >
      <p className="mt-0">{t('office.issue.note')}</p>
      <IssueBlocked problems={findings.problems} findings={findings.findings} />
      {toAccept.length > 0 && !blocked && (
        <>
          <h3 className="mt-5 mb-1 text-lg font-bold">{t('office.accept.title')}</h3>
          <AcceptFindings
            findings={toAccept}
            reasons={reasons}
            onReason={(key, reason) => setReasons({ ...reasons, [key]: reason })}
            tried={tried}
          />
        </>
      )}
      <ProblemMessage error={issue.error} kept={t('office.issue.kept')} />
    </Dialog>
  );
}
