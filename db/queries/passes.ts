import type { Db } from '@/db/client';
import { newId } from '@/lib/id';
import { parseNumber } from '@/lib/units/parse-number';
import type { Unit } from '@/lib/units/unit';
import type { CellDefault } from '@/standards/types';
import { own } from './jobs';

export type PassKind = 'as-found' | 'adjusting' | 'as-left';

export interface PassRow {
  id: string;
  sheetId: string;
  kind: PassKind;
  number: number;
  linkedTo: string | null;
  takenAt: Date | null;
  takenBy: string | null;
  temperature: string | null;
  temperatureText: string | null;
  version: number;
}

export const passColumns = {
  id: 'passes.id',
  sheetId: 'passes.sheet_id',
  kind: 'passes.kind',
  number: 'passes.number',
  linkedTo: 'passes.linked_to',
  takenAt: 'passes.taken_at',
  takenBy: 'passes.taken_by',
  temperature: 'passes.temperature',
  temperatureText: 'passes.temperature_text',
  version: 'passes.version',
};

export const listPasses = (db: Db, sheetIds: string[]): Promise<PassRow[]> =>
  db('passes').whereIn('sheet_id', sheetIds).orderBy('created_at').orderBy('id').select(passColumns);

export const findPass = (db: Db, id: string): Promise<PassRow | undefined> =>
  db('passes').where({ id }).first(passColumns);

/** The figure in the unit that applied when it was typed; null for a choice or for what cannot be read. */
export function figureOf(
  text: string,
  unit: Unit | null,
): { value: string | null; unit: Unit | null; resolution: string | null } {
  if (unit === null || text.trim() === '') return { value: null, unit, resolution: null };
  const parsed = parseNumber(text, { defaultUnit: unit });
  return parsed.ok
    ? { value: parsed.value, unit: parsed.unit, resolution: `1e-${parsed.decimals}` }
    : { value: null, unit, resolution: null };
}

interface NewPass {
  sheetId: string;
  kind: PassKind;
  number: number;
  linkedTo: string | null;
  setUp: Record<string, CellDefault>;
  takenAt?: Date | null;
  takenBy?: string | null;
}

/** Rows in portions that one statement holds: a statement takes 65,535 values at most. */
export function batches<T>(rows: readonly T[], size = 1000): T[][] {
  const count = Math.ceil(rows.length / size);
  return Array.from({ length: count }, (_, k) => rows.slice(k * size, (k + 1) * size));
}

/** Sets of readings with their proposed set-up, in few statements. @returns their ids, in order */
export async function insertPasses(db: Db, passes: readonly NewPass[]): Promise<string[]> {
  const ids = passes.map(() => newId());
  const rows = passes.map((pass, index) => ({
    organisation_id: own(db),
    id: ids[index],
    sheet_id: pass.sheetId,
    kind: pass.kind,
    number: pass.number,
    linked_to: pass.linkedTo,
    taken_at: pass.takenAt ?? null,
    taken_by: pass.takenBy ?? null,
  }));
  for (const batch of batches(rows)) await db('passes').insert(batch);
  const cells = passes.flatMap(({ setUp }, index) =>
    Object.entries(setUp).map(([pointer, cell]) => ({
      organisation_id: own(db),
      id: newId(),
      pass_id: ids[index],
      pointer,
      text: cell.text,
      ...figureOf(cell.text, cell.unit),
      source: 'planned',
      version: 1,
    })),
  );
  for (const batch of batches(cells)) await db('readings').insert(batch);
  return ids;
}

export async function insertPass(db: Db, pass: NewPass): Promise<string> {
  const [id] = await insertPasses(db, [pass]);
  return id!;
}

export interface ReadingRow {
  passId: string;
  pointer: string;
  text: string;
  unit: Unit | null;
  version: number;
  source: string;
  updatedAt: Date;
}

export const listReadings = (db: Db, passIds: string[]): Promise<ReadingRow[]> =>
  db('readings').whereIn('pass_id', passIds).select({
    passId: 'pass_id',
    pointer: 'pointer',
    text: 'text',
    unit: 'unit',
    version: 'version',
    source: 'source',
    updatedAt: 'updated_at',
  });

export interface PassInstrument {
  passId: string;
  instrumentId: string;
  overrideReason: string | null;
  overrideBy: string | null;
}

export const listPassInstruments = (db: Db, passIds: string[]): Promise<PassInstrument[]> =>
  db('pass_instruments').whereIn('pass_id', passIds).orderBy('id').select({
    passId: 'pass_id',
    instrumentId: 'instrument_id',
    overrideReason: 'override_reason',
    overrideBy: 'override_by',
  });

export async function replacePassInstruments(
  db: Db,
  passId: string,
  instruments: Omit<PassInstrument, 'passId'>[],
): Promise<void> {
  await db('pass_instruments').where({ pass_id: passId }).delete();
  if (instruments.length === 0) return;
  await db('pass_instruments').insert(
    instruments.map((used) => ({
      organisation_id: own(db),
      id: newId(),
      pass_id: passId,
      instrument_id: used.instrumentId,
      override_reason: used.overrideReason,
      override_by: used.overrideBy,
    })),
  );
}
