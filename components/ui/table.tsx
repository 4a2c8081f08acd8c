import type { ComponentProps, ReactNode } from 'react';

/**
 * A plain table under a ruled head. The caption is for screen readers unless `showCaption`; the wrapper scrolls on a narrow screen
 * and can be reached with the keyboard, so that no column is lost.
 */
export function Table(props: { caption: string; showCaption?: boolean; children: ReactNode; className?: string }) {
  const { caption, showCaption, children, className = '' } = props;
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a region that scrolls must be reachable by keyboard
    <section className="overflow-x-auto" tabIndex={0} aria-label={caption}>
      <table className={`w-full border-collapse text-left ${className}`}>
        <caption className={showCaption ? 'pb-2 text-left font-semibold' : 'sr-only'}>{caption}</caption>
        {children}
      </table>
    </section>
  );
}

export function TableHead({ children }: { children: ReactNode }) {
  return (
    <thead className="border-b-[1.5px] border-ink">
      <tr>{children}</tr>
    </thead>
  );
}

export function HeadCell({ figure, className = '', ...rest }: ComponentProps<'th'> & { figure?: boolean }) {
  return (
    <th
      scope="col"
      className={`px-2.5 py-2 align-bottom text-sm font-semibold text-ink2 first:pl-0 last:pr-0 ${figure ? 'text-right' : ''} ${className}`}
      {...rest}
    />
  );
}

export function Row({ className = '', ...rest }: ComponentProps<'tr'>) {
  return <tr className={`border-b border-hair ${className}`} {...rest} />;
}

/** `figure`: right-aligned in the mono face, the unit stands in the head. */
export function DataCell({ figure, className = '', ...rest }: ComponentProps<'td'> & { figure?: boolean }) {
  return (
    <td
      className={`px-2.5 py-2.5 align-baseline first:pl-0 last:pr-0 ${figure ? 'text-right font-mono tabular-nums' : ''} ${className}`}
      {...rest}
    />
  );
}

export function RowHead({ className = '', ...rest }: ComponentProps<'th'>) {
  return <th scope="row" className={`px-2.5 py-2.5 align-baseline font-medium first:pl-0 ${className}`} {...rest} />;
}
