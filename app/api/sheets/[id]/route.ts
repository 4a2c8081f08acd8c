import { recordEvent } from '@/db/queries/audit';
import { holdJob } from '@/db/queries/jobs';
import { findSheet, updateSheet } from '@/db/queries/sheets';
import { sheetView } from '@/db/read-models/sheet-view';
import { changedMeanwhile, conflict, notFound } from '@/lib/errors';
import { route } from '@/lib/http/route';
import { sheetState } from '@/lib/reporting/sheet-state';
import { idParams } from '@/lib/schemas/common';
import { sheetChange } from '@/lib/schemas/job';
import { closedBecause } from '@/lib/services/keep-readings';

export const GET = route({
  action: 'job.read',
  params: idParams,
  async handle({ trx, params }) {
    const view = await sheetView(trx, params.id);
    if (!view) throw notFound('sheet');
    const { sheet } = view;
    const state = sheetState({ ...sheet, passes: view.passes });
    return {
      version: sheet.version,
      body: {
        id: sheet.id,
        state: state.state,
        definition: sheet.definition,
        component: sheet.component,
        tolerance: sheet.tolerance,
        passes: view.passes,
        result: state.final?.result ?? null,
        // Corrections, and what they disturb, are recorded from a later version on: nothing can be disturbed yet.
        disturbedBy: [],
        sheet,
      },
    };
  },
});

export const PATCH = route({
  action: 'job.manage',
  params: idParams,
  body: sheetChange,
  needsVersion: true,
  async handle({ trx, viewer, params, body, expectedVersion }) {
    const sheet = await findSheet(trx, params.id);
    const job = sheet && (await holdJob(trx, sheet.jobId));
    if (!job) throw notFound('sheet');
    const closed = closedBecause(job.state);
    if (closed) throw conflict(closed);
    if (!(await updateSheet(trx, params.id, expectedVersion, { ...body, by: viewer.name }))) throw changedMeanwhile();
    if (body.leftOut !== undefined) {
      await recordEvent(trx, viewer, {
        action: body.leftOut ? 'sheet.left-out' : 'sheet.taken-in',
        subjectType: 'sheet',
        subjectId: params.id,
        detail: { reason: body.leftOut?.reason ?? null },
      });
    }
    return { body: { version: expectedVersion + 1 }, version: expectedVersion + 1 };
  },
});
