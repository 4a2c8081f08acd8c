import { FurtherLimits } from '@/components/ui/further-limits';
import { LimitRule } from '@/components/ui/limit-rule';
import { VerdictMark } from '@/components/ui/verdict-mark';
import type { TestBlock } from '@/lib/reporting/report-model';
import { sentence } from '@/lib/reporting/report-text';
import {
  becauseOf,
  furtherFigures,
  judgedFigureText,
  limitText,
  passResultText,
  ruleDeviation,
} from '@/lib/reporting/result-text';
import { REPORT_WORDS, VERDICT_WORDS } from '@/lib/reporting/words';
import { ByWidth } from './by-width';
import { finalPass } from './final-pass';

/** The limit rule of the final result over the whole width, the verdict in words below it. */
export function FinalResult({ block }: { block: TestBlock }) {
  const pass = finalPass(block);
  if (!pass?.judgement || pass.resultMm === null) return null;
  const { verdict, toleranceUm, limitUm, marginUm, direction, local } = pass.judgement;
  // A figure without a sign never has words for its direction, and is never below zero.
  const signed = block.passes.some((each) => each.judgement?.signed);
  const words = REPORT_WORDS.block;
  const beside = [
    becauseOf(pass.judgement),
    pass.resultWords ?? '',
    marginUm === null ? '' : `${judgedFigureText(marginUm, pass)} ${words.margin}`,
    local
      ? `${words.local} ${judgedFigureText(local.deviationUm, pass)} ${words.over} ${local.lengthMm} mm, T ${limitText(local.toleranceUm, pass.resultUnit)}, ${VERDICT_WORDS[local.verdict]}`
      : '',
  ].filter((part) => part !== '');
  const rule = (widthPx: number) => (
    <LimitRule
      deviationUm={ruleDeviation(pass)}
      toleranceUm={toleranceUm}
      limitUm={limitUm}
      direction={direction}
      signed={signed}
      verdict={verdict}
      shown={pass.resultMm}
      unit={pass.resultUnit}
      widthPx={widthPx}
    />
  );
  return (
    <div className="mt-4 break-inside-avoid">
      <ByWidth wide={rule(900)} medium={rule(620)} narrow={rule(300)} />
      <p className="mt-1 flex flex-wrap items-center gap-x-4">
        <VerdictMark verdict={verdict} words={`${sentence(pass.kindWords)} ${passResultText(pass)}`} />
        <span className="text-ink2">{beside.join(' · ')}</span>
      </p>
      <FurtherLimits
        limits={furtherFigures(pass.judgement, { text: pass.resultMm, unit: pass.resultUnit })}
        name={`${block.title}, ${words.further}`}
      />
    </div>
  );
}
