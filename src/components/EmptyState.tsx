import type { ReactNode } from 'react';

/** What a list shows when it holds nothing: why, and what to do first. */
export function EmptyState({
  title,
  children,
  action,
}: {
  title: string;
  children?: ReactNode;
  action?: ReactNode;
}) {
  return (
    <div className="my-4 max-w-[66ch] border border-dashed border-edge px-5 py-4">
      <p className="m-0 font-bold">{title}</p>
      {children && <div className="mt-1 text-muted">{children}</div>}
      {action && <div className="mt-3">{action}</div>}
    </div>
  );
}
