import type { SubmitEvent } from 'react';
import { Button } from '../../components/Button';
import { CheckField } from '../../components/form/CheckField';
import { TextField } from '../../components/form/TextField';
import { useWords } from '../../components/words';

const wordFields = ['panel', 'person', 'point', 'lock'] as const;
const dateFields = ['from', 'to'] as const;

interface RecordFilterProps {
  search: URLSearchParams;
  onSearch: (search: URLSearchParams) => void;
}

/** Only what was filled in goes into the address. */
function searchOf(form: HTMLFormElement): URLSearchParams {
  const filled = [...new FormData(form)].flatMap(([name, value]) =>
    typeof value === 'string' && value.trim() ? [[name, value.trim()]] : [],
  );
  return new URLSearchParams(filled);
}

export function RecordFilter({ search, onSearch }: RecordFilterProps) {
  const { t } = useWords();
  const submit = (event: SubmitEvent<HTMLFormElement>) => {
    event.preventDefault();
    onSearch(searchOf(event.currentTarget));
  };
  return (
    <form role="search" aria-label={t('records.search')} onSubmit={submit} className="mb-6">
      <div className="grid gap-x-4 sm:grid-cols-2 lg:grid-cols-6 [&>*]:my-2">
        {wordFields.map((name) => (
          <TextField
            key={name}
            label={t(`records.by.${name}`)}
            name={name}
            maxLength={60}
            defaultValue={search.get(name) ?? ''}
          />
        ))}
        {dateFields.map((name) => (
          <TextField
            key={name}
            type="date"
            label={t(`records.by.${name}`)}
            name={name}
            defaultValue={search.get(name) ?? ''}
          />
        ))}
      </div>
      <div className="flex flex-wrap items-center gap-x-6 gap-y-2">
        <CheckField
          name="exceptions"
          value="true"
          label={t('records.by.exceptions')}
          defaultChecked={search.get('exceptions') === 'true'}
        />
        <Button type="submit" look="primary">
          {t('records.search')}
        </Button>
        {search.size > 0 && (
          <Button look="plain" onClick={() => onSearch(new URLSearchParams())}>
            {t('records.search.clear')}
          </Button>
        )}
      </div>
    </form>
  );
}
