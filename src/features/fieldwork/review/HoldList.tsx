import { useState } from 'react';
import { paths } from '../../../app/paths';
import { clockWords } from '../../../components/field/clockWords';
import { FieldButton, FieldLink } from '../../../components/field/FieldButton';
import { MarkedText } from '../../../components/field/MarkedText';
import { useWords } from '../../../components/words';
import type { StepState } from '../../../../shared/job/types';
import { useFieldJob } from '../job/useFieldJob';
import { DecideSheet } from './DecideSheet';

type Held = StepState & { hold: NonNullable<StepState['hold']> };
const isHeld = (state: StepState): state is Held => state.hold !== undefined;

function HoldRow({ held }: { held: Held }) {
  const { t, language } = useWords();
  const { pack, part, nameOf, marked } = useFieldJob();
  const [deciding, setDeciding] = useState(false);
  const { hold, step } = held;
  return (
    <li className="grid gap-1 border-2 border-ink bg-sheet p-2 leading-snug">
      <p className="m-0">
        <MarkedText text={marked(step.title)} look="bold" />
      </p>
      <p className="m-0">
        <b>{t(`field.hold.${hold.body.reason}`)}:</b> {hold.body.words}{' '}
        <span className="text-muted">
          {nameOf(hold.person)}, {clockWords(hold.at, language, new Date())}
        </span>
      </p>
      <p className="m-0 font-bold">
        {hold.decided
          ? `${t(`field.decision.${hold.decided.decision}`)}. ${hold.decided.words}`
          : t('field.review.undecided')}
      </p>
      <FieldLink look="quiet" to={paths.step(pack.job.id, step.id)}>
        {t('field.review.openStep')}
      </FieldLink>
      {part === 'foreman' && !hold.decided && (
        <FieldButton
          onClick={() => {
            setDeciding(true);
          }}
        >
          {t('field.review.decide')}
        </FieldButton>
      )}
      {deciding && (
        <DecideSheet
          hold={hold.entry}
          onClose={() => {
            setDeciding(false);
          }}
        />
      )}
    </li>
  );
}

/** The steps somebody could not do, with the reason and what the foreman decided; a foreman decides here. */
export function HoldList() {
  const { t } = useWords();
  const { pack, state } = useFieldJob();
  const held = pack.checklist.steps.flatMap(({ id }) => state.steps[id] ?? []).filter(isHeld);
  if (held.length === 0) return null;
  return (
    <section className="border-t-2 border-ink pt-2">
      <h2 className="m-0 font-bold mb-1 text-[1.1rem] leading-tight">{t('field.review.holds')}</h2>
      <ul className="m-0 grid list-none gap-2 p-0">
        {held.map((each) => (
          <HoldRow key={each.hold.entry} held={each} />
        ))}
      </ul>
    </section>
  );
}
