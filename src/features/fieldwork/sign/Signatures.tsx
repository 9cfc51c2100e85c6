import { clockWords } from '../../../components/field/clockWords';
import { useWords } from '../../../components/words';
import { useFieldJob } from '../job/useFieldJob';

/** Who has signed, when, and whether it still counts. */
export function Signatures() {
  const { t, language } = useWords();
  const { state, nameOf, plain } = useFieldJob();
  const all = [...state.signatures, ...(state.countersign ? [state.countersign] : [])];
  return all.map(({ entry, person, at, body, stands, why }) => (
    <div key={entry} className="border-l-8 border-ink bg-sheet px-3 py-2 leading-snug">
      <p className="m-0 font-bold">
        {t('field.sign.done', { name: nameOf(person), at: clockWords(at, language, new Date()) })}
      </p>
      <p className="m-0">{body.meaning}</p>
      {!stands && <p className="m-0 font-bold">{why ? plain(why) : t('field.sign.void')}</p>}
    </div>
  ));
}
