import type { Role } from '../../../../shared/api/common';
import type { PersonView } from '../../../../shared/api/people';
import { usePeopleOfRole } from '../../../api/people';
import { Answered } from '../../../components/Answered';
import { CheckField } from '../../../components/form/CheckField';
import { SelectField } from '../../../components/form/SelectField';
import { TextField } from '../../../components/form/TextField';
import { WordsField } from '../../../components/form/WordsField';
import { useWords } from '../../../components/words';
import type { JobDraft } from './jobDraft';

interface PeopleStepProps {
  site: string;
  draft: JobDraft;
  change: (change: Partial<JobDraft>) => void;
}

const holders = (people: readonly PersonView[], site: string, role: Role) =>
  people.filter(
    (person) => person.active && person.roles.some((held) => held.site === site && held.role === role),
  );

/** Today where the foreman is, as the date field writes it. */
const today = () => new Date().toLocaleDateString('sv-SE');

/** Who works, who countersigns, until when, and words for the crew. */
export function PeopleStep({ site, draft, change }: PeopleStepProps) {
  const { t } = useWords();
  const electricians = usePeopleOfRole(site, 'electrician');
  const foremen = usePeopleOfRole(site, 'foreman');
  const toggle = (person: string, on: boolean) =>
    change({
      electricians: on
        ? [...draft.electricians, person]
        : draft.electricians.filter((each) => each !== person),
    });
  return (
    <div>
      <Answered query={electricians}>
        {({ items }) => (
          <fieldset className="m-0 border-0 p-0">
            <legend className="text-lg font-bold">{t('office.new.electricians')}</legend>
            {holders(items, site, 'electrician').length === 0 && <p>{t('office.new.electricians.none')}</p>}
            {holders(items, site, 'electrician').map((person) => (
              <CheckField
                key={person.id}
                label={person.name}
                checked={draft.electricians.includes(person.id)}
                onChange={(event) => toggle(person.id, event.target.checked)}
              />
            ))}
          </fieldset>
        )}
      </Answered>
      <Answered query={foremen}>
        {({ items }) => (
          <SelectField
            label={t('office.new.foreman')}
            hint={t('office.new.foreman.hint')}
            value={draft.foreman}
            placeholder={t('office.choose')}
            onChange={(event) => change({ foreman: event.target.value })}
            error={draft.electricians.includes(draft.foreman) ? t('office.new.foreman.same') : undefined}
            options={holders(items, site, 'foreman').map((person) => ({
              value: person.id,
              label: person.name,
            }))}
          />
        )}
      </Answered>
      <TextField
        label={t('office.due')}
        type="date"
        min={today()}
        value={draft.due}
        onChange={(event) => change({ due: event.target.value })}
      />
      <WordsField
        label={t('office.new.words')}
        hint={t('office.new.words.hint')}
        maxLength={1000}
        value={draft.words}
        onChange={(event) => change({ words: event.target.value })}
      />
    </div>
  );
}
