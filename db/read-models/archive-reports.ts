import type { Db } from '@/db/client';

export interface ArchiveReport {
  id: string;
  machineId: string;
  number: string;
  revision: number;
  state: string;
  issuedAt: Date | null;
  signedAt: Date | null;
  hasPdf: boolean;
}

const columns = (db: Db) => ({
  id: 'r.id',
  machineId: 'j.machine_id',
  number: 'r.number',
  revision: 'r.revision',
  state: 'r.state',
  issuedAt: 'r.issued_at',
  signedAt: 'r.signed_at',
  hasPdf: db.raw(`r.pdf_state = 'ready'`),
});

const reports = (db: Db) =>
  db('reports as r').join('jobs as j', (on) =>
    on.on('j.organisation_id', 'r.organisation_id').andOn('j.id', 'r.job_id'),
  );

/** All reports of some machines, newest first. */
export const reportsOfMachines = (db: Db, machineIds: string[]): Promise<ArchiveReport[]> =>
  reports(db)
    .whereIn('j.machine_id', machineIds)
    .orderBy([
      { column: 'r.issued_at', order: 'desc' },
      { column: 'r.revision', order: 'desc' },
    ])
    .select(columns(db));

export interface RecentReport extends ArchiveReport {
  manufacturer: string;
  model: string;
  serialNumber: string;
}

/** What was issued last, with its machine. */
export const recentReports = (db: Db, limit: number): Promise<RecentReport[]> =>
  reports(db)
    .join('machines as m', (on) => on.on('m.organisation_id', 'j.organisation_id').andOn('m.id', 'j.machine_id'))
    .orderBy([
      { column: 'r.issued_at', order: 'desc' },
      { column: 'r.id', order: 'desc' },
    ])
    .limit(limit)
    .select({
      ...columns(db),
      manufacturer: 'm.manufacturer',
      model: 'm.model',
      serialNumber: 'm.serial_number',
    });
