import './field.css';
import type { ReactNode } from 'react';

interface FieldPageProps {
  header: ReactNode;
  /** Line of what is unsent and where it is safe; on every field screen. */
  banner: ReactNode;
  children: ReactNode;
  /** Stands beside the words in landscape, below them in portrait. */
  answer?: ReactNode;
  footer?: ReactNode;
}

/** A phone page: title strip, words and picture, the answer at the bottom where the thumb is; two columns in landscape. */
export function FieldPage({ header, banner, children, answer, footer }: FieldPageProps) {
  return (
    <div className="field-page bg-paper text-[1.125rem] text-ink">
      <header className="field-head">{header}</header>
      <main className="field-main">
        {/* With an answer below, the words scroll under it: by keyboard too. */}
        <div className="field-words" tabIndex={answer ? 0 : undefined}>
          {children}
        </div>
        {answer && <div className="field-answer">{answer}</div>}
      </main>
      <footer className="field-foot">
        {banner}
        {footer}
      </footer>
    </div>
  );
}
