import { useState } from 'react';
import { FieldButton } from '../../../components/field/FieldButton';
import { RadioList } from '../../../components/field/RadioList';
import { useWords } from '../../../components/words';
import { useFieldJob } from '../job/useFieldJob';
import { StepFrame } from '../step/StepFrame';
import { useAnswer } from '../step/useAnswer';
import { instrumentRefusals, localDate, type InstrumentFacts } from './instrumentCheck';
import { InstrumentForm } from './InstrumentForm';
import { SaveButton } from './SaveButton';
import type { StepOf } from './StepAnswer';

function Refused({ step, tester }: { step: StepOf<'instrument'>; tester: InstrumentFacts }) {
  const { t } = useWords();
  const refusals = instrumentRefusals(step.ask, tester, localDate(new Date()));
  return (
    <div role="alert" className="border-[3px] border-ink bg-sheet px-3 py-2 empty:hidden">
      {refusals.map((refusal) => (
        <p key={refusal} className="m-0 font-bold">
          {t(`field.instrument.${refusal}`, {
            due: tester.checkDue,
            category: tester.category,
            minCategory: step.ask.minCategory,
            ratedV: tester.ratedV,
            minV: step.ask.minV,
          })}
        </p>
      ))}
    </div>
  );
}

/** The tester: one of the site's, or another with its facts; one that is out of date or too weak is refused. */
export function InstrumentAnswer({ step }: { step: StepOf<'instrument'> }) {
  const { t } = useWords();
  const { pack } = useFieldJob();
  const { answer, saving, failed } = useAnswer(step);
  const [tester, setTester] = useState<InstrumentFacts>();
  const [other, setOther] = useState(pack.job.site.settings.instruments.length === 0);
  const { instruments } = pack.job.site.settings;
  const isFit = tester && instrumentRefusals(step.ask, tester, localDate(new Date())).length === 0;
  const idOf = (each: InstrumentFacts) => `${each.make} ${each.number}`;
  return (
    <StepFrame
      step={step}
      failed={failed}
      answer={
        <>
          <p className="m-0 text-[0.95rem] text-muted">
            {t('field.instrument.needs', { category: step.ask.minCategory, minV: step.ask.minV })}
          </p>
          {other ? (
            <InstrumentForm onFacts={setTester} />
          ) : (
            <RadioList
              legend={t('field.instrument.which')}
              options={instruments.map((each) => ({
                value: idOf(each),
                label: t('field.instrument.row', { ...each, ratedV: each.ratedV }),
              }))}
              chosen={tester && idOf(tester)}
              onChoose={(chosen) => {
                setTester(instruments.find((each) => idOf(each) === chosen));
              }}
            />
          )}
          {instruments.length > 0 && (
            <FieldButton
              look="quiet"
              onClick={() => {
                setOther(!other);
                setTester(undefined);
              }}
            >
              {t(other ? 'field.instrument.list' : 'field.instrument.other')}
            </FieldButton>
          )}
          {tester && <Refused step={step} tester={tester} />}
        </>
      }
      primary={
        <SaveButton
          saving={saving}
          disabled={!isFit}
          onSave={async () => {
            if (tester && isFit) await answer({ kind: 'instrument', ...tester });
          }}
        >
          {tester ? t('field.saveValue', { value: idOf(tester) }) : t('field.instrument.choose')}
        </SaveButton>
      }
    />
  );
}
