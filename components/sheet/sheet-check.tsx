'use client';

import { type RefObject, useMemo } from 'react';
import { LinkButton } from '@/components/ui/button';
import { DataCell, HeadCell, Row, RowHead, Table, TableHead } from '@/components/ui/table';
import { VerdictMark } from '@/components/ui/verdict-mark';
import { toleranceShown } from '@/lib/sheet/shown-unit';
import type { ShownIn, TestDefinition } from '@/standards/types';
import { isJudged, resultWords } from './result-words';
import { useEvaluated, useOpenPass } from './sheet-context';
import { passWords, type SheetData, type SheetPass } from './sheet-data';
import { type SheetFinding, sheetFindings } from './sheet-findings';
import type { SheetSession } from './sheet-session';

/** The whole sheet on one look: what is missing, with the way to it, and what every set of readings comes to. */
export function SheetCheck(props: {
  data: SheetData;
  passes: SheetPass[];
  pass: SheetPass;
  remark: string | null;
  headingRef: RefObject<HTMLHeadingElement | null>;
  onClose: () => void;
}) {
  const { data, passes, pass, remark, headingRef, onClose } = props;
  const { session, passId, confirmed } = useOpenPass();
  const evaluated = useEvaluated(session, passId, (now) => now);
  const findings = useMemo(
    () =>
      sheetFindings({
        evaluated,
        pass,
        passes,
        instruments: data.instruments,
        confirmed,
        remark,
        textOf: (pointer) => session.textOf(passId, pointer),
        today: data.readAt,
        check: isCheck(data),
      }),
    [evaluated, pass, passes, data, confirmed, remark, session, passId],
  );
  const missing = findings.filter(({ weight }) => weight === 'missing');
  const look = findings.filter(({ weight }) => weight === 'look');
  return (
    <section aria-labelledby="sheet-check" className="mb-5 border-[1.5px] border-ink bg-leaf px-5 py-4">
      <div className="flex items-start justify-between gap-4">
        <h2 id="sheet-check" ref={headingRef} tabIndex={-1} className="text-lg font-semibold outline-none">
          {missing.length === 0
            ? `Nothing is missing in the readings ${passWords(pass)}`
            : `${missing.length === 1 ? '1 thing is' : `${missing.length} things are`} missing in the readings ${passWords(pass)}`}
        </h2>
        <button type="button" className="min-h-12 px-2 text-blue underline" onClick={onClose}>
          Close the check
        </button>
      </div>
      <Findings findings={missing} ink="border-oxide" />
      {look.length > 0 && <p className="mt-2 font-medium text-brass">To be looked at</p>}
      <Findings findings={look} ink="border-brass" />
      <PassResults session={session} passes={passes} definition={data.definition} />
      {missing.length === 0 && <GoOn data={data} />}
    </section>
  );
}

function GoOn({ data: { job, neighbours } }: { data: SheetData }) {
  const { next } = neighbours;
  return (
    <div className="mt-4">
      {next ? (
        <LinkButton variant="strong" href={`/jobs/${job.id}/sheets/${next.id}`}>
          Go on with {next.position}: {next.title}
        </LinkButton>
      ) : (
        <LinkButton variant="strong" href={`/jobs/${job.id}`}>
          Back to the plan of {job.reference}
        </LinkButton>
      )}
    </div>
  );
}

function Findings({ findings, ink }: { findings: SheetFinding[]; ink: string }) {
  const { session, passId } = useOpenPass();
  if (findings.length === 0) return null;
  return (
    <ul className="mt-1 grid gap-0.5">
      {findings.map(({ label, message, pointer }) => (
        <li key={`${label}${message}${pointer}`} className={`border-l-4 pl-3 ${ink}`}>
          {pointer ? (
            <button
              type="button"
              className="min-h-9 text-left underline"
              onClick={() => session.inputOf(passId, pointer)?.focus()}
            >
              {label}: {message}
            </button>
          ) : (
            <span className="flex min-h-9 items-center">
              {label}: {message}
            </span>
          )}
        </li>
      ))}
    </ul>
  );
}

const isCheck = ({ definition }: SheetData) => definition.layout.kind === 'check-list';

function PassResults(props: { session: SheetSession; passes: SheetPass[]; definition: TestDefinition }) {
  const { session, passes, definition } = props;
  const { layout, shownIn: unit = 'mm' } = definition;
  const items = layout.kind === 'check-list' ? layout.items.length : undefined;
  const check = items !== undefined;
  return (
    <div className="mt-4">
      <Table caption="What every set of readings comes to">
        <TableHead>
          <HeadCell>Set of readings</HeadCell>
          {!check && <HeadCell figure>result, {unit}</HeadCell>}
          {!check && <HeadCell figure>T, {unit}</HeadCell>}
          {!check && <HeadCell figure>readings</HeadCell>}
          <HeadCell>verdict</HeadCell>
        </TableHead>
        <tbody>
          {passes.map((pass) => (
            <PassResult key={pass.id} session={session} pass={pass} unit={unit} items={items} />
          ))}
        </tbody>
      </Table>
    </div>
  );
}

function PassResult(props: { session: SheetSession; pass: SheetPass; unit: ShownIn; items?: number }) {
  const { session, pass, unit, items } = props;
  const outcome = useEvaluated(session, pass.linkedTo ?? pass.id, (evaluated) => evaluated.outcome);
  const judged = isJudged(outcome) ? outcome : null;
  const words = resultWords(outcome, items);
  const check = items !== undefined;
  return (
    <Row>
      <RowHead>{pass.linkedTo ? `${passWords(pass)} = as found` : passWords(pass)}</RowHead>
      {!check && <DataCell figure>{judged ? judged.displayed.textMm.replace('-', '−') : '–'}</DataCell>}
      {!check && (
        <DataCell figure>
          {judged?.judgement.toleranceUm ? toleranceShown(judged.judgement.toleranceUm, unit) : '–'}
        </DataCell>
      )}
      {!check && (
        <DataCell figure>
          {outcome.filled} of {outcome.total}
        </DataCell>
      )}
      <DataCell>
        <VerdictMark verdict={words.mark} words={words.verdict} />
        {words.beside && <span className="block text-sm text-ink2">{words.beside}</span>}
      </DataCell>
    </Row>
  );
}
