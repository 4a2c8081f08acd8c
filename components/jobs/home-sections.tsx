import Link from 'next/link';
import type { ReactNode } from 'react';
import { LinkButton } from '@/components/ui/button';

export interface HomeJob {
  id: string;
  reference: string;
  serialNumber: string;
  machine: string;
  planMade: boolean;
  measured: number;
  planned: number;
  next: { id: string; position: number; title: string } | null;
}

/** A kind of thing that waits, and its lines. */
export function HomeSection({ title, children }: { title: string; children: ReactNode }) {
  return (
    <section aria-label={title} className="mt-6 first:mt-0">
      <h2 className="border-b-[1.5px] border-ink pb-1 text-lg font-semibold">{title}</h2>
      <ul>{children}</ul>
    </section>
  );
}

/** One line: what it is at the left, what to do at the right. */
export function HomeLine({ children, action }: { children: ReactNode; action?: ReactNode }) {
  return (
    <li className="flex flex-wrap items-center justify-between gap-x-6 gap-y-2 border-b border-hair py-2.5">
      <div className="min-w-0">{children}</div>
      {action}
    </li>
  );
}

export function MachineLine(props: { href: string; reference: string; serialNumber: string; machine: string }) {
  const { href, reference, serialNumber, machine } = props;
  return (
    <p className="flex flex-wrap items-baseline gap-x-4">
      <Link href={href} className="inline-flex min-h-9 items-center font-medium text-blue underline">
        {reference}
      </Link>
      <span className="font-mono">{serialNumber}</span>
      <span className="text-ink2">{machine}</span>
    </p>
  );
}

/** A job in work, with the way straight to its next sheet. The first line has the strong action. */
export function JobToMeasure({ job, first }: { job: HomeJob; first: boolean }) {
  const variant = first ? 'strong' : 'plain';
  const { next } = job;
  return (
    <HomeLine
      action={
        job.planMade ? (
          <LinkButton variant={variant} href={next ? `/jobs/${job.id}/sheets/${next.id}` : `/jobs/${job.id}`}>
            {next ? `Go to ${next.position}` : 'Open the plan'}
          </LinkButton>
        ) : (
          <LinkButton variant={variant} href={`/jobs/${job.id}/plan`}>
            Make the plan
          </LinkButton>
        )
      }
    >
      <MachineLine href={`/jobs/${job.id}`} {...job} />
      <p className="text-[15px] text-ink2">
        {job.planMade ? `${job.measured} of ${job.planned} measured` : 'The plan has not been made.'}
        {next && job.planMade && ` · next: ${next.position} ${next.title}`}
      </p>
    </HomeLine>
  );
}
