import { useWords } from '../../../components/words';
import type { DeadBand } from './deadBand';

/** The signal word of ANSI Z535 with its triangle, over the whole width. */
export function SignalHead({ band }: { band: DeadBand }) {
  const { t } = useWords();
  const isLive = band === 'live';
  return (
    <header
      className={`flex items-center gap-3 px-4 py-3.5 ${isLive ? 'bg-white text-danger' : 'bg-warning text-on-signal'}`}
    >
      <svg viewBox="0 0 42 36" className="h-9 w-[2.6rem] shrink-0" aria-hidden="true">
        <path d="M21 0 42 36H0z" fill="currentColor" />
        <path d="M21 12v12M21 28v4" strokeWidth="3.6" stroke={isLive ? '#ffffff' : '#ff7900'} />
      </svg>
      <p className="m-0 text-[1.9rem] leading-none font-bold tracking-wide">
        {t(isLive ? 'app.signal.danger' : 'app.signal.warning')}
      </p>
    </header>
  );
}
