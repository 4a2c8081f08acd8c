import type { z } from 'zod';
import type { Db } from '@/db/client';
import { recordEvent } from '@/db/queries/audit';
import { holdJob } from '@/db/queries/jobs';
import { findPass, replacePassInstruments } from '@/db/queries/passes';
import { lockSheet } from '@/db/queries/sheets';
import { type InstrumentChoice, listInstrumentChoices } from '@/db/read-models/sheet-view';
import { can } from '@/lib/auth/permissions';
import type { Viewer } from '@/lib/auth/viewer';
import { changedMeanwhile, conflict, type FieldError, invalid, notFound } from '@/lib/errors';
import { formatDay } from '@/lib/reporting/format-time';
import { calibrationOn, isOverdue } from '@/lib/schemas/instrument-state';
import type { passChange } from '@/lib/schemas/job';
import { parseNumber } from '@/lib/units/parse-number';
import { closedBecause } from './keep-readings';

/** Temperature, time and instruments of a set of readings. An instrument after its due date wants a reason and a name. */
export async function changePass(
  db: Db,
  viewer: Viewer,
  ids: { sheetId: string; passId: string },
  expectedVersion: number,
  change: z.output<typeof passChange>,
): Promise<number> {
  const sheet = await lockSheet(db, ids.sheetId);
  const pass = await findPass(db, ids.passId);
  const job = sheet && (await holdJob(db, sheet.jobId));
  if (!sheet || !job || pass?.sheetId !== ids.sheetId) throw notFound('set of readings');
  const closed = closedBecause(job.state);
  if (closed) throw conflict(closed);
  if (pass.version !== expectedVersion) throw changedMeanwhile();
  const columns: Record<string, unknown> = { version: expectedVersion + 1 };
  if (change.takenAt !== undefined) columns.taken_at = change.takenAt;
  if (change.temperature !== undefined) Object.assign(columns, temperatureColumns(change.temperature));
  if (change.instruments !== undefined) {
    const takenAt = change.takenAt ? new Date(change.takenAt) : (pass.takenAt ?? new Date());
    const measuredOn = formatDay(takenAt, viewer.timeZone);
    await checkInstruments(db, change.instruments, measuredOn);
    await replacePassInstruments(db, ids.passId, change.instruments);
    for (const used of change.instruments.filter((entry) => entry.overrideReason)) {
      await recordEvent(db, viewer, {
        action: 'instrument.overridden',
        subjectType: 'sheet',
        subjectId: ids.sheetId,
        detail: { instrumentId: used.instrumentId, reason: used.overrideReason, by: used.overrideBy },
      });
    }
  }
  await db('passes').where({ id: ids.passId }).update(columns);
  return expectedVersion + 1;
}

function temperatureColumns(text: string): Record<string, unknown> {
  if (text === '') return { temperature: null, temperature_text: null };
  const parsed = parseNumber(text, { defaultUnit: '°C' });
  if (!parsed.ok) throw invalid([{ pointer: '/temperature', detail: parsed.problem }]);
  if (parsed.unit !== '°C') throw invalid([{ pointer: '/temperature', detail: 'Give the temperature in °C.' }]);
  return { temperature: parsed.value, temperature_text: text };
}

async function checkInstruments(
  db: Db,
  used: NonNullable<z.output<typeof passChange>['instruments']>,
  measuredOn: string,
): Promise<void> {
  const register = new Map<string, InstrumentChoice>(
    (await listInstrumentChoices(db)).map((entry) => [entry.id, entry]),
  );
  const errors: FieldError[] = [];
  const allowing = await whoMayAllow(db);
  used.forEach((entry, index) => {
    const instrument = register.get(entry.instrumentId);
    const dueOn = calibrationOn(instrument?.calibrations ?? [], measuredOn)?.dueOn ?? null;
    if (!instrument)
      errors.push({ pointer: `/instruments/${index}`, detail: 'This instrument is not in the register.' });
    else if (used.findIndex(({ instrumentId }) => instrumentId === entry.instrumentId) !== index)
      errors.push({ pointer: `/instruments/${index}`, detail: `${instrument.number} is named twice.` });
    else if (isOverdue(dueOn, measuredOn) && !(entry.overrideReason && entry.overrideBy)) {
      errors.push({
        pointer: `/instruments/${index}/overrideReason`,
        detail: `${instrument.number} was due on ${dueOn ?? '(no certificate)'}: say why it may be used all the same, and who allows it.`,
      });
    } else if (entry.overrideBy && !allowing.includes(entry.overrideBy)) {
      errors.push({
        pointer: `/instruments/${index}/overrideBy`,
        detail: `Name somebody who may allow it: ${allowing.join(', ') || 'nobody is registered who may'}.`,
      });
    }
  });
  if (errors.length > 0) throw invalid(errors);
}

/** Members whose role includes it, by name, as it prints. */
async function whoMayAllow(db: Db): Promise<string[]> {
  const members: { name: string; roles: string[] }[] = await db('memberships')
    .whereNull('disabled_at')
    .orderBy('name')
    .select('name', 'roles');
  return members.filter(({ roles }) => can(roles, 'instrument.override')).map(({ name }) => name);
}
