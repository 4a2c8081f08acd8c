import type { ReactNode } from 'react';

/** Says what would stand here and how it comes here; never only "no data". */
export function EmptyState({ title, children, action }: { title: string; children?: ReactNode; action?: ReactNode }) {
  return (
    <div className="border-y border-line py-8">
      <p className="text-lg font-semibold">{title}</p>
      {children && <div className="mt-1 max-w-prose text-ink2">{children}</div>}
      {action && <div className="mt-4">{action}</div>}
    </div>
  );
}
