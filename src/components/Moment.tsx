import { momentWords, type MomentForm } from './momentWords';
import { useWords } from './words';

/** A point in time as people say it: "today 11:42", or the date and time. The exact instant stands in the markup. */
export function Moment({ at, form = 'when' }: { at: string; form?: MomentForm }) {
  const { language, t } = useWords();
  return <time dateTime={at}>{momentWords(at, form, language, t('app.today'), new Date())}</time>;
}
