import type { FindingView } from '../../../shared/api/panels';
import { useWords } from '../words';

type Harm = FindingView['harm'];

// Red where somebody can be hurt, blue (notice) where only equipment suffers, ink for the rest: the ANSI Z535 meanings.
const looks: Record<Harm, string> = {
  hurts: 'border-danger bg-danger text-white',
  damages: 'border-mandatory bg-mandatory text-white',
  fails: 'border-ink bg-ink text-paper',
  doubt: 'border-ink bg-sheet text-ink',
  tells: 'border-edge bg-sheet text-muted',
};
const shapes: Record<Harm, string> = {
  hurts: 'M6 0 12 11H0z',
  damages: 'M0 0h11v11H0z',
  fails: 'M1 1 10 10M10 1 1 10',
  doubt: 'M5.5 0 11 5.5 5.5 11 0 5.5z',
  tells: 'M5.5 0a5.5 5.5 0 1 0 .01 0z',
};

/** What a finding does, as a word with a shape and a colour. */
export function HarmMark({ harm }: { harm: Harm }) {
  const { t } = useWords();
  return (
    <span className={`inline-flex items-center gap-1.5 border-2 px-2 text-sm font-bold ${looks[harm]}`}>
      <svg viewBox="0 0 12 12" className="h-3 w-3" aria-hidden="true">
        <path
          d={shapes[harm]}
          fill={harm === 'fails' || harm === 'tells' ? 'none' : 'currentColor'}
          stroke={harm === 'fails' || harm === 'tells' ? 'currentColor' : 'none'}
          strokeWidth="2"
        />
      </svg>
      {t(`office.harm.${harm}`)}
    </span>
  );
}
