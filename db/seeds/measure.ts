import type { Db } from '@/db/client';
import { listPasses, replacePassInstruments } from '@/db/queries/passes';
import type { SheetRow } from '@/db/queries/sheets';
import type { Viewer } from '@/lib/auth/viewer';
import { newId } from '@/lib/id';
import { definitionOf } from '@/lib/planning/definition-of';
import type { ReadingOperation } from '@/lib/schemas/operation';
import { keepReadings } from '@/lib/services/keep-readings';
import { startPass } from '@/lib/services/start-pass';
import { allFields, sheetFields } from '@/lib/sheet/sheet-fields';
import type { Unit } from '@/lib/units/unit';
import { simulatedReadings } from './simulated-readings';

interface Typed {
  pointer: string;
  text: string;
  unit: Unit | null;
  at?: string;
  reason?: string | null;
}

/** Types readings into a set as the sheet's page would: one operation a field, over the version that stands there. */
export async function typeReadings(
  db: Db,
  sheetId: string,
  passId: string,
  typed: Typed[],
  by: Viewer,
  at: Date,
): Promise<void> {
  const standing: { pointer: string; version: number }[] = await db('readings')
    .where({ pass_id: passId })
    .select('pointer', 'version');
  const versions = new Map(standing.map((row) => [row.pointer, row.version]));
  const operations: ReadingOperation[] = typed.map((entry, seq) => {
    const baseVersion = versions.get(entry.pointer) ?? 0;
    versions.set(entry.pointer, baseVersion + 1);
    return {
      opId: newId(),
      passId,
      cellId: entry.pointer,
      baseVersion,
      text: entry.text,
      unit: entry.unit,
      source: 'typed',
      deviceTime: entry.at ?? new Date(at.getTime() + seq * 9_000).toISOString(),
      seq,
      reason: entry.reason ?? null,
    };
  });
  for (let start = 0; start < operations.length; start += 100) {
    await keepReadings(db, sheetId, operations.slice(start, start + 100), { accountId: by.accountId, name: by.name });
  }
}

export interface SimulatedPass {
  kind: 'as-found' | 'adjusting' | 'as-left';
  share: number;
  at: Date;
  instrumentIds: string[];
  /** Only this part of the readings: a sheet that is being measured. */
  part?: number;
  /** One reading is typed wrongly first and put right. */
  slip?: boolean;
}

/** Measures a sheet of the demo scenario with invented readings. */
export async function simulatePass(db: Db, sheet: SheetRow, pass: SimulatedPass, by: Viewer): Promise<void> {
  const passes = await listPasses(db, [sheet.id]);
  const open = passes.find((row) => row.kind === pass.kind && pass.kind === 'as-found');
  const passId = open?.id ?? (await startPass(db, sheet.id, { kind: pass.kind, linkTo: null }, by));
  const cells: { pointer: string; text: string; unit: Unit | null }[] = await db('readings')
    .where({ pass_id: passId })
    .select('pointer', 'text', 'unit');
  const definition = definitionOf(sheet.definition);
  const setUp = Object.fromEntries(cells.map((cell) => [cell.pointer, { text: cell.text, unit: cell.unit }]));
  const readings = simulatedReadings({
    definition,
    setUp,
    tolerance: sheet.tolerance,
    share: pass.share,
    stepUm: Number(definition.resolution.valueUm) <= 0.5 ? 0.2 : 1,
    seed: `${sheet.key} ${pass.kind} ${pass.at.toISOString()}`,
  });
  const units = new Map(allFields(sheetFields(definition, setUp)).map(({ pointer, unit }) => [pointer, unit]));
  const all: Typed[] = Object.entries(readings).map(([pointer, text]) => ({
    pointer,
    text,
    unit: units.get(pointer) ?? null,
  }));
  const taken = all.slice(0, Math.ceil(all.length * (pass.part ?? 1)));
  const third = taken[2];
  const typed =
    pass.slip && third
      ? taken.flatMap((entry) =>
          entry === third
            ? [
                { ...entry, text: `${entry.text}${entry.text.slice(-1)}` },
                { ...entry, reason: 'key pressed twice; read again at the same place' },
              ]
            : [entry],
        )
      : taken;
  await typeReadings(db, sheet.id, passId, typed, by, pass.at);
  await replacePassInstruments(
    db,
    passId,
    pass.instrumentIds.map((instrumentId) => ({ instrumentId, overrideReason: null, overrideBy: null })),
  );
}
