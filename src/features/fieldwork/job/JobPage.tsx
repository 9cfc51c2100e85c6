import { useEffect } from 'react';
import { useNavigate } from 'react-router-dom';
import { paths } from '../../../app/paths';
import { ActionBar } from '../../../components/field/ActionBar';
import { FieldButton, FieldLink } from '../../../components/field/FieldButton';
import { FieldPage } from '../../../components/field/FieldPage';
import { useWords } from '../../../components/words';
import { ReadyVerdict } from '../jobs/ReadyVerdict';
import { UnsentLine } from '../layout/UnsentLine';
import { MoreButton } from '../more/MoreButton';
import { StopButton } from '../more/StopButton';
import { AcceptJob } from './AcceptJob';
import { nextFor, signGate } from './engine';
import { JobFacts } from './JobFacts';
import { JobHeader } from './JobHeader';
import { StageList } from './StageList';
import { useFieldJob } from './useFieldJob';

/** The one big button: carry on with this person's next step, sign, or read what was signed. */
function CarryOn() {
  const { t } = useWords();
  const { pack, local, me, part, plain } = useFieldJob();
  const job = pack.job.id;
  if (part === 'foreman')
    return (
      <FieldLink look="primary" className="min-h-[3.75rem] text-[1.2rem]" to={paths.review(job)}>
        {t('field.jobs.review')}
      </FieldLink>
    );
  const next = nextFor(local, me.person);
  if (next)
    return (
      <FieldLink
        look="primary"
        className="min-h-[3.75rem] flex-col! gap-0! text-[1.2rem]"
        to={paths.step(job, next.id)}
      >
        {t('field.job.carryOn')}
        <span className="max-w-full truncate text-[0.85rem] font-normal">{plain(next.title)}</span>
      </FieldLink>
    );
  const isSignable = signGate(local, me.person).open;
  return (
    <FieldLink
      look={isSignable ? 'primary' : 'outlined'}
      className="min-h-[3.75rem] text-[1.2rem]"
      to={paths.sign(job)}
    >
      {t(isSignable ? 'field.job.sign' : 'field.job.waits')}
    </FieldLink>
  );
}

/** One job: accept it first, then carry on; its stages, locks, people, holds and notes. */
export function JobPage() {
  const { t } = useWords();
  const navigate = useNavigate();
  const { pack, state, part } = useFieldJob();
  const isNew = state.status === 'sent' && part === 'electrician';
  useEffect(() => {
    document.querySelector('h1')?.focus({ preventScroll: true });
  }, []);
  return (
    <FieldPage
      header={<JobHeader />}
      banner={<UnsentLine />}
      footer={
        <ActionBar primary={isNew ? <AcceptJob /> : <CarryOn />}>
          <FieldButton onClick={() => void navigate(paths.myJobs)}>{t('field.back')}</FieldButton>
          <FieldLink to={paths.jobLocks(pack.job.id)}>{t('field.locks.short')}</FieldLink>
          <MoreButton />
          <StopButton pack={pack} />
        </ActionBar>
      }
    >
      <div>
        <p className="m-0 text-[0.95rem] text-muted">{t(`field.status.${state.status}`)}</p>
        <h1 tabIndex={-1} className="m-0 font-bold text-[1.55rem] leading-tight outline-none">
          {t('field.job.title', { number: pack.job.number, points: pack.checklist.scope.length })}
        </h1>
      </div>
      {isNew && (
        <p className="m-0 border-l-8 border-ink bg-sheet px-3 py-2 leading-snug">
          {t('field.safetyPosition')}
        </p>
      )}
      <ReadyVerdict job={pack.job.id} />
      {pack.job.words && <p className="m-0 border-l-8 border-ink bg-sheet px-3 py-2">{pack.job.words}</p>}
      <StageList />
      <JobFacts />
    </FieldPage>
  );
}
