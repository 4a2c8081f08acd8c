import { createHash } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { GET as getHistory } from '@/app/api/machines/[id]/history/route';
import { GET as getData } from '@/app/api/reports/[id]/data/route';
import { POST as takeOperations } from '@/app/api/sheets/[id]/operations/route';
import { GET as getSheet } from '@/app/api/sheets/[id]/route';
import { listRemarks } from '@/db/queries/remarks';
import { findReport, listSignatures, type ReportRow } from '@/db/queries/reports';
import { type JobBoard, jobBoard } from '@/db/read-models/job-board';
import { addWorkedJob } from '@/db/seeds/worked-job';
import { newId } from '@/lib/id';
import { checkFindings } from '@/lib/reporting/check-findings';
import { partConditions } from '@/lib/schemas/component-conditions';
import { signedModel } from '@/lib/services/signed-model';
import { convert } from '@/lib/units/convert';
import { Dec } from '@/lib/units/decimal';
import { formatDecimal } from '@/lib/units/format';
import { sourceJob, sourceOrder, sourceRows, sourceSheets } from './worked-job-source';
import { Workshop } from './workshop';

let workshop: Workshop;
let board: JobBoard;
let report: ReportRow;

beforeAll(async () => {
  workshop = await Workshop.open(
    sourceJob.instruments.map((instrument) => ({
      number: instrument.id,
      name: instrument.name,
      kind: 'other',
      resolution: instrument.resolution,
      resolutionUnit: instrument.unit,
      certificate: instrument.certificate,
      calibrated: instrument.calibrated,
      due: instrument.due,
      uncertainty: instrument.expandedUncertainty,
      uncertaintyUnit: 'µm',
      keptUp: false,
    })),
  );
  await workshop.as('inspector', async (trx) => {
    const machine = workshop.machines.get(sourceJob.machine.serialNumber)!;
    const [inspector, reviewer, customer] = [
      workshop.viewer('inspector'),
      workshop.viewer('reviewer'),
      workshop.viewer('customer'),
    ];
    await addWorkedJob(trx, machine, workshop.instruments, { inspector, reviewer, customer });
    const { id } = await trx('jobs').where({ reference: sourceJob.job.number }).first('id');
    board = (await jobBoard(trx, id))!;
    report = (await findReport(trx, board.reports[0]!.id))!;
  });
});
afterAll(() => workshop?.close());

const sheetOf = (key: string) => board.sheets.find((sheet) => sheet.key === key)!;

/** Each set of readings of the job beside ours; they were begun in the same order. */
const pairs = sourceSheets.flatMap((sheet) =>
  sheet.passes.map((source, index) => ({ name: source.id, sheet, source, index })),
);
const stored = ({ sheet, index }: (typeof pairs)[number]) => sheetOf(sheet.key).passes[index]!;
const typed = pairs.filter(({ source }) => !source.linkTo);
const linked = pairs.filter(({ source }) => source.linkTo);

/** Finite decimals are exact, others agree in all the digits that are given. */
function sameFigure(actual: string | null | undefined, wanted: string) {
  const given = new Dec(actual ?? 'NaN');
  const digits = Math.max(new Dec(wanted).precision(), 1);
  if (digits < 25) expect(given.toFixed()).toBe(new Dec(wanted).toFixed());
  else expect(given.minus(wanted).div(wanted).abs().toNumber()).toBeLessThan(1e-20);
}

describe('machine and plan', () => {
  it('the nameplate, digit for letter', async () => {
    const { manufacturer, model, serialNumber, year } = sourceJob.machine;
    expect(board.machine).toMatchObject({ manufacturer, model, serialNumber, year });
    expect([...board.machine.serialNumber].map((sign) => sign.codePointAt(0))).toEqual(
      [...'LK32-\u0030\u004f\u0038\u0031-\u0042'].map((sign) => sign.codePointAt(0)),
    );
    expect(board.job).toMatchObject({
      reference: 'QMF-2041',
      purpose: 'overhaul',
      scope: sourceJob.job.scope,
      startsOn: sourceJob.job.from,
      endsOn: sourceJob.job.to,
      decisionRule: sourceJob.job.decisionRule,
      customerOrder: sourceJob.customer.order,
      customerEngineer: sourceJob.customer.engineer,
      hours: String(sourceJob.machine.hours),
    });
    expect(board.customer.name).toBe(sourceJob.customer.name);
    expect(board.people.map(({ name, role }) => `${name} ${role}`).sort()).toEqual(
      sourceJob.job.people.map(({ name, role }) => `${name} ${role}`).sort(),
    );
  });

  it('the make-up: axes with number, travel, programming and what they carry; spindles; turrets', () => {
    const { makeUp } = board.job;
    for (const axis of sourceJob.machine.axes) {
      const ours = makeUp.linearAxes.find(({ id }) => id === axis.id);
      expect(ours, axis.id).toMatchObject({ channel: axis.channel, travelMm: axis.travel });
      if (axis.programmedOn) expect(ours?.programmedOn).toBe(axis.programmedOn);
      if (axis.carries) expect(ours?.carries).toBe(axis.carries);
    }
    expect(makeUp.linearAxes).toHaveLength(sourceJob.machine.axes.length);
    const turrets = sourceJob.machine.components.filter(({ type }) => type === 'turret');
    expect(makeUp.turrets.map(({ id, channel, stations, axes }) => ({ id, channel, stations, axes }))).toEqual(
      turrets.map(({ id, channel, stations, axes }) => ({ id, channel, stations, axes })),
    );
    expect(makeUp.spindles.map(({ id, type, channel }) => [id, `${type}-spindle`, channel])).toEqual(
      sourceJob.machine.components
        .filter(({ type }) => type.endsWith('spindle'))
        .map(({ id, type, channel }) => [id, type, channel]),
    );
    expect(makeUp.sizeClass).toEqual({ criterion: 'bar-diameter', valueMm: sourceJob.machine.sizeClass.value });
  });

  it('what was opened, component by component, on the job and in its report', () => {
    const said = [...sourceJob.machine.components, ...sourceJob.machine.axes].map(({ id, condition }) => [
      id,
      condition,
    ]);
    const ours = Object.entries(board.job.componentConditions).map(([id, { condition, text }]) => [
      id,
      [text, partConditions[condition]].filter(Boolean).join(' '),
    ]);
    expect(Object.fromEntries(ours)).toEqual(Object.fromEntries(said));
    const printed = report.model.machine.components.flatMap(({ id, condition }) =>
      condition ? [[id, condition]] : [],
    );
    expect(printed.length).toBe(said.length);
  });

  it('the plan in the job’s working order, each test with what it rests on', () => {
    expect(sourceSheets.map(({ id }) => id)).toEqual(sourceOrder);
    expect(board.sheets.map(({ position }) => position)).toEqual(sourceSheets.map((_, index) => index + 1));
    expect(new Set(board.sheets.map(({ key }) => key))).toEqual(new Set(sourceSheets.map(({ key }) => key)));
    // At a turret, what is set up together is measured together; the circular test that is left out keeps its place before the cutting.
    const free = (key: string) => /^(TU-[123]b?|CI-1):/.test(key);
    const fixed = (keys: string[]) => keys.filter((key) => !free(key));
    expect(fixed(board.sheets.map(({ key }) => key))).toEqual(fixed(sourceSheets.map(({ key }) => key)));
    expect(board.sheets).toHaveLength(23);
    for (const source of sourceSheets) {
      const { component, dependsOn, direction } = sheetOf(source.key);
      expect(component, source.id).toMatchObject(source.component);
      expect(dependsOn, source.id).toEqual(source.dependsOn);
      if (source.direction !== null) expect(direction, source.id).toBe(source.direction);
    }
    // What the make-up also proposes is not forgotten: it stands there with its reason.
    expect(board.exclusions.length).toBeGreaterThan(0);
    expect(board.exclusions.every(({ reason }) => reason === 'not-touched')).toBe(true);
  });

  it('contract tolerances name their item; our own never pass for a published figure', () => {
    for (const source of sourceSheets) {
      const planned = sheetOf(source.key).tolerance;
      expect(planned === null, source.id).toBe(source.tolerance === null);
      if (!planned || !source.tolerance) continue;
      const { provenance } = planned;
      const { sourceKind, text } = source.tolerance.provenance;
      const kinds = sourceKind === 'contract' ? ['contract'] : ['from-memory', 'derived'];
      expect(kinds, source.id).toContain(provenance.kind);
      if (sourceKind === 'contract') expect(provenance.text).toBe(text);
    }
  });

  it('temperatures of the three days, as text and as figure', () => {
    expect(board.temperatures.map(({ measuredAt, air, machine }) => [measuredAt.getTime(), air, machine])).toEqual(
      sourceJob.conditions.log.map(({ at, air, machine }) => [Date.parse(at), air, machine]),
    );
  });
});

describe('sets of readings', () => {
  it('are those of the job, in its order', () => {
    for (const source of sourceSheets) {
      // A sheet that is left out keeps the empty set with which it began.
      const kinds = source.leftOut ? ['as-found'] : source.passes.map(({ kind }) => kind);
      expect(sheetOf(source.key).passes.map(({ kind }) => kind)).toEqual(kinds);
    }
    expect([typed.length, linked.length]).toEqual([35, 16]);
  });

  it.each(typed)('$name: readings as typed, their exact figures, time, person, instruments', async (pair) => {
    const { source } = pair;
    const pass = stored(pair);
    const rows = await workshop.as('inspector', (trx) =>
      trx('readings').where({ pass_id: pass.id }).select('pointer', 'text', 'value', 'unit'),
    );
    const byPointer = new Map(rows.map((row) => [row.pointer, row]));
    for (const { at, text, unit } of source.readings!) {
      const row = byPointer.get(at);
      expect(row, at).toMatchObject({ text, unit });
      const parts = at.split('/').slice(1);
      const asked = parts.reduce<unknown>((value, part) => (value as Record<string, unknown>)[part], source.request);
      const columns = typeof asked === 'string' ? asked : null;
      expect(columns, at).not.toBeNull();
      const lengths = /^(WP-1|TU-3x):/.test(pair.sheet.key) ? 'mm' : 'µm';
      const column = unit === '°C' ? unit : lengths;
      expect(new Dec(convert(row!.value, unit, column)).eq(columns!), `${at}: ${row!.value} ${unit}`).toBe(true);
    }
    expect(pass.takenBy).toBe(source.by);
    expect(pass.takenAt?.getTime()).toBe(Date.parse(source.takenAt));
    const numbers = new Map([...workshop.instruments].map(([number, id]) => [id, number]));
    expect(pass.instruments.map(({ instrumentId }) => numbers.get(instrumentId)).sort()).toEqual(
      [...source.instruments!].sort(),
    );
  });

  it('commas, typographic minus and millimetres in a column of µm are among them, kept as they are', async () => {
    const texts = typed.flatMap((pair) => Object.values(stored(pair).cells).map(({ text, unit }) => ({ text, unit })));
    expect(texts.filter(({ text }) => text.includes(',')).length).toBeGreaterThan(20);
    expect(texts.filter(({ text }) => text.includes('\u2212')).length).toBeGreaterThan(20);
    expect(stored(pairs.find(({ name }) => name === 't1-hole-height/as-found')!).cells['/toolHeight']).toMatchObject({
      text: '0,0136',
      unit: 'mm',
    });
  });

  it('the slip stands in the history, and what put it right with its reason', async () => {
    const pass = stored(pairs.find(({ name }) => name === 'z1-parallel-s1-zx/as-found')!);
    expect(pass.cells['/readings/180/3']).toEqual({ text: '5', unit: 'µm', version: 2 });
    const history = await workshop.as('inspector', (trx) =>
      trx('reading_operations')
        .where({ pass_id: pass.id, pointer: '/readings/180/3' })
        .orderBy('sequence')
        .select('text', 'reason', 'account_name', 'device_time', 'outcome'),
    );
    const reason = 'key pressed twice; dial read again at the same place';
    expect(history).toEqual([
      {
        ...{ text: '55', reason: null, account_name: 'T. Orrell', outcome: 'applied' },
        device_time: new Date('2026-03-10T12:16:00+01:00'),
      },
      {
        ...{ text: '5', reason, account_name: 'T. Orrell', outcome: 'applied' },
        device_time: new Date('2026-03-10T12:17:00+01:00'),
      },
    ]);
  });

  it.each(linked)('$name: nothing was done, nothing is typed again, the result is the one as found', async (pair) => {
    const pass = stored(pair);
    const found = sheetOf(pair.sheet.key).passes[0]!;
    expect(pass.linkedTo).toBe(found.id);
    expect(pass.cells).toEqual({});
    expect(pass.result).toEqual(found.result);
    expect(pass.takenAt).toEqual(found.takenAt);
  });
});

describe('results', () => {
  it.each(typed)('$name', async (pair) => {
    const { source, sheet } = pair;
    const row = await workshop.as('inspector', (trx) =>
      trx('pass_results')
        .where({ pass_id: stored(pair).id })
        .first(),
    );
    expect(row.state).toBe('complete');
    sameFigure(row.deviation_um, source.expected.deviation);
    expect(row.verdict).toBe(source.verdict);
    if (sheet.tolerance && source.conformity) {
      sameFigure(row.tolerance_um, sheet.tolerance.value);
      sameFigure(row.limit_um, source.conformity.expected.limit);
      sameFigure(row.margin_um, source.conformity.expected.margin);
    } else expect([row.tolerance_um, row.limit_um, row.margin_um]).toEqual([null, null, null]);
    expect(row.displayed_um).toBe(source.display.value);
    expect(new Dec(row.displayed_mm).times(1000).eq(row.displayed_um)).toBe(true);
    expect(row.outcome.displayed.extraDigits).toBe(Number(source.display.extraDigits ?? 0));
    expect(row.outcome.result.deviation).toBe(row.deviation_um);
    expect(row.rule_set).toMatch(/^witnessmark-\d+$/);
  });

  it('the sheet’s interface gives the same', async () => {
    for (const row of sourceRows) {
      if (!row.asLeft) continue;
      const source = sourceSheets.find(({ id }) => id === row.sheet)!;
      const final = source.passes.find(({ id }) => id === row.asLeft!.pass)!;
      const original = source.passes.find(({ id }) => id === (final.linkTo ?? final.id))!;
      const { body } = await workshop.call(getSheet, { method: 'GET', params: { id: sheetOf(source.key).id } });
      expect([body.state, body.result.verdict], row.sheet).toEqual(['left', row.asLeft.verdict]);
      sameFigure(body.result.deviationUm, original.expected.deviation);
    }
  });
});

describe('the check', () => {
  it('lets the square that ran out a day before pass for the reason that was given, and nothing else', () => {
    const findings = checkFindings(board, 'Europe/Berlin');
    expect(findings.filter(({ weight }) => weight === 'blocks')).toEqual([]);
    const overdue = findings.filter(({ kind }) => kind.startsWith('instrument'));
    expect(overdue).toMatchObject([{ kind: 'instrument-overdue-allowed', position: 8 }]);
    expect(overdue[0]!.text).toContain('IN-04 was due on 2026-03-10, used on 2026-03-11; allowed by J. Penhale');
    expect(findings.filter(({ kind }) => kind === 'out-of-tolerance')).toMatchObject([
      { weight: 'confirm', position: 8 },
    ]);
  });

  it('judges a day by the zone of the workshop: the as found of the due day itself is in date', () => {
    const found = stored(pairs.find(({ name }) => name === 'y1-square-x1/as-found')!);
    expect(found.takenAt?.toISOString()).toBe('2026-03-10T12:50:00.000Z');
    expect(found.instruments.every(({ overrideReason }) => overrideReason === null)).toBe(true);
    const override = sourceJob.events.find(({ type }) => type === 'instrument-override')!;
    const left = stored(pairs.find(({ name }) => name === 'y1-square-x1/as-left-1')!);
    const square = left.instruments.find(({ instrumentId }) => instrumentId === workshop.instruments.get('IN-04'));
    expect(square).toMatchObject({ overrideReason: override.reason, overrideBy: override.approvedBy });
  });
});

describe('the report', () => {
  it('counts as found and as left', () => {
    const counted = ({ outAcceptedWithRemark: _, ...counts }: Record<string, number>) => ({
      ...counts,
      notMeasured: 0,
    });
    expect(report.model.counts).toEqual({
      asFound: counted(sourceJob.final.counts.asFound),
      asLeft: counted(sourceJob.final.counts.asLeft),
    });
  });

  it('has a row for each test: shown figures, verdicts, tolerance, and whether anything was done', () => {
    const shown = (passId: string) => {
      const { source } = pairs.find(({ name }) => name === passId)!;
      const { value } = pairs.find(({ name }) => name === (source.linkTo ?? passId))!.source.display;
      const decimals = (value.split('.')[1] ?? '').length + 3;
      return formatDecimal(convert(value, 'µm', 'mm'), { decimals });
    };
    expect(report.model.summary).toHaveLength(23);
    for (const row of sourceRows) {
      const { key, leftOut } = sourceSheets.find(({ id }) => id === row.sheet)!;
      const shownRow = report.model.summary.find((one) => one.key === key)!;
      if (!row.asFound || !row.asLeft) {
        expect(leftOut?.reason).toBe('not-agreed');
        expect(shownRow).toMatchObject({ asFound: null, asLeft: null, leftOut: 'not agreed' });
        continue;
      }
      const mm = row.tolerance && new Dec(row.tolerance).div(1000).toDecimalPlaces(4, Dec.ROUND_DOWN).toFixed();
      expect(shownRow, row.sheet).toMatchObject({
        asFound: shown(row.asFound.pass),
        asFoundVerdict: row.asFound.verdict,
        asLeft: shown(row.asLeft.pass),
        asLeftVerdict: row.asLeft.verdict,
        linked: row.asLeft.linked,
        toleranceMm: mm,
        leftOut: null,
      });
    }
    expect(report.model.summary[7]).toMatchObject({ asFound: '0.0052', asLeft: '0.00504', toleranceMm: '0.005' });
    expect(report.model.summary[9]).toMatchObject({ asFound: '\u22120.0520', asLeft: '\u22120.0025' });
  });

  it('prints every reading as a figure of its column, and the slip with what it was', () => {
    const block = report.model.blocks.find(({ order }) => order === 5)!;
    // Every test says by which rules it was begun; they are those of its results.
    expect([...new Set(report.model.blocks.map(({ ruleSet }) => ruleSet))]).toEqual(['witnessmark-1']);
    expect(block.passes[0]!.corrections).toEqual([
      {
        field: expect.stringMatching(/180/),
        ...{ was: '55', now: '5', by: 'T. Orrell' },
        at: expect.stringContaining('12:17'),
        reason: 'key pressed twice; dial read again at the same place',
      },
    ]);
    const corrected = report.model.blocks.flatMap(({ passes }) => passes.flatMap(({ corrections }) => corrections));
    expect(corrected).toHaveLength(1);
    const straightness = report.model.blocks.find(({ order }) => order === 4)!.passes[0]!;
    // 0,0026 typed in mm stands in the column of µm as 2.6.
    expect(straightness.tables.flatMap(({ rows }) => rows.flatMap(({ cells }) => cells))).toContain('2.6');
  });

  it('names each instrument with the certificate that held, and the overdue one with its reason', () => {
    const square = report.model.instruments.find(({ number }) => number === 'IN-04')!;
    expect(square).toMatchObject({ certificate: 'HR-4967', due: '2026-03-10' });
    expect(square.override).toMatch(/^test 8: used after its due date, allowed by J\. Penhale: Calibration ran out/);
    expect(report.model.instruments.filter(({ override }) => override !== null)).toHaveLength(1);
    for (const { number, certificate, due } of report.model.instruments) {
      const source = sourceJob.instruments.find(({ id }) => id === number)!;
      expect({ certificate, due }).toEqual({ certificate: source.certificate, due: source.due });
    }
  });

  it('is frozen: its text has its hash, and no hand changes it', async () => {
    const { body, headers } = await workshop.call(getData, { method: 'GET', params: { id: report.id } });
    expect(body).toEqual(report.model);
    const text = await workshop.as('inspector', (trx) =>
      trx('reports')
        .where({ id: report.id })
        .first({ model: trx.raw('model::text') }),
    );
    expect(createHash('sha256').update(text.model).digest('hex')).toBe(report.modelSha256);
    expect(headers.get('x-content-sha256')).toBe(report.modelSha256);
    const forged = JSON.stringify({ ...report.model, headline: '21 of 21 judged tests within tolerance.' });
    await expect(
      workshop.as('reviewer', (trx) => trx('reports').where({ id: report.id }).update({ model: forged })),
    ).rejects.toMatchObject({ code: 'WM001' });
  });

  it('closes the job’s readings', async () => {
    const { id, passes } = sheetOf('AX-4:Y1:X1');
    const operation = {
      ...{ opId: newId(), passId: passes[1]!.id, cellId: '/first/measuredArm/points/2/reading', baseVersion: 1 },
      ...{ text: '5.0', unit: 'µm', source: 'typed', deviceTime: '2026-03-13T08:00:00Z', seq: 1 },
    };
    const { body } = await workshop.call(takeOperations, { params: { id }, body: { operations: [operation] } });
    expect(body.results[0].outcome).toBe('rejected');
  });
});

describe('the customer’s answer', () => {
  it('is the job’s: accepted with a remark on the one test that is out', async () => {
    expect(sourceJob.final.outcome).toBe('accept-with-remarks');
    expect(report).toMatchObject({ state: 'signed-with-remarks', revision: 1, number: 'QMF-2026-000001' });
    const [signatures, remarks, model] = await workshop.as('reviewer', async (trx) => [
      await listSignatures(trx, report.id),
      await listRemarks(trx, report.jobId),
      await signedModel(trx, report),
    ]);
    const customer = signatures.find(({ role }) => role === 'customer')!;
    expect(customer).toMatchObject({
      ...{ outcome: sourceJob.final.outcome, name: 'C. Vale', company: sourceJob.customer.name },
      ...{ method: 'on-tablet', witness: 'T. Orrell', signedAt: new Date('2026-03-12T11:45:00+01:00') },
      modelSha256: report.modelSha256,
    });
    const accepted = sourceJob.events.find(({ type }) => type === 'accepted-with-remark')!;
    expect(remarks).toMatchObject([
      {
        ...{ sheetId: sheetOf('AX-4:Y1:X1').id, sheetPosition: 8, number: 1, text: accepted.text, closedAt: null },
        ...{ owner: accepted.pointsList!.who, dueOn: accepted.pointsList!.due },
      },
    ]);
    expect(remarks.filter(({ closedAt }) => closedAt === null)).toHaveLength(sourceJob.final.pointsListOpen);
    expect(model.headline).toMatch(/^20 of 21 judged tests within tolerance; 1 out of tolerance, accepted with remark/);
    expect(model.summary.filter(({ remarkNo }) => remarkNo !== null)).toMatchObject([{ order: 8, remarkNo: 1 }]);
    // The figures are those that were shown before the signature.
    const strip = (rows: typeof model.summary) => rows.map(({ remarkNo: _, ...rest }) => rest);
    expect(strip(model.summary)).toEqual(strip(report.model.summary));
    expect({ ...model, headline: '', summary: [], document: 0, remarks: 0, signatures: 0 }).toEqual({
      ...report.model,
      ...{ headline: '', summary: [], document: 0, remarks: 0, signatures: 0 },
    });
  });

  it('stands in the machine’s history, for the customer as well', async () => {
    const { id } = workshop.machines.get('LK32-0O81-B')!;
    for (const as of ['inspector', 'customer'] as const) {
      const { status, body } = await workshop.call(getHistory, { as, method: 'GET', params: { id } });
      expect(status).toBe(200);
      expect(body.reports).toMatchObject([{ id: report.id, number: report.number, state: 'signed-with-remarks' }]);
    }
    expect((await workshop.call(getHistory, { as: 'stranger', method: 'GET', params: { id } })).status).toBe(404);
  });
});
