'use client';

import { Plot } from '@/components/plots/plot';
import { FurtherLimits } from '@/components/ui/further-limits';
import { LimitRule } from '@/components/ui/limit-rule';
import { VerdictMark } from '@/components/ui/verdict-mark';
import { furtherFigures } from '@/lib/reporting/result-text';
import { VERDICT_WORDS } from '@/lib/reporting/words';
import { shownUnit, toleranceShown, withUnit } from '@/lib/sheet/shown-unit';
import type { SheetRules } from '@/lib/sheet/types';
import type { ShownIn } from '@/standards/types';
import { isJudged, resultWords } from './result-words';
import { useEvaluated, useOpenPass } from './sheet-context';
import { useWidth } from './use-width';

/** The plot, drawn again with every reading; nothing where a method has none. */
export function LivePlot({ heightPx }: { heightPx: number }) {
  const { box, widthPx } = useWidth(320);
  const { session, passId } = useOpenPass();
  const outcome = useEvaluated(session, passId, (evaluated) => evaluated.outcome);
  const series = outcome.state === 'empty' ? null : outcome.plot;
  const toleranceUm = isJudged(outcome) ? outcome.judgement.toleranceUm : null;
  return (
    <div ref={box} className="min-w-0">
      {series && (
        <Plot series={series} toleranceUm={toleranceUm} widthPx={Math.min(widthPx, 620)} heightPx={heightPx} />
      )}
    </div>
  );
}

/** Further figures of the same readings, below what stays in view: their table is higher than a tablet has room for. */
export function LiveFurtherLimits() {
  const { session, passId } = useOpenPass();
  const outcome = useEvaluated(session, passId, (evaluated) => evaluated.outcome);
  if (!isJudged(outcome)) return null;
  const shown = { text: outcome.displayed.textMm, unit: shownUnit(outcome.displayed) };
  return <FurtherLimits limits={furtherFigures(outcome.judgement, shown)} name="Further limits" />;
}

/** Limit rule, verdict in words and the distance to the limit. */
export function LiveResult(props: { rules: SheetRules; signed: boolean; shownIn: ShownIn; items?: number }) {
  const { rules, signed, shownIn, items } = props;
  const { session, passId } = useOpenPass();
  const outcome = useEvaluated(session, passId, (evaluated) => evaluated.outcome);
  const judged = isJudged(outcome) ? outcome : null;
  const words = resultWords(outcome, items);
  const local = judged?.judgement.local;
  const unit = judged ? shownUnit(judged.displayed) : shownIn;
  const { box, widthPx } = useWidth(600);
  const check = items !== undefined;
  return (
    <div ref={box} className="grid gap-1">
      {!check && (
        <LimitRule
          deviationUm={judged?.result.deviation ?? null}
          toleranceUm={judged ? judged.judgement.toleranceUm : (rules.tolerance?.baseUm ?? null)}
          direction={judged?.judgement.direction ?? (signed ? rules.direction : 'either')}
          signed={judged?.result.signed ?? signed}
          verdict={judged?.judgement.verdict ?? null}
          shown={judged?.displayed.textMm ?? null}
          unit={unit}
          widthPx={Math.min(widthPx, 680)}
        />
      )}
      <p className="flex flex-wrap items-baseline gap-x-4 gap-y-1">
        <VerdictMark verdict={words.mark} words={words.verdict} className="text-lg leading-6" />
        <span className="text-ink2">{words.beside}</span>
      </p>
      {local && (
        <p className="text-sm text-ink2">
          Over any {local.lengthMm} mm: {withUnit(toleranceShown(local.deviationUm, unit), unit)} of{' '}
          {withUnit(toleranceShown(local.toleranceUm, unit), unit)}, {VERDICT_WORDS[local.verdict]}
        </p>
      )}
      {judged?.judgement.toleranceArithmetic && (
        <p className="text-sm text-ink2">
          T, µm: <span className="font-mono">{judged.judgement.toleranceArithmetic}</span>
        </p>
      )}
    </div>
  );
}
