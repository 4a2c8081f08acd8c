import { existsSync, mkdirSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import createKnex, { type Knex } from 'knex';
import { ruleSet } from '@/lib/evaluation';
import { judgeSheet } from '@/lib/sheet/judge-sheet';
import type { Cells, SheetOutcome, SheetRules } from '@/lib/sheet/types';
import { findDefinition } from '@/standards/registry';
import { variedPasses } from './varied-passes';

/** A pass as it is stored: what it was judged by, what was typed, what came of it. */
export interface StoredPass {
  sheet: string;
  kind: string;
  rules: SheetRules;
  cells: Cells;
  outcome: SheetOutcome;
}

export interface StoredDefinition {
  ruleSet: string;
  definition: SheetRules['definition'];
  passes: StoredPass[];
}

export interface StoredReport {
  number: string;
  revision: number;
  state: string;
  sha256: string;
  /** The frozen model, the very text that is stored. */
  model: string;
}

const PASSES_OF_EACH = 6;
const REPORTS = 5;

type Row = {
  key: string;
  definition: SheetRules['definition'];
  tolerance: SheetRules['tolerance'];
  direction: SheetRules['direction'];
  decisionRule: SheetRules['decisionRule'];
  passId: string;
  kind: string;
  cells: Cells;
  outcome: SheetOutcome | null;
};

/**
 * Writes stored passes and issued reports of a database as fixtures: run it once with each version of the program, on its
 * own demo scenario, before the next version is begun. What is there already is never written again.
 * @param ownerUrl address of a database, as its owner
 * @param folder of this version's fixtures, which must not be there yet
 */
export async function takeRecords(ownerUrl: string, folder: string): Promise<void> {
  if (existsSync(folder)) throw new Error(`${folder} is there already; records are never written again`);
  const db = createKnex({ client: 'pg', connection: ownerUrl, pool: { min: 1, max: 1 } });
  try {
    for (const sub of ['sheets', 'varied', 'reports']) mkdirSync(path.join(folder, sub), { recursive: true });
    const write = (name: string, content: unknown) =>
      writeFileSync(path.join(folder, name), `${JSON.stringify(content, null, 2)}\n`, { flag: 'wx' });
    const organisations: { id: string }[] = await db('organisations').select({ id: 'organisation_id' });
    const [passes, reports]: [Row[], StoredReport[]] = [[], []];
    for (const { id } of organisations) {
      await db.raw(`select set_config('app.organisation', ?, false), set_config('app.customer', 'staff', false)`, [id]);
      for (const row of await passesIn(db)) passes.push({ ...row, cells: await cellsOf(db, row.passId) });
      reports.push(
        ...(await db('reports')
          .select('number', 'revision', 'state', db.raw('model_sha256 as sha256'), db.raw('model::text as model'))
          .orderBy('number')
          .orderBy('revision')),
      );
    }
    for (const [name, rows] of perDefinition(passes)) {
      write(`sheets/${name}.json`, { ruleSet, definition: rows[0]!.definition, passes: rows.map(storedPass) });
    }
    for (const passes of variedByDefinition().values()) {
      const { definition } = passes[0]!.rules;
      write(`varied/${nameOf(definition)}.json`, { ruleSet, definition, passes });
    }
    for (const [index, report] of differentReports(reports).entries())
      write(`reports/report-${index + 1}.json`, report);
  } finally {
    await db.destroy();
  }
}

/** One of each state, then the longest. */
function differentReports(reports: StoredReport[]): StoredReport[] {
  const long = reports.toSorted((a, b) => b.model.length - a.model.length);
  const first = long.filter((report, index) => long.findIndex(({ state }) => state === report.state) === index);
  return [...new Set([...first, ...long])].slice(0, REPORTS);
}

async function passesIn(db: Knex): Promise<Omit<Row, 'cells'>[]> {
  return db('passes')
    .join('sheets', 'sheets.id', 'passes.sheet_id')
    .join('jobs', 'jobs.id', 'sheets.job_id')
    .leftJoin('pass_results', 'pass_results.pass_id', 'passes.id')
    .whereNull('passes.linked_to')
    .orderBy(['jobs.id', 'sheets.position', 'passes.number'])
    .select({
      key: 'sheets.key',
      definition: 'sheets.definition',
      tolerance: 'sheets.tolerance',
      direction: 'sheets.direction',
      decisionRule: 'jobs.decision_rule',
      passId: 'passes.id',
      kind: 'passes.kind',
      outcome: 'pass_results.outcome',
    });
}

const nameOf = ({ id, code, edition, version }: SheetRules['definition']) =>
  `${code} ${edition} ${id} ${version}`.toLowerCase().replaceAll(/[^a-z0-9]+/g, '-');

function variedByDefinition(): Map<string, StoredPass[]> {
  const groups = new Map<string, StoredPass[]>();
  for (const pass of variedPasses()) {
    const name = nameOf(pass.rules.definition);
    groups.set(name, [...(groups.get(name) ?? []), pass]);
  }
  return groups;
}

/** A few passes of each definition, as different from one another as there are. */
function perDefinition(rows: Row[]): Map<string, Row[]> {
  const groups = new Map<string, Row[]>();
  for (const row of rows) {
    const name = nameOf(row.definition);
    groups.set(name, [...(groups.get(name) ?? []), row]);
  }
  const look = ({ outcome, kind }: Row) =>
    outcome && 'judgement' in outcome ? `${outcome.state} ${outcome.judgement.verdict} ${kind}` : 'nothing yet';
  for (const [name, all] of groups) {
    const first = all.filter((row, index) => all.findIndex((other) => look(other) === look(row)) === index);
    groups.set(name, [...new Set([...first, ...all])].slice(0, PASSES_OF_EACH));
  }
  return groups;
}

async function cellsOf(db: Knex, passId: string): Promise<Cells> {
  const rows: { pointer: string; text: string; unit: Cells[string]['unit'] }[] = await db('readings')
    .where({ pass_id: passId })
    .orderBy('pointer')
    .select('pointer', 'text', 'unit');
  return Object.fromEntries(rows.map(({ pointer, text, unit }) => [pointer, { text, unit }]));
}

/** Where nothing could be evaluated yet no result is stored: then what this version says of the pass is kept. */
function storedPass({ key, kind, outcome, cells, ...sheet }: Row): StoredPass {
  const { id, code, edition, version } = sheet.definition;
  const { definition, tolerance, direction, decisionRule } = sheet;
  const rules = { definition, tolerance, direction, decisionRule };
  const said = outcome ?? judgeSheet(rules, findDefinition(id, code, edition, version)!, cells);
  return { sheet: key, kind, rules, cells, outcome: said };
}
