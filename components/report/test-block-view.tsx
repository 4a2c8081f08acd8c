import { Plot } from '@/components/plots/plot';
import { SetUpSketch } from '@/components/sketches/set-up-sketch';
import { VerdictMark } from '@/components/ui/verdict-mark';
import type { PassBlock, TestBlock } from '@/lib/reporting/report-model';
import { REPORT_WORDS } from '@/lib/reporting/words';
import { ByWidth } from './by-width';
import { CorrectedReadings } from './corrected-readings';
import { Facts, known } from './facts';
import { finalPass } from './final-pass';
import { FinalResult } from './final-result';
import { PassReadings } from './pass-readings';
import { ReportSection } from './report-section';
import { TestPhotos } from './test-photos';

/** Everything about one test: at the left the set-up and what is judged by what, at the right plots and readings, the limit rule below. */
export function TestBlockView({ block, photosAt }: { block: TestBlock; photosAt: string }) {
  return (
    <div id={`test-${block.order}`} className="scroll-mt-4 print:break-inside-avoid">
      <ReportSection
        title={`${block.order} · ${block.title}`}
        beside={
          <p className="text-sm text-ink2">
            {block.componentWords} · <span className="font-mono">{block.reference}</span>
          </p>
        }
      >
        {block.leftOut ? (
          <LeftOut leftOut={block.leftOut} />
        ) : block.check ? (
          <PassReadings passes={block.passes} of={block.title} />
        ) : (
          <Measured block={block} />
        )}
        <TestPhotos photos={block.photos} at={photosAt} />
        {block.remark && (
          <p className="mt-3">
            <span className="font-semibold">{REPORT_WORDS.block.remark}:</span> {block.remark}
          </p>
        )}
        <CorrectedReadings block={block} />
      </ReportSection>
    </div>
  );
}

function LeftOut({ leftOut }: { leftOut: NonNullable<TestBlock['leftOut']> }) {
  const words = [`${REPORT_WORDS.block.leftOut}: ${leftOut.reason}`, leftOut.text ?? ''].filter(Boolean).join('. ');
  return <VerdictMark verdict="left-out" words={words} />;
}

function Measured({ block }: { block: TestBlock }) {
  const words = REPORT_WORDS.block;
  // A method with many tables takes the whole width below its pictures.
  const many = block.passes.some((pass) => pass.tables.length > 2 || isWide(pass));
  const arithmetic = finalPass(block)?.judgement?.toleranceArithmetic;
  return (
    <>
      <div className="grid grid-cols-[minmax(0,1fr)] gap-x-8 gap-y-4 lg:grid-cols-[20rem_minmax(0,1fr)] print:grid-cols-[19rem_minmax(0,1fr)]">
        <div className="grid min-w-0 content-start gap-x-8 gap-y-2 sm:grid-cols-[20rem_minmax(0,1fr)] lg:grid-cols-[minmax(0,1fr)] print:grid-cols-[minmax(0,1fr)]">
          <SetUpSketch spec={block.sketch} component={block.component} />
          <Facts
            small
            facts={known([
              [words.judged, block.judgedFigure],
              [words.tolerance, arithmetic ? `${block.toleranceWords}; ${arithmetic}` : block.toleranceWords],
              [words.source, block.toleranceSource],
              [words.direction, block.directionWords],
              [words.instruments, block.instruments.join(' · ')],
              [words.ruleSet, block.ruleSet ?? null],
            ])}
          />
        </div>
        <div className="grid min-w-0 grid-cols-[minmax(0,1fr)] content-start gap-4">
          <Plots block={block} />
          {!many && <PassReadings passes={block.passes} of={block.title} />}
        </div>
      </div>
      {many && (
        <div className="mt-4">
          <PassReadings passes={block.passes} of={block.title} />
        </div>
      )}
      <FinalResult block={block} />
    </>
  );
}

/** A table of many columns would scroll beside the sketch. */
const isWide = (pass: PassBlock) => pass.tables.some((table) => table.columns.length > 7);

const plotOf = (pass: PassBlock, widthPx: number, heightPx: number) =>
  pass.plot && (
    <Plot series={pass.plot} toleranceUm={pass.judgement?.toleranceUm ?? null} widthPx={widthPx} heightPx={heightPx} />
  );

/** Plot as found, as left, or both beside each other. */
function Plots({ block }: { block: TestBlock }) {
  const plotted = block.passes.filter((pass) => pass.plot && pass.kind !== 'adjusting').slice(-2);
  if (plotted.length === 0) return null;
  return (
    <div className="flex flex-wrap gap-x-6 gap-y-3">
      {plotted.map(
        (pass) =>
          pass.plot && (
            <figure key={`${pass.kindWords}${pass.takenAt}`} className="min-w-0 max-w-md flex-1 basis-60">
              <figcaption className="text-sm font-semibold text-ink2">{pass.kindWords}</figcaption>
              <ByWidth
                wide={plotted.length === 2 ? plotOf(pass, 300, 190) : plotOf(pass, 440, 220)}
                narrow={plotOf(pass, 270, 190)}
              />
            </figure>
          ),
      )}
    </div>
  );
}
