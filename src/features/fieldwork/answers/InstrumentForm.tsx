import { useEffect, useState } from 'react';
import { instrument } from '../../../../shared/api/sites';
import { LineBox } from '../../../components/field/LineBox';
import { RadioList } from '../../../components/field/RadioList';
import { useWords } from '../../../components/words';
import type { InstrumentFacts } from './instrumentCheck';

const categories = ['CAT II', 'CAT III', 'CAT IV'] as const;

/** A tester that is not on the site's list. Tells its facts as soon as all of them make sense. */
export function InstrumentForm({ onFacts }: { onFacts: (facts: InstrumentFacts | undefined) => void }) {
  const { t } = useWords();
  const [make, setMake] = useState('');
  const [number, setNumber] = useState('');
  const [category, setCategory] = useState<InstrumentFacts['category']>();
  const [ratedV, setRatedV] = useState('');
  const [checkDue, setCheckDue] = useState('');
  useEffect(() => {
    const facts = instrument.safeParse({ make, number, category, ratedV: Number(ratedV), checkDue });
    onFacts(facts.success ? facts.data : undefined);
  }, [make, number, category, ratedV, checkDue, onFacts]);
  return (
    <div className="grid gap-2">
      <LineBox label={t('field.instrument.make')} value={make} onChange={setMake} maxLength={80} />
      <LineBox label={t('field.instrument.number')} value={number} onChange={setNumber} maxLength={80} />
      <RadioList
        legend={t('field.instrument.category')}
        options={categories.map((value) => ({ value, label: value }))}
        chosen={category}
        onChoose={setCategory}
      />
      <LineBox label={t('field.instrument.ratedV')} value={ratedV} inputMode="decimal" onChange={setRatedV} />
      <LineBox label={t('field.instrument.due')} type="date" value={checkDue} onChange={setCheckDue} />
    </div>
  );
}
