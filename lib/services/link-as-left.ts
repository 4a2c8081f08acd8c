import type { Db } from '@/db/client';
import { findJob } from '@/db/queries/jobs';
import { listSheets } from '@/db/queries/sheets';
import { passViews } from '@/db/read-models/sheet-view';
import type { Viewer } from '@/lib/auth/viewer';
import { notFound } from '@/lib/errors';
import { sheetState } from '@/lib/reporting/sheet-state';

import { startPass } from './start-pass';

/** Links as left to as found on each of the sheets whose readings as found are complete and that have nothing newer. */
export async function linkAsLeft(db: Db, viewer: Viewer, jobId: string, sheetIds: string[]): Promise<number> {
  if (!(await findJob(db, jobId))) throw notFound('job');
  const wanted = new Set(sheetIds);
  const sheets = (await listSheets(db, jobId)).filter((sheet) => wanted.has(sheet.id));
  const passes = await passViews(
    db,
    sheets.map((sheet) => sheet.id),
  );
  let linked = 0;
  for (const sheet of sheets) {
    const mine = passes.filter((pass) => pass.sheetId === sheet.id);
    const found = mine.find((pass) => pass.kind === 'as-found');
    if (
      !found ||
      sheetState({ ...sheet, passes: mine }).state !== 'found' ||
      mine.some((pass) => pass.kind !== 'as-found')
    )
      continue;
    await startPass(db, sheet.id, { kind: 'as-left', linkTo: found.id }, viewer);
    linked += 1;
  }
  return linked;
}
