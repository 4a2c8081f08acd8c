import type { ReactNode } from 'react';

export interface Fact {
  label: string;
  value: ReactNode;
}

/** Names at the left, what is known at the right; `columns: 2` sets short ones beside each other where there is room. */
export function Facts({ facts, columns = 1, small }: { facts: Fact[]; columns?: 1 | 2; small?: boolean }) {
  return (
    <dl className={`grid gap-x-8 ${columns === 2 ? 'sm:grid-cols-2' : ''} ${small ? 'text-sm' : ''}`}>
      {facts.map(({ label, value }) => (
        <div
          key={label}
          className={`grid gap-x-3 py-0.5 ${small ? 'grid-cols-[5.5rem_1fr]' : 'grid-cols-[7.5rem_1fr]'}`}
        >
          <dt className="text-ink2">{label}</dt>
          <dd className="min-w-0 break-words">{value}</dd>
        </div>
      ))}
    </dl>
  );
}

/** Only what is known. */
export const known = (entries: readonly (readonly [string, string | null])[]): Fact[] =>
  entries.flatMap(([label, value]) => (value ? [{ label, value }] : []));
