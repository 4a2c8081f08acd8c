import { ExplanationTable } from '@/components/explain/explanation';
import { SectionTitle } from '@/components/ui/page-title';
import { evaluateUnknown } from '@/lib/evaluation';
import { explain } from '@/lib/explaining/explain';
import { leavesOf } from '@/lib/explaining/methods/form-definition';
import type { MethodGuide } from '@/lib/explaining/methods/method-guide';

/** The worked example, computed now by the same code as every sheet. */
export function WorkedExample({ guide }: { guide: MethodGuide }) {
  const { words, input } = guide.example;
  const given = leavesOf(input).filter(([pointer]) => pointer !== '/method');
  return (
    <>
      <SectionTitle note="Invented readings, computed as this page was drawn">A worked example</SectionTitle>
      <p className="mb-3 max-w-prose">{words}</p>
      <ExplanationTable explanation={explain(input, evaluateUnknown(input))} />
      <details>
        <summary className="inline-flex min-h-11 cursor-pointer items-center text-blue underline">
          What went in, {given.length} entries
        </summary>
        <ul className="columns-1 gap-x-8 font-mono text-sm sm:columns-2">
          {given.map(([pointer, text]) => (
            <li key={pointer}>
              {pointer.slice(1).replaceAll('/', ' ')}: {text.replace(/^-/, '−')}
            </li>
          ))}
        </ul>
      </details>
    </>
  );
}
