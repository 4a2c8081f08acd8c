import type { ReportModel } from '@/lib/reporting/report-model';
import { longDate } from '@/lib/reporting/report-text';
import { REPORT_WORDS } from '@/lib/reporting/words';
import { type FlowItem, space } from '@/templates/report/flow/ops';
import { heading, type Kit, pairs } from '@/templates/report/flow/parts';
import { type Column, headerRow, tableRows, tableWidth } from '@/templates/report/flow/table';
import { TYPE } from '@/templates/report/theme';

const TIMES_GAP_PT = 24;

/** Place, warm-up, compensation and the like; air and machine temperatures in two columns of times. */
export function conditions(kit: Kit, model: ReportModel): FlowItem[] {
  const words = REPORT_WORDS.conditions;
  const { place, airRange, lines, temperatures } = model.conditions;
  const entries = [
    ...(place ? [{ label: words.place, value: place }] : []),
    ...(airRange ? [{ label: words.airRange, value: airRange }] : []),
    ...lines,
  ];
  if (!entries.length && !temperatures.length) return [];
  const items = [...heading(kit, words.heading)];
  if (entries.length) items.push(pairs(kit, entries, { columns: 1, labelPt: 92 }));
  if (temperatures.length) items.push(space(4), temperatureTable(kit, temperatures));
  return items;
}

function temperatureTable(kit: Kit, temperatures: ReportModel['conditions']['temperatures']): FlowItem {
  const words = REPORT_WORDS.conditions;
  const half = (kit.widthPt - TIMES_GAP_PT) / 2;
  const figures = 62;
  const columns: Column[] = [
    { head: words.time, widthPt: half - 2 * figures - 16 },
    { head: words.air, widthPt: figures, align: 'decimal', style: TYPE.figure },
    { head: words.machine, widthPt: figures, align: 'decimal', style: TYPE.figure },
  ];
  const none = REPORT_WORDS.none;
  const rows = tableRows(
    kit.type,
    columns,
    temperatures.map(({ at, air, machine }) => [longDate(at), air ?? none, machine ?? none]),
  );
  const header = headerRow(kit.type, columns);
  const single = rows.length <= 3;
  const deep = single ? rows.length : Math.ceil(rows.length / 2);
  const right = tableWidth(columns) + TIMES_GAP_PT;
  const pair = (left: typeof header, other: typeof header | undefined) => ({
    heightPt: Math.max(left.heightPt, other?.heightPt ?? 0),
    ops: [
      { op: 'group' as const, x: 0, y: 0, ops: left.ops },
      ...(other ? [{ op: 'group' as const, x: right, y: 0, ops: other.ops }] : []),
    ],
  });
  return {
    kind: 'rows',
    header: pair(header, single ? undefined : header),
    rows: rows.slice(0, deep).map((row, index) => pair(row, rows[deep + index])),
  };
}
