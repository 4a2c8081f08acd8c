import Link from 'next/link';
import type { MarkKind } from '@/components/plots/verdict-ink';
import { VerdictMark } from '@/components/ui/verdict-mark';

export interface PathSheet {
  id: string;
  position: number;
  title: string;
  /** `S1 · Z1`. */
  component: string;
  mark: MarkKind;
  /** Word beside the mark, where it is not the mark's own. */
  words?: string;
  /** `concave 0.0240`, the reason why it is left out. */
  result: string;
  /** The one to go to next. */
  isNext: boolean;
}

/** The plan as a scribed line with a tick for each sheet, in working order; every line leads to its sheet. */
export function PlanPath({ jobId, sheets }: { jobId: string; sheets: PathSheet[] }) {
  return (
    <ol className="relative">
      <span aria-hidden="true" className="absolute inset-y-0 left-[3.4rem] w-0.5 bg-line" />
      {sheets.map((sheet) => (
        <li key={sheet.id} className="relative border-b border-hair">
          <Link
            href={`/jobs/${jobId}/sheets/${sheet.id}`}
            aria-current={sheet.isNext ? 'step' : undefined}
            className={`grid min-h-12 grid-cols-[2.5rem_1.8rem_minmax(0,1fr)] items-center gap-y-0.5 py-1.5 hover:bg-blue-wash sm:grid-cols-[2.5rem_1.8rem_minmax(0,1fr)_11.5rem_minmax(5.5rem,10rem)] ${sheet.isNext ? 'bg-brass-wash' : ''}`}
          >
            <span className="pl-1 font-mono text-[15px] text-ink2">{sheet.position}</span>
            <span aria-hidden="true" className={`ml-1 h-0.5 w-3.5 ${sheet.isNext ? 'bg-brass' : 'bg-ink'}`} />
            <span>
              {sheet.title} <span className="text-[15px] text-ink2">{sheet.component}</span>
              {sheet.isNext && <span className="sr-only">, next to measure</span>}
            </span>
            <span className="max-sm:col-start-3">
              <VerdictMark verdict={sheet.mark} words={sheet.words} />
            </span>
            <span className="pr-1 text-[15px] text-ink2 max-sm:col-start-3">{sheet.result}</span>
          </Link>
        </li>
      ))}
    </ol>
  );
}
