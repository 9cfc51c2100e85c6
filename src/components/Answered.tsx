import type { ReactNode } from 'react';
import { Loading } from './Loading';
import { ProblemMessage } from './ProblemMessage';

interface AnsweredProps<T> {
  query: { data: T | undefined; error: unknown };
  children: (data: T) => ReactNode;
}

/** Shows a query's answer; before it, that it loads; without it, what happened. A failed refresh keeps the last answer and says so. */
export function Answered<T>({ query, children }: AnsweredProps<T>) {
  return (
    <>
      {query.error ? <ProblemMessage error={query.error} /> : null}
      {query.data === undefined ? query.error ? null : <Loading /> : children(query.data)}
    </>
  );
}
