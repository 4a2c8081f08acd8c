import type { Db } from '@/db/client';

interface Neighbour {
  id: string;
  position: number;
  title: string;
}

export interface SheetSurroundings {
  neighbours: { previous: Neighbour | null; next: Neighbour | null; count: number };
  /** Instruments used in this job, the newest first: what the next sheet will most likely be taken with. */
  recentInstruments: string[];
}

/** What stands around a sheet in its job. */
export async function sheetSurroundings(db: Db, jobId: string, sheetId: string): Promise<SheetSurroundings> {
  const sheets: Neighbour[] = await db('sheets')
    .where({ job_id: jobId })
    .orderBy('position')
    .select('id', 'position', 'title');
  const at = sheets.findIndex((sheet) => sheet.id === sheetId);
  return {
    neighbours: { previous: sheets[at - 1] ?? null, next: sheets[at + 1] ?? null, count: sheets.length },
    recentInstruments: await recentInstruments(db, jobId),
  };
}

async function recentInstruments(db: Db, jobId: string): Promise<string[]> {
  const rows: { id: string }[] = await db('pass_instruments')
    .join('passes', 'passes.id', 'pass_instruments.pass_id')
    .join('sheets', 'sheets.id', 'passes.sheet_id')
    .where('sheets.job_id', jobId)
    .orderBy('pass_instruments.id', 'desc')
    .limit(40)
    .select('pass_instruments.instrument_id as id');
  return [...new Set(rows.map((row) => row.id))];
}
