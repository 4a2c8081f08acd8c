import type { Db } from '@/db/client';
import { findJob, type JobRow } from '@/db/queries/jobs';
import { listPasses, listPassInstruments, listReadings, type PassInstrument, type PassRow } from '@/db/queries/passes';
import { listResults, type ResultRow } from '@/db/queries/results';
import { findSheet, type SheetRow } from '@/db/queries/sheets';
import type { Unit } from '@/lib/units/unit';

export interface VersionedCell {
  text: string;
  unit: Unit | null;
  version: number;
}

export interface PassView extends PassRow {
  cells: Record<string, VersionedCell>;
  instruments: PassInstrument[];
  result: ResultRow | null;
}

export interface InstrumentChoice {
  id: string;
  number: string;
  name: string;
  kind: string;
  resolution: string | null;
  resolutionUnit: string | null;
  certificate: string | null;
  calibratedOn: string | null;
  /** Last valid day of the newest certificate; null: none is registered. */
  dueOn: string | null;
  expandedUncertainty: string | null;
  uncertaintyUnit: string | null;
  coverageFactor: string | null;
}

export interface SheetView {
  sheet: SheetRow;
  job: JobRow;
  machine: { id: string; manufacturer: string; model: string; serialNumber: string; year: number | null };
  passes: PassView[];
  instruments: InstrumentChoice[];
  /** Sheets before and after this one, in working order. */
  neighbours: { previous: string | null; next: string | null; count: number };
}

export async function passViews(db: Db, sheetIds: string[]): Promise<PassView[]> {
  const passes = await listPasses(db, sheetIds);
  const ids = passes.map((pass) => pass.id);
  const readings = await listReadings(db, ids);
  const instruments = await listPassInstruments(db, ids);
  const results = await listResults(db, ids);
  const views = new Map<string, PassView>(
    passes.map((pass) => [pass.id, { ...pass, cells: {}, instruments: [], result: null }]),
  );
  for (const row of readings) {
    const view = views.get(row.passId);
    if (view) view.cells[row.pointer] = { text: row.text, unit: row.unit, version: row.version };
  }
  for (const used of instruments) views.get(used.passId)?.instruments.push(used);
  for (const result of results) {
    const view = views.get(result.passId);
    if (view) view.result = result;
  }
  // As left = as found: the result is the one that it is linked to.
  for (const view of views.values()) {
    if (view.linkedTo) view.result = views.get(view.linkedTo)?.result ?? null;
  }
  return [...views.values()];
}

/** The register, each instrument with its newest certificate. */
export const listInstrumentChoices = (db: Db): Promise<InstrumentChoice[]> =>
  db('instruments')
    .leftJoin(
      db('calibrations')
        .distinctOn('instrument_id')
        .orderBy([{ column: 'instrument_id' }, { column: 'due_on', order: 'desc' }])
        .select(
          'instrument_id',
          'certificate',
          'calibrated_on',
          'due_on',
          'expanded_uncertainty',
          'uncertainty_unit',
          'coverage_factor',
        )
        .as('newest'),
      'newest.instrument_id',
      'instruments.id',
    )
    .whereNull('instruments.retired_at')
    .orderBy('instruments.number')
    .select({
      id: 'instruments.id',
      number: 'instruments.number',
      name: 'instruments.name',
      kind: 'instruments.kind',
      resolution: 'instruments.resolution',
      resolutionUnit: 'instruments.resolution_unit',
      certificate: 'newest.certificate',
      calibratedOn: 'newest.calibrated_on',
      dueOn: 'newest.due_on',
      expandedUncertainty: 'newest.expanded_uncertainty',
      uncertaintyUnit: 'newest.uncertainty_unit',
      coverageFactor: 'newest.coverage_factor',
    });

export const machineHead = (db: Db, id: string): Promise<SheetView['machine'] | undefined> =>
  db('machines')
    .where({ id })
    .first({ id: 'id', manufacturer: 'manufacturer', model: 'model', serialNumber: 'serial_number', year: 'year' });

export async function sheetView(db: Db, sheetId: string): Promise<SheetView | undefined> {
  const sheet = await findSheet(db, sheetId);
  if (!sheet) return undefined;
  const job = await findJob(db, sheet.jobId);
  const machine = job && (await machineHead(db, job.machineId));
  if (!job || !machine) return undefined;
  const passes = await passViews(db, [sheetId]);
  const instruments = await listInstrumentChoices(db);
  const around: { id: string; position: number }[] = await db('sheets')
    .where({ job_id: sheet.jobId })
    .orderBy('position')
    .select('id', 'position');
  const index = around.findIndex((row) => row.id === sheetId);
  return {
    sheet,
    job,
    machine,
    passes,
    instruments,
    neighbours: { previous: around[index - 1]?.id ?? null, next: around[index + 1]?.id ?? null, count: around.length },
  };
}
