import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import type { JobPreview, JobRequest } from '../../../../shared/api/jobs';
import { paths } from '../../../app/paths';
import { useCreateJob, useSendJob } from '../../../api/jobs';
import { Button } from '../../../components/Button';
import { acceptanceKey, acceptancesOf } from '../../../components/findings/acceptances';
import { AcceptFindings } from '../../../components/findings/AcceptFindings';
import { byHarm } from '../../../components/findings/byHarm';
import { ProblemMessage } from '../../../components/ProblemMessage';
import { useWords } from '../../../components/words';
import { forgetJobDraft, type JobDraft } from './jobDraft';
import { oneLine } from '../../../components/field/oneLine';

interface SendStepProps {
  draft: JobDraft;
  change: (change: Partial<JobDraft>) => void;
  preview: JobPreview | undefined;
}

const requestOf = (draft: JobDraft, preview: JobPreview): JobRequest | null => {
  if (draft.panel === null || draft.revision === null) return null;
  const { id, panel, revision, points, electricians, foreman, due } = draft;
  const words = oneLine(draft.words);
  const acceptances = acceptancesOf(
    preview.findings.filter((each) => each.needsAcceptance),
    draft.reasons,
  );
  return {
    id,
    panel,
    revision,
    points,
    electricians,
    foreman,
    due,
    acceptances,
    ...(words ? { words } : {}),
  };
};

/** What still has to be accepted, by name with a reason; then plan or send. */
export function SendStep({ draft, change, preview }: SendStepProps) {
  const { t } = useWords();
  const navigate = useNavigate();
  const create = useCreateJob();
  const send = useSendJob();
  const [tried, setTried] = useState(false);
  const toAccept = byHarm(preview?.findings ?? []).filter((each) => each.needsAcceptance);
  const complete = toAccept.every((each) => oneLine(draft.reasons[acceptanceKey(each)] ?? ''));
  const make = async (andSend: boolean) => {
    setTried(true);
    const body = preview && complete ? requestOf(draft, preview) : null;
    if (!body) return;
    await create.mutateAsync(body);
    if (andSend) await send.mutateAsync(body.id);
    forgetJobDraft();
    await navigate(paths.jobs, { state: { made: andSend ? 'sent' : 'planned' } });
  };
  // The mutations hold their own errors, which are shown below; the promise has nothing to add.
  const start = (andSend: boolean) => void make(andSend).catch(() => undefined);
  const busy = create.isPending || send.isPending;
  const blocked = !preview || preview.blocked.length > 0 || draft.electricians.includes(draft.foreman);
  return (
    <div>
      <h2 className="m-0 text-lg font-bold">{t('office.new.send.ask')}</h2>
      {toAccept.length > 0 ? (
        <>
          <p>{t('office.new.accept')}</p>
          <AcceptFindings
            findings={toAccept}
            reasons={draft.reasons}
            onReason={(key, reason) => change({ reasons: { ...draft.reasons, [key]: reason } })}
            tried={tried}
          />
        </>
      ) : (
        <p>{t('office.new.nothingToAccept')}</p>
      )}
      <ProblemMessage error={create.error} kept={t('office.new.kept')} />
      <ProblemMessage error={send.error} kept={t('office.new.planned')} />
      <div className="mt-4 flex flex-wrap gap-3">
        <Button look="primary" busy={busy} disabled={blocked} onClick={() => start(true)}>
          {t('office.send')}
        </Button>
        <Button busy={busy} disabled={blocked} onClick={() => start(false)}>
          {t('office.new.planOnly')}
        </Button>
      </div>
    </div>
  );
}
