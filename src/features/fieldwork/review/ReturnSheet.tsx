import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { paths } from '../../../app/paths';
import { FieldButton } from '../../../components/field/FieldButton';
import { oneLine } from '../../../components/field/oneLine';
import { Sheet } from '../../../components/field/Sheet';
import { WordsBox } from '../../../components/field/WordsBox';
import { useWords } from '../../../components/words';
import { NotSaved } from '../job/NotSaved';
import { useFieldJob } from '../job/useFieldJob';
import { useSave } from '../job/useSave';

/** Sends the ticked steps back, each with its own words. */
export function ReturnSheet({ steps, onClose }: { steps: string[]; onClose: () => void }) {
  const { t } = useWords();
  const { stepOf, plain } = useFieldJob();
  const navigate = useNavigate();
  const { save, saving, failed } = useSave();
  const [words, setWords] = useState<Record<string, string>>({});
  const returned = steps.map((step) => ({ step, words: oneLine(words[step] ?? '') }));
  async function send() {
    if (await save('returned', { steps: returned })) await navigate(paths.myJobs);
  }
  return (
    <Sheet
      title={t('field.review.return')}
      onClose={onClose}
      closeWords={t('field.cancel')}
      actions={
        <FieldButton
          look="primary"
          disabled={saving || returned.some((each) => !each.words)}
          onClick={() => void send()}
        >
          {t('field.review.returnN', { n: steps.length })}
        </FieldButton>
      }
    >
      <p className="m-0">{t('field.review.words')}</p>
      {steps.map((step) => {
        const found = stepOf(step);
        return (
          <WordsBox
            key={step}
            label={found ? plain(found.title) : step}
            value={words[step] ?? ''}
            rows={2}
            onChange={(value) => {
              setWords({ ...words, [step]: value });
            }}
          />
        );
      })}
      <NotSaved code={failed} />
    </Sheet>
  );
}
