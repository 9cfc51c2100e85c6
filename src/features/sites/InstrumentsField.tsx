import { useFieldArray, type UseFormReturn } from 'react-hook-form';
import type { z } from 'zod';
import { Button } from '../../components/Button';
import { SelectField } from '../../components/form/SelectField';
import { TextField } from '../../components/form/TextField';
import { useErrorWords } from '../../components/form/useErrorWords';
import { useWords } from '../../components/words';
import type { siteForm, SiteValues } from './siteForm';

const categories = ['CAT II', 'CAT III', 'CAT IV'].map((value) => ({ value, label: value }));
const fresh = { make: '', number: '', category: 'CAT III', ratedV: '', checkDue: '' } as const;

/** The testers of the site: make, number, category, rated volts, when the next check is due. */
export function InstrumentsField({
  form,
}: {
  form: UseFormReturn<SiteValues, unknown, z.output<typeof siteForm>>;
}) {
  const { t } = useWords();
  const errorWords = useErrorWords();
  const list = useFieldArray({ control: form.control, name: 'instruments' });
  return (
    <fieldset className="my-6 border-0 border-t-2 border-ink p-0">
      <legend className="pr-3 text-lg font-bold">{t('office.site.instruments')}</legend>
      {list.fields.length === 0 && <p>{t('office.site.instruments.none')}</p>}
      {list.fields.map((field, index) => {
        const errors = form.formState.errors.instruments?.[index];
        const name = `instruments.${index}` as const;
        return (
          <div
            key={field.id}
            role="group"
            aria-label={t('office.instrument.n', { n: index + 1 })}
            className="grid items-start gap-x-4 border-b border-rule sm:grid-cols-2 lg:grid-cols-[2fr_2fr_1fr_1fr_1.5fr_auto] [&>div]:my-2"
          >
            <TextField
              label={t('office.instrument.make')}
              error={errorWords(errors?.make)}
              {...form.register(`${name}.make`)}
            />
            <TextField
              label={t('office.instrument.number')}
              error={errorWords(errors?.number)}
              {...form.register(`${name}.number`)}
            />
            <SelectField
              label={t('office.instrument.category')}
              options={categories}
              {...form.register(`${name}.category`)}
            />
            <TextField
              label={t('office.instrument.ratedV')}
              inputMode="numeric"
              error={errorWords(errors?.ratedV)}
              {...form.register(`${name}.ratedV`)}
            />
            <TextField
              label={t('office.instrument.checkDue')}
              type="date"
              error={errorWords(errors?.checkDue)}
              {...form.register(`${name}.checkDue`)}
            />
            <Button className="my-2 self-end" onClick={() => list.remove(index)}>
              {t('office.instrument.remove')}
            </Button>
          </div>
        );
      })}
      <Button className="mt-3" onClick={() => list.append(fresh)}>
        {t('office.instrument.add')}
      </Button>
    </fieldset>
  );
}
