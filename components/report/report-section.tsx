import type { ReactNode } from 'react';

/** One part of the document under its heading; headings, not landmarks, since there are dozens. */
export function ReportSection({ title, beside, children }: { title: string; beside?: ReactNode; children: ReactNode }) {
  return (
    <section className="mt-7">
      <div className="mb-1.5 flex flex-wrap items-baseline justify-between gap-x-4 border-t-[1.5px] border-ink pt-2.5 break-after-avoid">
        <h2 className="text-lg font-semibold">{title}</h2>
        {beside}
      </div>
      {children}
    </section>
  );
}
