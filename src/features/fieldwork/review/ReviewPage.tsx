import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { paths } from '../../../app/paths';
import { ActionBar } from '../../../components/field/ActionBar';
import { FieldButton } from '../../../components/field/FieldButton';
import { FieldPage } from '../../../components/field/FieldPage';
import { useWords } from '../../../components/words';
import { SaveButton } from '../answers/SaveButton';
import { countersignGate } from '../job/engine';
import { JobHeader } from '../job/JobHeader';
import { NotSaved } from '../job/NotSaved';
import { useFieldJob } from '../job/useFieldJob';
import { useSave } from '../job/useSave';
import { UnsentLine } from '../layout/UnsentLine';
import { MoreButton } from '../more/MoreButton';
import { StopButton } from '../more/StopButton';
import { SignForm, type Picture } from '../sign/SignForm';
import { Refusals } from '../sign/SignPage';
import { signatureBody } from '../sign/signatureBody';
import { Signatures } from '../sign/Signatures';
import { Summary } from '../sign/Summary';
import { ChooseAnswers } from './ChooseAnswers';
import { HoldList } from './HoldList';
import { ReturnSheet } from './ReturnSheet';
import { ReturnTick } from './ReturnTick';

/** The foreman reads the same summary, decides holds and double answers, and countersigns or sends steps back. */
export function ReviewPage() {
  const { t, language } = useWords();
  const job = useFieldJob();
  const navigate = useNavigate();
  const { save, saving, failed } = useSave();
  const [picture, setPicture] = useState<Picture>();
  const [ticked, setTicked] = useState<string[]>([]);
  const [returning, setReturning] = useState(false);
  const gate = countersignGate(job.local, job.me.person);
  async function countersign() {
    if (!picture) return;
    const body = signatureBody(job, language, t('field.sign.countersignMeaning'), picture);
    if (await save('countersigned', { ...body, heads: job.state.heads }, t('field.sign.pin')))
      await navigate(paths.myJobs);
  }
  const tick = (step: string) => (
    <ReturnTick
      ticked={ticked.includes(step)}
      onTick={(on) => {
        setTicked(on ? [...ticked, step] : ticked.filter((each) => each !== step));
      }}
    />
  );
  return (
    <FieldPage
      header={<JobHeader stage="sign" />}
      banner={<UnsentLine />}
      footer={
        <ActionBar
          primary={
            ticked.length > 0 ? (
              <FieldButton
                look="primary"
                onClick={() => {
                  setReturning(true);
                }}
              >
                {t('field.review.returnN', { n: ticked.length })}
              </FieldButton>
            ) : (
              gate.open && (
                <SaveButton saving={saving} disabled={!picture} onSave={countersign}>
                  {picture ? t('field.review.countersign', { name: job.me.name }) : t('field.sign.first')}
                </SaveButton>
              )
            )
          }
        >
          <FieldButton onClick={() => void navigate(-1)}>{t('field.back')}</FieldButton>
          <MoreButton />
          <StopButton pack={job.pack} />
        </ActionBar>
      }
    >
      <h1 className="m-0 text-[1.55rem] leading-tight font-bold">
        {t('field.review.title')} {job.pack.job.number}
      </h1>
      {!gate.open && <Refusals head={t('field.review.not')} refusals={gate.refusals} />}
      <Signatures />
      <ChooseAnswers />
      <HoldList />
      <Summary act={job.part === 'foreman' ? tick : undefined} />
      {gate.open && (
        <SignForm name={job.me.name} meaning={t('field.sign.countersignMeaning')} onPicture={setPicture} />
      )}
      <NotSaved code={failed} />
      {returning && (
        <ReturnSheet
          steps={ticked}
          onClose={() => {
            setReturning(false);
          }}
        />
      )}
    </FieldPage>
  );
}
