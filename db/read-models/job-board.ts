import type { Db } from '@/db/client';
import { findJob, type JobRow, listPeople, listTemperatures, type TemperatureRow } from '@/db/queries/jobs';
import { type Exclusion, listExclusions } from '@/db/queries/plans';
import { listPhotos, type SheetPhoto } from '@/db/queries/sheet-photos';
import { listSheets, type SheetRow } from '@/db/queries/sheets';
import {
  type InstrumentChoice,
  listInstrumentChoices,
  machineHead,
  type PassView,
  passViews,
  type SheetView,
} from './sheet-view';

export interface BoardReport {
  id: string;
  number: string;
  revision: number;
  state: string;
  pdfState: string;
  issuedAt: Date;
  signedAt: Date | null;
}

export interface JobBoard {
  job: JobRow;
  machine: SheetView['machine'];
  customer: { id: string; name: string };
  people: { name: string; role: 'inspector' | 'reviewer' | 'customer' }[];
  temperatures: TemperatureRow[];
  sheets: (SheetRow & { passes: PassView[]; photos: SheetPhoto[] })[];
  exclusions: Exclusion[];
  instruments: InstrumentChoice[];
  reports: BoardReport[];
}

/** Everything of one job that its board, the check and the report are made of. */
export async function jobBoard(db: Db, jobId: string): Promise<JobBoard | undefined> {
  const job = await findJob(db, jobId);
  const machine = job && (await machineHead(db, job.machineId));
  if (!job || !machine) return undefined;
  const customer = await db('customers').where({ id: job.customerId }).first('id', 'name');
  const sheets = await listSheets(db, jobId);
  const sheetIds = sheets.map((sheet) => sheet.id);
  const passes = await passViews(db, sheetIds);
  const photos = await listPhotos(db, sheetIds);
  const bySheet = new Map<string, PassView[]>();
  for (const pass of passes) bySheet.set(pass.sheetId, [...(bySheet.get(pass.sheetId) ?? []), pass]);
  return {
    job,
    machine,
    customer,
    people: await listPeople(db, jobId),
    temperatures: await listTemperatures(db, jobId),
    sheets: sheets.map((sheet) => ({
      ...sheet,
      passes: bySheet.get(sheet.id) ?? [],
      photos: photos.filter(({ sheetId }) => sheetId === sheet.id),
    })),
    exclusions: await listExclusions(db, jobId),
    instruments: await listInstrumentChoices(db),
    reports: await db('reports').where({ job_id: jobId }).orderBy('created_at', 'desc').select({
      id: 'id',
      number: 'number',
      revision: 'revision',
      state: 'state',
      pdfState: 'pdf_state',
      issuedAt: 'issued_at',
      signedAt: 'signed_at',
    }),
  };
}
