import type { ReactNode } from 'react';

/** Heading of a page, a quiet note beside it, and at the right what the page is for. */
export function PageTitle({ children, note, action }: { children: ReactNode; note?: ReactNode; action?: ReactNode }) {
  return (
    <div className="mb-5 flex flex-wrap items-end justify-between gap-x-6 gap-y-3">
      <div className="flex flex-wrap items-baseline gap-x-4 gap-y-1">
        <h1 className="text-2xl font-semibold">{children}</h1>
        {note && <p className="text-sm text-ink2">{note}</p>}
      </div>
      {action}
    </div>
  );
}

export function SectionTitle({ children, note, id }: { children: ReactNode; note?: ReactNode; id?: string }) {
  return (
    <div className="mb-2 mt-8 flex flex-wrap items-baseline gap-x-4">
      <h2 id={id} className="text-lg font-semibold">
        {children}
      </h2>
      {note && <p className="text-sm text-ink2">{note}</p>}
    </div>
  );
}
