import { useState } from 'react';
import type { Step } from '../../../../shared/checklist/types';
import { stepGate } from '../job/engine';
import { useFieldJob } from '../job/useFieldJob';
import { ownAnswer } from '../step/ownAnswer';
import { ChoiceAnswer } from './ChoiceAnswer';
import { CloseAnswer } from './CloseAnswer';
import { DoneAnswer } from './DoneAnswer';
import { InstrumentAnswer } from './InstrumentAnswer';
import { LockOffAnswer } from './LockOffAnswer';
import { LockOnAnswer } from './LockOnAnswer';
import { NotYet } from './NotYet';
import { OutOfLimits } from './OutOfLimits';
import { PhotoAnswer } from './PhotoAnswer';
import { ReadingAnswer } from './ReadingAnswer';
import { ScanAnswer } from './ScanAnswer';
import { TextAnswer } from './TextAnswer';
import { WaitAnswer } from './WaitAnswer';

/** A step with the ask of one kind: the compiler then knows its fields. */
export type StepOf<K extends Step['ask']['kind']> = Step & { ask: Extract<Step['ask'], { kind: K }> };
const asks = <K extends Step['ask']['kind']>(step: Step, kind: K): step is StepOf<K> =>
  step.ask.kind === kind;

function AnswerOf({ step }: { step: Step }) {
  if (asks(step, 'done')) return <DoneAnswer step={step} />;
  if (asks(step, 'reading')) return <ReadingAnswer step={step} />;
  if (asks(step, 'choice')) return <ChoiceAnswer step={step} />;
  if (asks(step, 'text')) return <TextAnswer step={step} />;
  if (asks(step, 'photo')) return <PhotoAnswer step={step} />;
  if (asks(step, 'wait')) return <WaitAnswer step={step} />;
  if (asks(step, 'scan')) return <ScanAnswer step={step} />;
  if (asks(step, 'instrument')) return <InstrumentAnswer step={step} />;
  if (asks(step, 'lock-on')) return <LockOnAnswer step={step} />;
  if (asks(step, 'lock-off')) return <LockOffAnswer step={step} />;
  if (asks(step, 'close')) return <CloseAnswer step={step} />;
  return null;
}

/** The answer a step asks for; the reasons while its gate is shut; what to do while its answer is out of limits. */
export function StepAnswer({ step }: { step: Step }) {
  const { local, state, me } = useFieldJob();
  const [again, setAgain] = useState<string>();
  const gate = stepGate(local, me.person, step.id);
  const { status, answer } = ownAnswer(state, step, me.person);
  if (!gate.open) return <NotYet step={step} refusals={gate.refusals} />;
  if (status === 'out' && answer && again !== answer.entry)
    return (
      <OutOfLimits
        step={step}
        answer={answer}
        onAgain={() => {
          setAgain(answer.entry);
        }}
      />
    );
  return <AnswerOf key={again} step={step} />;
}
