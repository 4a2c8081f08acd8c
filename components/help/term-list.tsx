import type { GlossaryTerm } from '@/standards/glossary';

/** Terms with what they mean. */
export function TermList({ terms, className = '' }: { terms: readonly GlossaryTerm[]; className?: string }) {
  return (
    <dl className={`grid gap-2 ${className}`}>
      {terms.map(({ term, also, text }) => (
        <div key={term}>
          <dt className="font-semibold">
            {term}
            {also && <span className="font-normal text-ink2">, {also.join(', ')}</span>}
          </dt>
          <dd className="max-w-prose">{text}</dd>
        </div>
      ))}
    </dl>
  );
}
