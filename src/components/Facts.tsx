import type { ReactNode } from 'react';

/** Names and what they are, one a line; a fact nobody has is left out. */
export function Facts({ facts }: { facts: readonly (readonly [string, ReactNode])[] }) {
  return (
    <dl className="m-0 grid grid-cols-[minmax(7rem,auto)_1fr] gap-x-4 gap-y-1">
      {facts
        .filter(([, value]) => value !== null && value !== undefined && value !== '')
        .map(([name, value]) => (
          <div key={name} className="contents">
            <dt className="text-muted">{name}</dt>
            <dd className="m-0 wrap-anywhere">{value}</dd>
          </div>
        ))}
    </dl>
  );
}
