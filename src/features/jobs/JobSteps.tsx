import { stages } from '../../../shared/checklist/types';
import type { JobStateView } from '../../../shared/api/jobs';
import { useJobState } from '../../api/jobs';
import { Answered } from '../../components/Answered';
import { Moment } from '../../components/Moment';
import { SheetSection } from '../../components/sheet/SheetSection';
import { Table, type Column } from '../../components/Table';
import { useWords } from '../../components/words';

type StepRow = JobStateView['steps'][number];

function Answers({ step }: { step: StepRow }) {
  const { t } = useWords();
  return (
    <>
      {step.answers.map((answer, index) => (
        <span key={index} className="block">
          <strong>{answer.found}</strong>
          {answer.verdict !== 'ok' && ` (${t(`records.verdict.${answer.verdict}`)})`} {answer.person},{' '}
          <Moment at={answer.at} />
        </span>
      ))}
      {step.hold && (
        <span className="block">
          {t('office.step.held')}: {step.hold.words} {step.hold.person}, <Moment at={step.hold.at} />
        </span>
      )}
      {step.returned !== null && (
        <span className="block">{t('office.step.returned', { words: step.returned })}</span>
      )}
    </>
  );
}

function StageSteps({ stage, steps }: { stage: JobStateView['stages'][number]; steps: readonly StepRow[] }) {
  const { t } = useWords();
  const title = t('office.job.steps.stage', {
    stage: t(`office.stage.${stage.stage}`),
    done: stage.done,
    of: stage.of,
  });
  const columns: Column<StepRow>[] = [
    { head: t('office.job.steps.step'), className: 'md:w-[45%]', cell: (step) => step.title },
    {
      head: t('office.job.steps.status'),
      className: 'md:w-[14%]',
      cell: (step) => t(`office.step.${step.status}`),
    },
    { head: t('office.job.steps.answer'), cell: (step) => <Answers step={step} /> },
  ];
  return (
    <details open={stage.status === 'current'} className="border-b border-rule">
      <summary className="min-h-11 cursor-pointer content-center font-bold">
        {stages.indexOf(stage.stage) + 1} {title}
      </summary>
      <Table caption={title} columns={columns} rows={steps} keyOf={(step) => step.id} />
    </details>
  );
}

/** Every step with what was answered, stage by stage; the current stage stands open. */
export function JobSteps({ job }: { job: string }) {
  const { t, language } = useWords();
  const state = useJobState(job, language);
  return (
    <SheetSection title={t('office.job.steps')} note={t('office.job.steps.note')}>
      <Answered query={state}>
        {(data) =>
          data.stages.map((stage) => (
            <StageSteps
              key={stage.stage}
              stage={stage}
              steps={data.steps.filter((step) => step.stage === stage.stage)}
            />
          ))
        }
      </Answered>
    </SheetSection>
  );
}
