import type { UseQueryResult } from '@tanstack/react-query';
import type { JobPreview } from '../../../../shared/api/jobs';
import { Answered } from '../../../components/Answered';
import { FindingsList } from '../../../components/findings/FindingsList';
import { StillLiveList } from '../../../components/findings/StillLiveList';
import { WaitsList } from '../../../components/findings/WaitsList';
import { SignalBox } from '../../../components/SignalBox';
import { useWords } from '../../../components/words';
import { LockPlanList } from '../LockPlanList';

interface PreviewPaneProps {
  /** Null while no point is chosen. */
  preview: UseQueryResult<JobPreview> | null;
  disconnect: string | null;
}

/** What the chosen points mean: the locks, what stays live, the findings, the size of the checklist. */
export function PreviewPane({ preview, disconnect }: PreviewPaneProps) {
  const { t } = useWords();
  return (
    <aside aria-label={t('office.preview')} className="border border-edge p-4">
      {preview === null ? (
        <p className="m-0 text-muted">{t('office.preview.none')}</p>
      ) : (
        <Answered query={preview}>
          {(data) => (
            <div
              aria-busy={preview.isPlaceholderData}
              className={preview.isPlaceholderData ? 'opacity-60' : ''}
            >
              <Blocked preview={data} />
              <h2 className="m-0 mb-1 text-lg font-bold">{t('office.plan')}</h2>
              {data.plan && <LockPlanList plan={data.plan} />}
              <WaitsList waits={data.waits} />
              <div className="my-4">
                <StillLiveList stillLive={data.stillLive} disconnect={disconnect} />
              </div>
              <p className="my-2">{t('office.preview.steps', { n: data.checklist.steps })}</p>
              <h2 className="m-0 mb-1 text-lg font-bold">{t('office.findings.scope')}</h2>
              <FindingsList answer={data} />
            </div>
          )}
        </Answered>
      )}
    </aside>
  );
}

function Blocked({ preview }: { preview: JobPreview }) {
  const { t } = useWords();
  if (preview.blocked.length === 0) return null;
  return (
    <div className="mb-4">
      <SignalBox signal="danger">
        <p className="m-0 font-bold">{t('office.blocked')}</p>
        <ul className="m-0 list-disc pl-5">
          {preview.blocked.map((each, index) => (
            <li key={index}>{each.says}</li>
          ))}
        </ul>
        <p className="mb-0">{t('office.blocked.next')}</p>
      </SignalBox>
    </div>
  );
}
