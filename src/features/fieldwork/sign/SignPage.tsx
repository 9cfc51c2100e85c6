import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { paths } from '../../../app/paths';
import { ActionBar } from '../../../components/field/ActionBar';
import { FieldButton } from '../../../components/field/FieldButton';
import { FieldPage } from '../../../components/field/FieldPage';
import { MarkedText } from '../../../components/field/MarkedText';
import { useWords } from '../../../components/words';
import type { Refusal } from '../../../../shared/job/types';
import { SaveButton } from '../answers/SaveButton';
import { signGate } from '../job/engine';
import { JobHeader } from '../job/JobHeader';
import { NotSaved } from '../job/NotSaved';
import { useFieldJob } from '../job/useFieldJob';
import { useSave } from '../job/useSave';
import { UnsentLine } from '../layout/UnsentLine';
import { MoreButton } from '../more/MoreButton';
import { StopButton } from '../more/StopButton';
import { signatureBody } from './signatureBody';
import { SignForm, type Picture } from './SignForm';
import { Signatures } from './Signatures';
import { Summary } from './Summary';

/** Why it cannot be signed or countersigned now. */
export function Refusals({ head, refusals }: { head: string; refusals: Refusal[] }) {
  const { marked } = useFieldJob();
  return (
    <div className="border-[3px] border-ink bg-sheet px-3 py-2">
      <p className="m-0 font-bold">{head}</p>
      <ul className="m-0 grid gap-1 pl-5">
        {refusals.map((refusal, index) => (
          <li key={index}>
            <MarkedText text={marked(refusal.says)} look="bold" />
          </li>
        ))}
      </ul>
    </div>
  );
}

/** The electrician reads one summary, exceptions first, and signs for their own answers with finger and PIN. */
export function SignPage() {
  const { t, language } = useWords();
  const job = useFieldJob();
  const navigate = useNavigate();
  const { save, saving, failed } = useSave();
  const [picture, setPicture] = useState<Picture>();
  const gate = signGate(job.local, job.me.person);
  async function sign() {
    if (!picture) return;
    const body = signatureBody(job, language, t('field.sign.meaning'), picture);
    if (await save('signed', { ...body, steps: gate.open ? gate.steps : [] }, t('field.sign.pin')))
      await navigate(paths.myJob(job.pack.job.id));
  }
  return (
    <FieldPage
      header={<JobHeader stage="sign" />}
      banner={<UnsentLine />}
      footer={
        <ActionBar
          primary={
            gate.open && (
              <SaveButton saving={saving} disabled={!picture} onSave={sign}>
                {picture ? t('field.sign.save', { name: job.me.name }) : t('field.sign.first')}
              </SaveButton>
            )
          }
        >
          <FieldButton onClick={() => void navigate(-1)}>{t('field.back')}</FieldButton>
          <MoreButton />
          <StopButton pack={job.pack} />
        </ActionBar>
      }
    >
      <h1 className="m-0 text-[1.55rem] leading-tight font-bold">{t('field.sign.title')}</h1>
      {!gate.open && <Refusals head={t('field.sign.not')} refusals={gate.refusals} />}
      <Signatures />
      <Summary />
      <p className="m-0 text-[0.95rem]">{t('field.safetyPosition')}</p>
      {gate.open && <SignForm name={job.me.name} meaning={t('field.sign.meaning')} onPicture={setPicture} />}
      <NotSaved code={failed} />
    </FieldPage>
  );
}
