import Link from 'next/link';
import { ProvenanceLine } from '@/components/catalogue/tolerance-table';
import type { ReadingUsed } from '@/lib/explaining/explain-outcome';
import type { Explanation } from '@/lib/explaining/explanation';

/**
 * Step by step: what is done, its formula, the same with the figures put in, what it gives. `methodsAt`: where the pages of the methods
 * stand, to lead there.
 */
export function ExplanationTable(props: {
  explanation: Explanation & { readings?: ReadingUsed[] };
  methodsAt?: string;
}) {
  const { explanation, methodsAt } = props;
  const { method, title, steps, ruleSet, source, readings } = explanation;
  return (
    <div className="grid gap-3">
      <ol className="grid gap-2">
        {steps.map((step, index) => (
          <li key={index} className="border-l-2 border-line pl-3">
            <p className="text-[15px]">{step.what}</p>
            <p className="flex flex-wrap gap-x-3 font-mono text-sm text-ink2">
              <span>{step.formula}</span>
              {step.withNumbers && <span className="break-words">{step.withNumbers}</span>}
            </p>
            <p className="font-mono text-[15px] font-medium">{step.value}</p>
          </li>
        ))}
      </ol>
      {readings && readings.length > 0 && (
        <details>
          <summary className="inline-flex min-h-11 cursor-pointer items-center text-blue underline">
            The {readings.length} entries that it rests on, as they were typed
          </summary>
          <ul className="columns-1 gap-x-8 text-sm sm:columns-2">
            {readings.map(({ label, figure, pointer }) => (
              <li key={pointer}>
                {label}: <span className="font-mono">{figure}</span>
              </li>
            ))}
          </ul>
        </details>
      )}
      <div className="text-sm text-ink2">
        <ProvenanceLine provenance={source} />
        <p>
          Rule set <span className="font-mono">{ruleSet}</span>
        </p>
        {methodsAt && method !== 'function-check' && (
          <p>
            <Link
              href={`${methodsAt}/${method}`}
              className="inline-flex min-h-11 items-center text-[15px] text-blue underline"
            >
              The method: {title}
            </Link>
          </p>
        )}
      </div>
    </div>
  );
}
