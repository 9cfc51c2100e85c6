import { LockBox } from '../../../components/field/LockBox';
import { TagBox } from '../../../components/field/TagBox';
import { useWords } from '../../../components/words';
import { useFieldJob } from '../job/useFieldJob';
import { locksOn } from '../job/ownLocks';

/** The isolators in their order with the locks known on them; the one in question stands out by a bar and the word "here". */
export function LocksPicture({ isolator }: { isolator?: string | undefined }) {
  const { t } = useWords();
  const { pack, state } = useFieldJob();
  const locks = locksOn(state);
  return (
    <ol className="m-0 grid list-none gap-0 border-2 border-ink bg-sheet p-0">
      {pack.plan.isolators.map(({ isolator: planned }, index) => (
        <li
          key={planned.tag}
          className={`flex flex-wrap items-center gap-x-2 gap-y-1 border-rule px-2 py-1.5 text-[0.95rem] leading-tight not-first:border-t ${
            planned.tag === isolator ? 'border-l-8 border-l-ink' : 'border-l-8 border-l-transparent'
          }`}
        >
          <span className="font-mono text-muted">{index + 1}</span>
          <TagBox>{planned.tag}</TagBox>
          <span className="min-w-0 flex-1">
            {planned.tag === isolator && <b>{t('field.locks.here')} </b>}
            {planned.location}
          </span>
          {locks
            .filter((lock) => lock.isolator === planned.tag)
            .map((lock) => (
              <LockBox key={lock.entry} isolator={lock.isolator} lock={lock.lock} />
            ))}
        </li>
      ))}
    </ol>
  );
}
