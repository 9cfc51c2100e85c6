import { useState } from 'react';
import type { JobView } from '../../../shared/api/jobs';
import { useCancelJob } from '../../api/jobs';
import { Button } from '../../components/Button';
import { Dialog } from '../../components/Dialog';
import { WordsField } from '../../components/form/WordsField';
import { ProblemMessage } from '../../components/ProblemMessage';
import { useWords } from '../../components/words';
import { oneLine } from '../../components/field/oneLine';

/** Ends a job without a record, with the reason; never while a lock is known on. */
export function CancelJob({ job }: { job: JobView }) {
  const { t } = useWords();
  const cancel = useCancelJob(job.id);
  const [open, setOpen] = useState(false);
  const [words, setWords] = useState('');
  const [tried, setTried] = useState(false);
  const locked = job.locks.length > 0;
  const said = oneLine(words);
  const send = () => {
    setTried(true);
    if (said) cancel.mutate(said, { onSuccess: () => setOpen(false) });
  };
  return (
    <>
      <Button onClick={() => setOpen(true)}>{t('office.job.cancel')}</Button>
      <Dialog
        open={open}
        title={t('office.job.cancel.title', { number: job.number })}
        onClose={() => setOpen(false)}
        closeWords={t('app.cancel')}
        actions={
          <Button look="primary" onClick={send} busy={cancel.isPending} disabled={locked}>
            {t('office.job.cancel')}
          </Button>
        }
      >
        <p className="mt-0">{locked ? t('office.job.cancel.locked') : t('office.job.cancel.note')}</p>
        <WordsField
          label={t('office.job.cancel.reason')}
          maxLength={500}
          value={words}
          onChange={(event) => setWords(event.target.value)}
          error={tried && !said ? t('app.required') : undefined}
        />
        <ProblemMessage error={cancel.error} />
      </Dialog>
    </>
  );
}
