import { DrawingSvg } from '@/components/plots/drawing-svg';
import type { MarkKind } from '@/components/plots/verdict-ink';
import { verdictMark } from '@/components/plots/verdict-mark-geometry';
import { SHORT_VERDICT_WORDS, VERDICT_WORDS } from '@/lib/reporting/words';

const INK_CLASS: Record<MarkKind, string> = {
  'within-tolerance': 'text-blue',
  'out-of-tolerance': 'text-oxide',
  undecided: 'text-brass',
  disturbed: 'text-brass',
  'for-information': 'text-ink',
  'not-measured': 'text-ink2',
  'left-out': 'text-ink2',
};

/** The limit rule in small and the verdict's word. `words` replaces the word (`within tolerance, by 4 of 5 positions`). */
export function VerdictMark(props: { verdict: MarkKind; words?: string; short?: boolean; className?: string }) {
  const { verdict, short, className } = props;
  const words = props.words ?? (short ? SHORT_VERDICT_WORDS : VERDICT_WORDS)[verdict];
  return (
    <span className={`inline-flex items-center gap-2 font-semibold ${INK_CLASS[verdict]} ${className ?? ''}`}>
      <DrawingSvg drawing={verdictMark(verdict)} fixed decorative className="shrink-0" />
      <span>{words}</span>
    </span>
  );
}
