import type { Db } from '@/db/client';
import { findJob, type JobRow } from '@/db/queries/jobs';
import { listPasses, listPassInstruments, listReadings, type PassInstrument, type PassRow } from '@/db/queries/passes';
import { listResults, type ResultRow } from '@/db/queries/results';
import { findSheet, type SheetRow } from '@/db/queries/sheets';
import type { CalibrationFacts } from '@/lib/schemas/instrument-state';
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
  /** Last valid day of the newest certificate; null: none is registered. */
  dueOn: string | null;
  /** All certificates, newest first: which of them held depends on the day of measuring. */
  calibrations: CalibrationFacts[];
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

/** The register, each instrument with its certificates. */
export async function listInstrumentChoices(db: Db): Promise<InstrumentChoice[]> {
  const instruments: Omit<InstrumentChoice, 'certificate' | 'dueOn' | 'calibrations'>[] = await db('instruments')
    .whereNull('retired_at')
    .orderBy('number')
    .select({
      id: 'id',
      number: 'number',
      name: 'name',
      kind: 'kind',
      resolution: 'resolution',
      resolutionUnit: 'resolution_unit',
    });
  const calibrations: (CalibrationFacts & { instrumentId: string })[] = await db('calibrations')
    .orderBy('due_on', 'desc')
    .select({
      instrumentId: 'instrument_id',
      certificate: 'certificate',
      calibratedOn: 'calibrated_on',
      dueOn: 'due_on',
      expandedUncertainty: 'expanded_uncertainty',
      uncertaintyUnit: 'uncertainty_unit',
      coverageFactor: 'coverage_factor',
    });
  return instruments.map((instrument) => {
    const own = calibrations.filter((calibration) => calibration.instrumentId === instrument.id);
    return { ...instrument, certificate: own[0]?.certificate ?? null, dueOn: own[0]?.dueOn ?? null, calibrations: own };
  });
}

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
