import Link from 'next/link';

export interface FindingLine {
  kind: string;
  weight: 'blocks' | 'confirm' | 'note';
  /** Number in the working order; null where it concerns the whole job. */
  position: number | null;
  title: string;
  text: string;
  href: string;
}

const groups = [
  {
    weight: 'blocks',
    title: 'Blocks the report',
    ink: 'text-oxide',
    border: 'border-oxide',
    none: 'Nothing is missing.',
  },
  {
    weight: 'confirm',
    title: 'To be confirmed',
    ink: 'text-brass',
    border: 'border-brass',
    none: 'Nothing has to be confirmed.',
  },
  { weight: 'note', title: 'For the record', ink: 'text-ink', border: 'border-ink2', none: 'Nothing else.' },
] as const;

/** What was found, grouped by weight and in working order, each with the way to where it is put right. */
export function FindingsList({ findings, boardHref }: { findings: FindingLine[]; boardHref: string }) {
  return groups.map(({ weight, title, ink, border, none }) => {
    const mine = findings.filter((finding) => finding.weight === weight);
    const unlinked = mine.filter(({ kind }) => kind === 'no-as-left').length;
    return (
      <section key={weight} aria-labelledby={`findings-${weight}`} className="mt-6 first:mt-0">
        <h2 id={`findings-${weight}`} className="flex items-baseline gap-3 text-lg font-semibold">
          <span className={mine.length > 0 ? ink : ''}>{title}</span>
          <span className="font-mono text-base font-normal text-ink2">{mine.length}</span>
        </h2>
        {mine.length === 0 && <p className="text-ink2">{none}</p>}
        {unlinked > 1 && (
          <p className="mt-1 max-w-prose">
            {unlinked} sheets have no readings as left. Where nothing was done, say “as left = as found” for all of them
            at once{' '}
            <Link href={boardHref} className="text-blue underline">
              on the job’s board
            </Link>
            .
          </p>
        )}
        {mine.length > 0 && (
          <ol className={`mt-2 border-l-4 ${border}`}>
            {mine.map((finding) => (
              <li
                key={`${finding.kind}${finding.position}${finding.text}`}
                className="grid grid-cols-[2.5rem_minmax(0,1fr)] gap-x-2 border-b border-hair py-1.5 pl-3"
              >
                <span className="pt-2.5 font-mono text-sm text-ink2">{finding.position ?? ''}</span>
                <div>
                  <Link
                    href={finding.href}
                    className="inline-flex min-h-9 items-center font-medium text-blue underline"
                  >
                    {finding.title}
                  </Link>
                  <p>{finding.text}</p>
                </div>
              </li>
            ))}
          </ol>
        )}
      </section>
    );
  });
}
