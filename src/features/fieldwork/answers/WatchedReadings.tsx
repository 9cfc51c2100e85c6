import type { AnswerValue } from '../../../../shared/job/entry';
import { FieldButton } from '../../../components/field/FieldButton';
import { useWords } from '../../../components/words';
import { useFieldJob } from '../job/useFieldJob';
import { readingWords } from '../step/unitWords';
import type { StepOf } from './StepAnswer';

interface WatchedReadingsProps {
  step: StepOf<'reading'>;
  onWatched: (value: AnswerValue, watched: string, pinWhy: string) => Promise<unknown>;
}

/** A dead test that a colleague measured on this phone: who stood beside may enter it as watched, with their own PIN. */
export function WatchedReadings({ step, onWatched }: WatchedReadingsProps) {
  const { t } = useWords();
  const { state, me, nameOf } = useFieldJob();
  if (!step.ask.dead || step.by !== 'each') return null;
  const others = Object.entries(state.steps[step.id]?.by ?? {}).flatMap(([person, { status, answer }]) =>
    person !== me.person && status === 'done' && answer?.round === state.round.id ? [answer] : [],
  );
  return others.map(({ entry, person, value }) => {
    if (value.kind !== 'reading') return null;
    const said = { name: nameOf(person), reading: readingWords(value.value, step.ask.unit, t) };
    return (
      <FieldButton
        key={entry}
        look="quiet"
        onClick={() => void onWatched(value, entry, t('field.reading.watchedPin', said))}
      >
        {t('field.reading.watched', said)}
      </FieldButton>
    );
  });
}
