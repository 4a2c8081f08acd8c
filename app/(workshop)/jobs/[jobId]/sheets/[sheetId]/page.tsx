import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { cache } from 'react';
import type { SheetData } from '@/components/sheet/sheet-data';
import { SheetScreen } from '@/components/sheet/sheet-screen';
import { inScope } from '@/db/client';
import { type SheetSurroundings, sheetSurroundings } from '@/db/read-models/sheet-surroundings';
import { type SheetView, sheetView } from '@/db/read-models/sheet-view';
import { can } from '@/lib/auth/permissions';
import { requireViewer, scopeOf } from '@/lib/auth/session';
import type { Viewer } from '@/lib/auth/viewer';
import { componentWords } from '@/lib/planning/component-words';
import { definitionOf } from '@/lib/planning/definition-of';
import { wordsOnSheet } from '@/lib/planning/words-on-sheet';
import { id as isId } from '@/lib/schemas/common';
import { closedBecause, rulesOf } from '@/lib/services/keep-readings';
import { cautionText } from '@/standards/cautions';
import { codeTitle } from '@/standards/registry';

type Params = { params: Promise<{ jobId: string; sheetId: string }> };

const load = cache(async (jobId: string, sheetId: string) => {
  const viewer = await requireViewer();
  if (!can(viewer.roles, 'job.read') || !isId.safeParse(sheetId).success) notFound();
  const found = await inScope(scopeOf(viewer), async (trx) => {
    const view = await sheetView(trx, sheetId);
    return view && { view, around: await sheetSurroundings(trx, view.job.id, sheetId) };
  });
  if (found?.view.job.id !== jobId) notFound();
  return { viewer, ...found };
});

export async function generateMetadata({ params }: Params): Promise<Metadata> {
  const { jobId, sheetId } = await params;
  const { view } = await load(jobId, sheetId);
  return { title: `${view.sheet.position} ${view.sheet.title} · ${view.job.reference}` };
}

export default async function SheetPage({ params }: Params) {
  const { jobId, sheetId } = await params;
  const { viewer, view, around } = await load(jobId, sheetId);
  return <SheetScreen key={sheetId} data={sheetData(viewer, view, around)} />;
}

/** Plain data: from here on the entry screen needs no further rendering by the server. */
function sheetData(viewer: Viewer, view: SheetView, around: SheetSurroundings): SheetData {
  const { sheet, job, machine } = view;
  const { code, edition } = sheet.definition;
  const definition = definitionOf(sheet.definition, sheet.ownDefinition);
  return {
    sheet: {
      id: sheet.id,
      position: sheet.position,
      title: sheet.title,
      component: sheet.component,
      leftOut: sheet.leftOutReason && { reason: sheet.leftOutReason, text: sheet.leftOutText, by: sheet.leftOutBy },
      remark: sheet.remark,
      version: sheet.version,
    },
    job: { id: job.id, reference: job.reference, closed: closedBecause(job.state) },
    machine: { manufacturer: machine.manufacturer, model: machine.model, serialNumber: machine.serialNumber },
    place: componentWords(sheet.component, job.makeUp),
    definition,
    cautions: definition.cautions.map(cautionText),
    words: wordsOnSheet(definition),
    rules: rulesOf(sheet, job.decisionRule),
    codeTitle: codeTitle(code, edition),
    passes: view.passes.map(({ takenAt, result, ...pass }) => ({
      ...pass,
      takenAt: takenAt?.toISOString() ?? null,
      result: result && { state: result.state, verdict: result.verdict, displayedMm: result.displayedMm },
    })),
    instruments: view.instruments,
    recentInstruments: around.recentInstruments,
    neighbours: around.neighbours,
    viewer: {
      accountId: viewer.accountId,
      name: viewer.name,
      mayMeasure: can(viewer.roles, 'sheet.measure'),
      mayAllow: can(viewer.roles, 'instrument.override'),
    },
    timeZone: viewer.timeZone,
    readAt: new Date().toISOString(),
  };
}
