import type { Db } from '@/db/client';
import { handedIn } from '@/db/queries/hand-ins';
import { type CellChange, listChanges } from '@/db/queries/operations';
import { listRemarks, type RemarkRow } from '@/db/queries/remarks';
import { type JobBoard, jobBoard } from './job-board';

export interface ReportSource {
  board: JobBoard;
  changes: CellChange[];
  remarks: RemarkRow[];
  handedIn: { name: string; at: Date } | undefined;
  machine: { control: string | null; site: string | null };
  organisation: {
    name: string;
    code: string;
    addressLines: string[];
    contact: string | null;
    timeZone: string;
    paper: 'A4' | 'Letter';
  };
}

/** All that a report is built from. */
export async function reportSource(db: Db, jobId: string): Promise<ReportSource | undefined> {
  const board = await jobBoard(db, jobId);
  if (!board) return undefined;
  const passIds = board.sheets.flatMap((sheet) => sheet.passes.map((pass) => pass.id));
  return {
    board,
    changes: await listChanges(db, passIds),
    remarks: await listRemarks(db, jobId),
    handedIn: await handedIn(db, jobId),
    machine: await db('machines').where({ id: board.job.machineId }).first('control', 'site'),
    organisation: await db('organisations').first({
      name: 'name',
      code: 'code',
      addressLines: 'address_lines',
      contact: 'contact',
      timeZone: 'time_zone',
      paper: 'paper',
    }),
  };
}
