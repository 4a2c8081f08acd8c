import type { Db } from '@/db/client';
import { newId } from '@/lib/id';
import type { CalibrationFields, InstrumentChange, InstrumentFields } from '@/lib/schemas/instrument';

export interface Instrument extends InstrumentFields {
  id: string;
  retiredAt: Date | null;
  version: number;
}

export interface Calibration extends CalibrationFields {
  id: string;
}

const columns = {
  id: 'id',
  number: 'number',
  name: 'name',
  kind: 'kind',
  resolution: 'resolution',
  resolutionUnit: 'resolution_unit',
  retiredAt: 'retired_at',
  version: 'version',
};

export const findInstrument = (db: Db, id: string): Promise<Instrument | undefined> =>
  db('instruments').where({ id }).first(columns);

export async function insertInstrument(db: Db, instrument: InstrumentFields): Promise<string> {
  const id = newId();
  await db('instruments').insert({
    organisation_id: db.raw('app_organisation()'),
    id,
    number: instrument.number,
    name: instrument.name,
    kind: instrument.kind,
    resolution: instrument.resolution,
    resolution_unit: instrument.resolutionUnit,
  });
  return id;
}

/** Answers false when somebody else changed the instrument meanwhile. */
export async function updateInstrument(
  db: Db,
  id: string,
  version: number,
  change: InstrumentChange,
): Promise<boolean> {
  const all = {
    number: change.number,
    name: change.name,
    kind: change.kind,
    resolution: change.resolution,
    resolution_unit: change.resolutionUnit,
    retired_at: change.retired === undefined ? undefined : change.retired ? db.fn.now() : null,
  };
  const given = Object.fromEntries(Object.entries(all).filter(([, value]) => value !== undefined));
  const changed = await db('instruments')
    .where({ id, version })
    .update({ ...given, version: version + 1 });
  return changed === 1;
}

/** Newest first: the one with the latest due date counts. */
export const listCalibrations = (db: Db, instrumentId: string): Promise<Calibration[]> =>
  db('calibrations')
    .where({ instrument_id: instrumentId })
    .orderBy([
      { column: 'due_on', order: 'desc' },
      { column: 'id', order: 'desc' },
    ])
    .select({
      id: 'id',
      certificate: 'certificate',
      laboratory: 'laboratory',
      calibratedOn: 'calibrated_on',
      dueOn: 'due_on',
      expandedUncertainty: 'expanded_uncertainty',
      uncertaintyUnit: 'uncertainty_unit',
      coverageFactor: 'coverage_factor',
      fileId: 'file_id',
    });

export async function insertCalibration(db: Db, instrumentId: string, calibration: CalibrationFields): Promise<string> {
  const id = newId();
  await db('calibrations').insert({
    organisation_id: db.raw('app_organisation()'),
    id,
    instrument_id: instrumentId,
    certificate: calibration.certificate,
    laboratory: calibration.laboratory,
    calibrated_on: calibration.calibratedOn,
    due_on: calibration.dueOn,
    expanded_uncertainty: calibration.expandedUncertainty,
    uncertainty_unit: calibration.uncertaintyUnit,
    coverage_factor: calibration.coverageFactor,
    file_id: calibration.fileId,
  });
  return id;
}
