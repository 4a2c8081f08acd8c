import { DrawingSvg } from '@/components/plots/drawing-svg';
import { driftDrawing } from '@/components/plots/drift-geometry';
import { VerdictMark } from '@/components/ui/verdict-mark';
import type { Verdict } from '@/lib/sheet/types';
import type { ShownIn } from '@/standards/types';

interface DriftTest {
  key: string;
  title: string;
  component: string;
  toleranceMm: string | null;
  /** Unit of its figures; null: mm. */
  unit: ShownIn | null;
  points: { reportId: string; measuredOn: string; asLeftMm: string; verdict: Verdict | null }[];
}

/** How each test that was signed more than once has moved; small, side by side, to be read at a glance. */
export function DriftPlots({ tests }: { tests: DriftTest[] }) {
  return (
    <ul className="grid grid-cols-[repeat(auto-fill,minmax(min(19rem,100%),1fr))] gap-x-6 gap-y-5">
      {tests.map((test) => {
        const verdict = test.points.at(-1)?.verdict;
        return (
          <li key={test.key} className="border-t border-hair pt-2">
            <p className="font-medium leading-snug">{test.title}</p>
            <p className="text-sm text-ink2">
              {[test.component, test.unit ?? ''].filter((part) => part !== '').join(' · ')}
            </p>
            <DrawingSvg
              drawing={driftDrawing(test.points, test.toleranceMm, test.title, test.unit ?? 'mm')}
              className="mt-1"
            />
            {verdict && <VerdictMark verdict={verdict} className="text-sm" />}
          </li>
        );
      })}
    </ul>
  );
}
