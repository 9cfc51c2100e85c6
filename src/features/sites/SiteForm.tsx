import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import type { SiteSettings } from '../../../shared/api/sites';
import { Button } from '../../components/Button';
import { CheckField } from '../../components/form/CheckField';
import { SelectField } from '../../components/form/SelectField';
import { TextField } from '../../components/form/TextField';
import { useErrorWords } from '../../components/form/useErrorWords';
import { ProblemMessage } from '../../components/ProblemMessage';
import { useWords } from '../../components/words';
import { InstrumentsField } from './InstrumentsField';
import { siteForm, siteOf, type SiteValues } from './siteForm';

interface SiteFormProps {
  start: SiteValues;
  busy: boolean;
  error: unknown;
  saved?: boolean;
  onSave: (site: { name: string; settings: SiteSettings }) => void;
}

const ferruleSchemes = ['DIN 46228-4', 'German old code', 'French code'] as const;

/** Everything a site decides for its people. */
export function SiteForm({ start, busy, error, saved = false, onSave }: SiteFormProps) {
  const { t } = useWords();
  const errorWords = useErrorWords();
  const form = useForm({ resolver: zodResolver(siteForm), defaultValues: start });
  const { errors, isDirty } = form.formState;
  return (
    <form noValidate onSubmit={form.handleSubmit((values) => onSave(siteOf(values)))}>
      <div className="grid gap-x-10 md:grid-cols-2">
        <div>
          <TextField
            label={t('office.site.name')}
            error={errorWords(errors.name)}
            {...form.register('name')}
          />
          <TextField
            label={t('office.site.emergency')}
            hint={t('office.site.emergency.hint')}
            error={errorWords(errors.emergencyNumber)}
            {...form.register('emergencyNumber')}
          />
          <TextField
            label={t('office.site.muster')}
            error={errorWords(errors.musterPoint)}
            {...form.register('musterPoint')}
          />
          <TextField
            label={t('office.site.foremanPhone')}
            type="tel"
            error={errorWords(errors.foremanPhone)}
            {...form.register('foremanPhone')}
          />
        </div>
        <div>
          <TextField
            label={t('office.site.deadLimit')}
            hint={t('office.site.deadLimit.hint')}
            inputMode="decimal"
            error={errorWords(errors.deadLimitV)}
            {...form.register('deadLimitV')}
          />
          <CheckField label={t('office.site.permit')} {...form.register('permitAsked')} />
          <SelectField
            label={t('office.site.ferrules')}
            options={ferruleSchemes.map((scheme) => ({
              value: scheme,
              label: t(`office.ferrule.${scheme}`),
            }))}
            {...form.register('ferruleScheme')}
          />
        </div>
      </div>
      <InstrumentsField form={form} />
      <ProblemMessage error={error} />
      {saved && !isDirty && <p role="status">{t('app.saved')}</p>}
      <Button type="submit" look="primary" busy={busy}>
        {t('app.save')}
      </Button>
    </form>
  );
}
