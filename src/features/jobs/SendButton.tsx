import type { JobRow } from '../../../shared/api/jobs';
import { useSendJob } from '../../api/jobs';
import { Button } from '../../components/Button';
import { ProblemMessage } from '../../components/ProblemMessage';
import { useWords } from '../../components/words';

/** Gives a planned job to its people. */
export function SendButton({ job }: { job: Pick<JobRow, 'id'> }) {
  const { t } = useWords();
  const send = useSendJob();
  return (
    <>
      <Button busy={send.isPending} onClick={() => send.mutate(job.id)}>
        {t('office.send')}
      </Button>
      <ProblemMessage error={send.error} kept={t('office.send.kept')} />
    </>
  );
}
