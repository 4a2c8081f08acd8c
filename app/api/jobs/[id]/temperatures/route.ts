import { findJob, insertTemperature } from '@/db/queries/jobs';
import { type FieldError, invalid, notFound } from '@/lib/errors';
import { route } from '@/lib/http/route';
import { idParams } from '@/lib/schemas/common';
import { temperatureForm } from '@/lib/schemas/job';
import { parseNumber } from '@/lib/units/parse-number';

function celsius(text: string, pointer: string, errors: FieldError[]): { value: string; text: string } | null {
  if (text === '') return null;
  const parsed = parseNumber(text, { defaultUnit: '°C' });
  if (!parsed.ok) errors.push({ pointer, detail: parsed.problem });
  else if (parsed.unit !== '°C') errors.push({ pointer, detail: 'Give the temperature in °C.' });
  else return { value: parsed.value, text };
  return null;
}

export const POST = route({
  action: 'sheet.measure',
  params: idParams,
  body: temperatureForm,
  async handle({ trx, params, body }) {
    if (!(await findJob(trx, params.id))) throw notFound('job');
    const errors: FieldError[] = [];
    const air = celsius(body.air, '/air', errors);
    const machine = celsius(body.machine, '/machine', errors);
    if (errors.length > 0) throw invalid(errors);
    const id = await insertTemperature(trx, { jobId: params.id, measuredAt: body.measuredAt, air, machine });
    return { status: 201, body: { id } };
  },
});
