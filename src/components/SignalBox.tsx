import type { ReactNode } from 'react';
import { useWords } from './words';

export type Signal = 'danger' | 'warning' | 'caution' | 'notice';

const heads: Record<Signal, string> = {
  danger: 'bg-danger text-white',
  warning: 'bg-warning text-on-signal',
  caution: 'bg-caution text-on-signal',
  notice: 'bg-mandatory text-white',
};

/** The safety alert triangle of ANSI Z535; a notice is about damage only and carries a square instead. */
function SignalShape({ signal }: { signal: Signal }) {
  return (
    <svg viewBox="0 0 24 22" className="h-5 w-5 shrink-0" aria-hidden="true">
      {signal === 'notice' ? (
        <path d="M2 1h20v20H2z" fill="none" stroke="currentColor" strokeWidth="2.5" />
      ) : (
        <path d="M12 0 24 22H0z" fill="currentColor" />
      )}
      <path
        d="M12 7v7M12 16.5v2.5"
        strokeWidth="2.5"
        stroke={signal === 'notice' ? 'currentColor' : 'var(--cut)'}
      />
    </svg>
  );
}

const cuts: Record<Signal, string> = {
  danger: '[--cut:#c8102e]',
  warning: '[--cut:#ff7900]',
  caution: '[--cut:#f9e300]',
  notice: '',
};

/** A safety message: signal word with its colour and shape, then what it says in ink on paper. */
export function SignalBox({ signal, children }: { signal: Signal; children: ReactNode }) {
  const { t } = useWords();
  return (
    <div role="note" className="border-2 border-ink bg-sheet">
      <p
        className={`m-0 flex items-center gap-2 px-3 py-1 text-lg font-bold tracking-wide ${heads[signal]} ${cuts[signal]}`}
      >
        <SignalShape signal={signal} />
        {t(`app.signal.${signal}`)}
      </p>
      <div className="px-3 py-2">{children}</div>
    </div>
  );
}
