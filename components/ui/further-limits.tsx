import type { MarkKind } from '@/components/plots/verdict-ink';
import { VerdictMark } from '@/components/ui/verdict-mark';

export interface FurtherLimit {
  label: string;
  /** As they are shown, with their unit. */
  value: string;
  limit: string;
  verdict: MarkKind;
  words: string;
}

/** Further figures of the same readings, each with its own limit: what it is, what it came to, what it may be, the verdict. */
export function FurtherLimits({ limits, name }: { limits: readonly FurtherLimit[]; name: string }) {
  if (limits.length === 0) return null;
  return (
    <table className="mt-2 border-collapse text-left text-[15px]">
      <caption className="sr-only">{name}</caption>
      <thead>
        <tr className="border-b-[1.5px] border-ink text-sm text-ink2">
          <th scope="col" className="py-0.5 pr-4 font-semibold">
            Further figures
          </th>
          <th scope="col" className="px-2 py-0.5 text-right font-semibold">
            result
          </th>
          <th scope="col" className="px-2 py-0.5 text-right font-semibold">
            limit
          </th>
          <th scope="col" className="py-0.5 pl-4 font-semibold">
            verdict
          </th>
        </tr>
      </thead>
      <tbody>
        {limits.map(({ label, value, limit, verdict, words }) => (
          <tr key={label} className="border-b border-hair">
            <th scope="row" className="py-0.5 pr-4 font-normal">
              {label}
            </th>
            <td className="whitespace-nowrap px-2 py-0.5 text-right font-mono tabular-nums">{value}</td>
            <td className="whitespace-nowrap px-2 py-0.5 text-right font-mono tabular-nums">{limit}</td>
            <td className="py-0.5 pl-4">
              <VerdictMark verdict={verdict} words={words} />
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
