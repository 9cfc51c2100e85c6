import { useState, type SubmitEvent } from 'react';
import { useSearchParams } from 'react-router-dom';
import { useVerify } from '../../api/records';
import { Button } from '../../components/Button';
import { FileDrop } from '../../components/FileDrop';
import { TextField } from '../../components/form/TextField';
import { ProblemMessage } from '../../components/ProblemMessage';
import { SheetPage } from '../../components/sheet/SheetPage';
import { useWords } from '../../components/words';
import { digestInFile } from './digestInFile';
import { VerifyResult } from './VerifyResult';

// Only whole digests are looked up: a part of one would let a stranger search.
const fullDigest = /^[0-9a-f]{64}$/;

/** Does a site's chain hold this record, unchanged? Works for everybody; shows no more than panel and date. */
export function VerifyPage() {
  const { t } = useWords();
  const [search] = useSearchParams();
  const [typed, setTyped] = useState(search.get('digest') ?? '');
  const [wrong, setWrong] = useState<'records.verify.notDigest' | 'records.verify.notRecord'>();
  const verify = useVerify();
  const byDigest = (event: SubmitEvent) => {
    event.preventDefault();
    const digest = typed.replace(/\s/g, '').toLowerCase();
    const whole = fullDigest.test(digest);
    setWrong(whole ? undefined : 'records.verify.notDigest');
    if (whole) verify.mutate({ digest });
  };
  const byFile = async (file: File) => {
    const found = await digestInFile(file);
    setWrong(found.kind === 'nothing' ? 'records.verify.notRecord' : undefined);
    verify.reset();
    if (found.kind === 'record') verify.mutate({ record: found.record });
    if (found.kind === 'pdf') verify.mutate({ pdf: found.file, printed: found.printed });
  };
  return (
    <SheetPage title={t('records.verify')}>
      <p className="max-w-[66ch]">{t('records.verify.note')}</p>
      <FileDrop
        label={t('records.verify.file')}
        hint={t('records.verify.file.hint')}
        accept=".pdf,.json,application/pdf,application/json"
        busy={verify.isPending}
        onFile={(file) => void byFile(file)}
      />
      {wrong === 'records.verify.notRecord' && <p role="alert">{t(wrong)}</p>}
      <form noValidate onSubmit={byDigest}>
        <TextField
          label={t('records.verify.digest')}
          hint={t('records.verify.digest.hint')}
          className="font-mono"
          autoComplete="off"
          spellCheck={false}
          value={typed}
          onChange={(event) => setTyped(event.target.value)}
          error={wrong === 'records.verify.notDigest' ? t(wrong) : undefined}
        />
        <Button type="submit" look="primary" busy={verify.isPending}>
          {t('records.verify')}
        </Button>
      </form>
      <ProblemMessage error={verify.error} />
      {verify.data && <VerifyResult {...verify.data} />}
    </SheetPage>
  );
}
