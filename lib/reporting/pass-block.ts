import { figures } from '@/lib/sheet/figures';
import { sheetFields } from '@/lib/sheet/sheet-fields';
import { shownUnit } from '@/lib/sheet/shown-unit';
import type { Field, FieldTableCell } from '@/lib/sheet/types';
import { convert, convertible } from '@/lib/units/convert';
import { formatDecimal } from '@/lib/units/format';
import { parseNumber } from '@/lib/units/parse-number';
import type { Unit } from '@/lib/units/unit';
import type { ShownIn, TestDefinition } from '@/standards/types';
import { checkedItems } from './checked-items';
import { type CellChangeText, correctedReadings } from './corrected-readings';
import { formatTime } from './format-time';
import { linkedWords, passKindWords } from './record-words';
import type { PassBlock } from './report-model';
import type { JudgedOutcome, StoredPass } from './stored-job';

interface PassContext {
  definition: TestDefinition;
  timeZone: string;
  changes: CellChangeText[];
}

/** A set of readings as it prints: every figure that was typed, in the column's unit, and what it came to. */
export function passBlock(pass: StoredPass, context: PassContext): PassBlock {
  const { definition, timeZone } = context;
  const outcome = pass.result?.outcome ?? null;
  const fields = sheetFields(definition, pass.cells);
  const shown = (field: Field) => shownText(pass.cells[field.pointer], field);
  return {
    kind: pass.kind,
    kindWords: passKindWords(pass),
    takenAt: pass.takenAt && formatTime(pass.takenAt, timeZone),
    by: pass.takenBy,
    temperature: pass.temperature && `${formatDecimal(pass.temperature)} °C`,
    linkedWords: pass.linkedTo ? linkedWords : null,
    setUp: pass.linkedTo
      ? []
      : fields.setUp
          .filter((field) => shown(field) !== '')
          .map((field) => ({ label: setUpLabel(field), value: withFieldUnit(shown(field), field) })),
    tables:
      pass.linkedTo || definition.layout.kind === 'check-list'
        ? []
        : fields.tables
            .map((table) => ({
              title: table.title,
              columns: table.columns.map((column) => (column.unit ? `${column.label}, ${column.unit}` : column.label)),
              rows: table.rows
                .map((row) => ({ label: row.label, cells: row.cells.map((cell) => cellText(cell, shown)) }))
                .filter((row) => row.cells.some((text) => text !== '')),
            }))
            .filter((table) => table.rows.length > 0),
    resultMm: outcome && formatDecimal(outcome.displayed.textMm),
    resultUm: outcome && formatDecimal(outcome.displayed.textUm),
    ...unitOf(definition, outcome),
    ...(definition.layout.kind === 'check-list' && !pass.linkedTo
      ? { items: checkedItems(definition.layout, pass.cells) }
      : {}),
    resultWords: outcome?.directionWords ?? null,
    judgement: outcome?.judgement ?? null,
    plot: pass.linkedTo ? null : (outcome?.plot ?? null),
    figures: outcome && !pass.linkedTo ? figures(outcome) : [],
    corrections: pass.linkedTo ? [] : corrections(pass, fieldLabels(fields), context),
  };
}

/** What an empty field would mean is for the person who fills it in. */
const setUpLabel = ({ label }: Field) => label.replace(/ \(left empty: [^)]*\)/, '');

const withFieldUnit = (text: string, { unit }: Field) =>
  unit === null ? text : unit === '°' ? `${text}°` : `${text} ${unit}`;

function unitOf(definition: TestDefinition, outcome: JudgedOutcome | null): { resultUnit?: ShownIn } {
  if (definition.layout.kind === 'check-list') return { resultUnit: 'items' };
  const unit = shownUnit(outcome?.displayed);
  return unit === 'mm' ? {} : { resultUnit: unit };
}

const cellText = (cell: FieldTableCell | null, shown: (field: Field) => string): string => {
  if (cell === null) return '';
  return 'field' in cell ? shown(cell.field) : cell.derived.replace('-', '\u2212');
};

/** What was typed, as a figure in the column's unit; what cannot be read prints as it was typed. */
function shownText(cell: { text: string; unit: Unit | null } | undefined, field: Field): string {
  const text = cell?.text ?? '';
  if (text.trim() === '') return '';
  if (field.role === 'choice') return field.options?.find((option) => option.value === text)?.label ?? text;
  if (field.unit === null) return text;
  const parsed = parseNumber(text, { defaultUnit: cell?.unit ?? field.unit });
  if (!parsed.ok) return text;
  const unit = parsed.unit ?? field.unit;
  if (!convertible(unit, field.unit)) return text;
  // The zeros that were typed say how finely it was read: they stay.
  return formatDecimal(unit === field.unit ? parsed.value : convert(parsed.value, unit, field.unit));
}

const fieldLabels = (fields: ReturnType<typeof sheetFields>): Map<string, string> => {
  const labels = new Map(fields.setUp.map((field) => [field.pointer, field.label]));
  for (const table of fields.tables) {
    for (const row of table.rows) {
      for (const cell of row.cells) if (cell && 'field' in cell) labels.set(cell.field.pointer, cell.field.label);
    }
  }
  return labels;
};

const corrections = (pass: StoredPass, labels: Map<string, string>, context: PassContext): PassBlock['corrections'] =>
  correctedReadings(context.changes, pass.id).map(({ pointer, at, ...corrected }) => ({
    field: labels.get(pointer) ?? pointer,
    ...corrected,
    at: formatTime(at, context.timeZone),
  }));
