import { notFound } from 'next/navigation';
import { cache } from 'react';
import type { RemarkSheet } from '@/components/report/remark-fields';
import { inScope, systemScope } from '@/db/client';
import { type ReportView, reportView, sheetNumbers } from '@/db/read-models/report-view';
import { can } from '@/lib/auth/permissions';
import { requireViewer, scopeOf } from '@/lib/auth/session';
import type { Viewer } from '@/lib/auth/viewer';
import type { ReportModel } from '@/lib/reporting/report-model';
import { id as isId } from '@/lib/schemas/common';
import { signedModel } from '@/lib/services/signed-model';

export interface LoadedReport extends ReportView {
  viewer: Viewer;
  /** With the customer's answer on it, once there is one. */
  model: ReportModel;
  sheets: RemarkSheet[];
  /** Those that came with the answer. */
  answerRemarks: ReportModel['remarks'];
  answer: ReportView['signatures'][number] | null;
  /** The revision that has taken this one's place, as far as the reader may see it. */
  replacedBy: ReportView['revisions'][number] | null;
}

/** An issued report as its page shows it; row-level security decides whether the reader may see it at all. */
export const loadReport = cache(async (reportId: string): Promise<LoadedReport> => {
  const viewer = await requireViewer();
  if (!can(viewer.roles, 'report.read') || !isId.safeParse(reportId).success) notFound();
  const view = await inScope(scopeOf(viewer), (trx) => reportView(trx, reportId));
  if (!view) notFound();
  // Sheets are not a customer's to read; their numbers stand in the document that the customer has just been found to see.
  const { model, numbers } = await inScope(systemScope(viewer.organisationId), async (trx) => ({
    model: await signedModel(trx, view.report),
    numbers: await sheetNumbers(trx, view.report.jobId),
  }));
  const newest = view.revisions[0];
  return {
    ...view,
    viewer,
    model,
    sheets: numbers.flatMap(({ id, position }) => {
      const row = model.summary.find(({ order }) => order === position);
      return row ? [{ id, order: position, title: row.title }] : [];
    }),
    answerRemarks: model.remarks.filter(({ no }) => view.report.model.remarks.every((earlier) => earlier.no !== no)),
    answer: view.signatures.find(({ role }) => role === 'customer') ?? null,
    replacedBy: newest && newest.revision > view.report.revision ? newest : null,
  };
});
