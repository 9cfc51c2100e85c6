import type { ReactNode } from 'react';

function Tick() {
  return (
    <svg viewBox="0 0 16 16" className="h-4 w-4 shrink-0" aria-hidden="true">
      <path d="M1.2 1.2h13.6v13.6H1.2z" fill="none" stroke="currentColor" strokeWidth="2.4" />
      <path d="m4.2 8.2 2.6 2.8 5-6" fill="none" stroke="currentColor" strokeWidth="2" />
    </svg>
  );
}

/** The line above the answers that says what is safe: a tick only when the store has confirmed. A live region. */
export function SaveLine({
  ticked,
  children,
  end,
}: {
  ticked: boolean;
  children: ReactNode;
  end?: ReactNode;
}) {
  return (
    <div className="save-line flex min-h-7 items-center gap-2 border-t border-rule bg-paper px-4 text-[0.85rem] leading-tight text-muted">
      <span className={ticked ? 'text-ink' : 'invisible'}>
        <Tick />
      </span>
      <p role="status" className="m-0 flex-1 py-0.5">
        {children}
      </p>
      {end}
    </div>
  );
}
