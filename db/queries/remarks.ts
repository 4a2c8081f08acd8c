import type { Db } from '@/db/client';
import { newId } from '@/lib/id';
import { own } from './jobs';

export interface RemarkRow {
  id: string;
  reportId: string | null;
  sheetId: string | null;
  sheetPosition: number | null;
  number: number;
  text: string;
  owner: string | null;
  dueOn: string | null;
  closedAt: Date | null;
}

/** The points list of a job. */
export const listRemarks = (db: Db, jobId: string): Promise<RemarkRow[]> =>
  db('remarks')
    .leftJoin('sheets', (join) =>
      join.on('sheets.organisation_id', 'remarks.organisation_id').andOn('sheets.id', 'remarks.sheet_id'),
    )
    .where('remarks.job_id', jobId)
    .orderBy('remarks.number')
    .select({
      id: 'remarks.id',
      reportId: 'remarks.report_id',
      sheetId: 'remarks.sheet_id',
      sheetPosition: 'sheets.position',
      number: 'remarks.number',
      text: 'remarks.text',
      owner: 'remarks.owner',
      dueOn: 'remarks.due_on',
      closedAt: 'remarks.closed_at',
    });

export async function insertRemarks(
  db: Db,
  jobId: string,
  reportId: string | null,
  remarks: { text: string; sheetId: string | null; owner: string | null; due: string | null }[],
): Promise<void> {
  if (remarks.length === 0) return;
  const [{ last }] = await db('remarks')
    .where({ job_id: jobId })
    .select(db.raw('coalesce(max(number), 0)::int as last'));
  await db('remarks').insert(
    remarks.map((remark, index) => ({
      organisation_id: own(db),
      id: newId(),
      job_id: jobId,
      report_id: reportId,
      sheet_id: remark.sheetId,
      number: last + index + 1,
      text: remark.text,
      owner: remark.owner,
      due_on: remark.due,
    })),
  );
}
