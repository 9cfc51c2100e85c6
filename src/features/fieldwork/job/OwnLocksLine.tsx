import { clockWords } from '../../../components/field/clockWords';
import { SaveLine } from '../../../components/field/SaveLine';
import { useWords } from '../../../components/words';
import { ownLocks } from './ownLocks';
import { useFieldJob } from './useFieldJob';

/** "Your lock 17 on Q1 09:14, on F12 09:21": only the person's own locks, never on another's word. */
export function OwnLocksLine() {
  const { t, language } = useWords();
  const { state, me } = useFieldJob();
  const locks = ownLocks(state, me.person);
  if (locks.length === 0) return null;
  const list = locks.map(({ isolator, lock, onAt }) =>
    t('field.locks.oneOn', { isolator, lock, at: clockWords(onAt, language, new Date()) }),
  );
  return <SaveLine ticked>{t('field.locks.yours', { list: list.join(', ') })}</SaveLine>;
}
