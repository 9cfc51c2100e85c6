import { useState } from 'react';
import type { PackPerson } from '../../../../shared/api/jobs';
import { FieldButton } from '../../../components/field/FieldButton';
import { useWords } from '../../../components/words';
import { useFieldJob } from '../job/useFieldJob';
import { ClearSheet } from './ClearSheet';

/** Everyone given the job, and who has said to be clear: each with their own PIN, before power comes back. */
export function ClearList() {
  const { t } = useWords();
  const { pack, state } = useFieldJob();
  const [asking, setAsking] = useState<PackPerson>();
  const clear = new Set(state.clear);
  const workers = pack.people.filter(({ part }) => part === 'electrician');
  return (
    <section className="grid gap-2 border-2 border-ink bg-sheet p-3">
      <h2 className="m-0 text-[1.1rem] leading-tight font-bold">{t('field.clear.title')}</h2>
      <p className="m-0 leading-snug">{t('field.clear.what')}</p>
      {workers.map((person) =>
        clear.has(person.id) ? (
          <p key={person.id} className="m-0">
            <b>{person.name}</b> {t('field.clear.is')}
          </p>
        ) : (
          <FieldButton
            key={person.id}
            onClick={() => {
              setAsking(person);
            }}
          >
            {t('field.clear.say', { name: person.name })}
          </FieldButton>
        ),
      )}
      {asking && (
        <ClearSheet
          person={asking}
          onClose={() => {
            setAsking(undefined);
          }}
        />
      )}
    </section>
  );
}
