import { useRef } from 'react';
import { useNavigate } from 'react-router-dom';
import type { Step } from '../../../../shared/checklist/types';
import type { AnswerValue, BodyOf, EntryKind } from '../../../../shared/job/entry';
import { paths } from '../../../app/paths';
import { oneLine } from '../../../components/field/oneLine';
import { useWords } from '../../../components/words';
import { useDeviceStore } from '../../../offline/useDevice';
import { nextFor } from '../job/engine';
import { folded } from '../job/folded';
import { useFieldJob } from '../job/useFieldJob';
import { useSave, type Save } from '../job/useSave';
import { ownAnswer } from './ownAnswer';

// Length of `shown` in the entry's schema.
const shownLength = 2000;

interface Answering extends Omit<Save, 'save'> {
  /** Saves an answer to this step and goes on when it is kept and in limits. */
  answer: (value: AnswerValue) => Promise<unknown>;
  /** The same for a reading that this person watched another take: names that answer, and takes the PIN. */
  watch: (value: AnswerValue, watched: string, pinWhy: string) => Promise<unknown>;
  /** The same for the steps whose answer is an entry of its own kind (locks, closing). */
  act: <K extends EntryKind>(kind: K, body: BodyOf<K>, pinWhy?: string) => Promise<unknown>;
}

/** Saving an answer, then moving on: to this person's next step, or staying where something is not right. */
export function useAnswer(step: Step): Answering {
  const { pack, me, plain } = useFieldJob();
  const { language } = useWords();
  const store = useDeviceStore();
  const navigate = useNavigate();
  const { save, saving, failed } = useSave();
  const going = useRef(false);
  async function goOn() {
    const fresh = await store.job(pack.job.id);
    if (!fresh) return;
    const state = folded(fresh);
    if (ownAnswer(state, step, me.person).status === 'out') return;
    const next = nextFor(fresh, me.person);
    const to = next ? paths.step(pack.job.id, next.id) : paths.myJob(pack.job.id);
    await navigate(to, { state: { saved: step.id } });
  }
  const act: Answering['act'] = async (kind, body, pinWhy) => {
    if (going.current) return;
    going.current = true;
    try {
      if (await save(kind, body, pinWhy)) await goOn();
    } finally {
      going.current = false;
    }
  };
  const shown = oneLine([step.title, ...(step.detail ?? [])].map(plain).join(' ')).slice(0, shownLength);
  return {
    act,
    answer: (value) => act('answer', { step: step.id, value, shown, language }),
    watch: (value, watched, pinWhy) =>
      act('answer', { step: step.id, value, shown, language, watched }, pinWhy),
    saving,
    failed,
  };
}
