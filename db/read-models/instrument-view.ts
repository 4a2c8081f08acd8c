import type { Db } from '@/db/client';
import { type Calibration, findInstrument, type Instrument, listCalibrations } from '@/db/queries/instruments';
import { type CalibrationState, calibrationState } from '@/lib/schemas/calibration-state';

export interface InstrumentView extends Instrument {
  calibrations: Calibration[];
  dueOn: string | null;
  state: CalibrationState;
}

/** One instrument with its certificates, newest first, and what they mean on the given day. */
export async function instrumentView(db: Db, id: string, today: string): Promise<InstrumentView | undefined> {
  const instrument = await findInstrument(db, id);
  if (!instrument) return undefined;
  const calibrations = await listCalibrations(db, id);
  const dueOn = calibrations[0]?.dueOn ?? null;
  return { ...instrument, calibrations, dueOn, state: calibrationState(dueOn, today) };
}
