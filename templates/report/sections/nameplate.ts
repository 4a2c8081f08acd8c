import type { ReportModel } from '@/lib/reporting/report-model';
import { REPORT_WORDS } from '@/lib/reporting/words';
import { type FlowItem, moved, type Op, type Slab, slabItem, space, stack } from '@/templates/report/flow/ops';
import type { Kit } from '@/templates/report/flow/parts';
import { type TextStyle, TYPE } from '@/templates/report/theme';

const INSET_PT = 22;
const GAP_PT = 20;

/** The machine's plate with two screws: maker, model, year, customer, serial number large in mono. Long values go to a second row. */
export function nameplate(kit: Kit, model: ReportModel): FlowItem[] {
  const words = REPORT_WORDS.machine;
  const fields: [string, string, TextStyle][] = [
    [words.maker, model.machine.manufacturer, TYPE.firm],
    [words.model, model.machine.model, TYPE.firm],
    [words.year, model.machine.year === null ? '' : String(model.machine.year), TYPE.firm],
    [words.customer, model.customer.name, TYPE.firm],
    [words.serial, model.machine.serialNumber, TYPE.serial],
  ];
  const room = kit.widthPt - 2 * INSET_PT;
  const cells = fields
    .filter(([, value]) => value !== '')
    .map(([label, value, style]) => plateField(kit, label, value, style, room));
  const rows = inRows(cells, room);
  const inside = stack(rows, 6);
  const heightPt = inside.heightPt + 14;
  const plate: Op[] = [
    {
      op: 'box',
      x: 0.5,
      y: 0.5,
      widthPt: kit.widthPt - 1,
      heightPt: heightPt - 1,
      ink: 'ink',
      lineWidthPt: 1,
      radiusPt: 2,
    },
    ...screw(12, heightPt / 2),
    ...screw(kit.widthPt - 12, heightPt / 2),
    moved(inside, INSET_PT, 7),
  ];
  return [slabItem({ heightPt, ops: plate }), space(14)];
}

interface Cell {
  slab: Slab;
  widthPt: number;
}

function plateField(kit: Kit, label: string, value: string, style: TextStyle, room: number): Cell {
  const name = kit.type.line(label, { ...TYPE.small, leadPt: 9 });
  // Values of one row stand on one line whatever their size.
  const words = kit.type.paragraph(value, { ...style, leadPt: 16 }, room);
  const widthPt = Math.min(room, Math.max(kit.type.width(value, style), kit.type.width(label, TYPE.small)));
  return { slab: stack([name, words]), widthPt };
}

function inRows(cells: readonly Cell[], room: number): Slab[] {
  const rows: { slab: Slab; x: number }[][] = [];
  let x = 0;
  for (const cell of cells) {
    if (!rows.length || x + cell.widthPt > room) {
      rows.push([]);
      x = 0;
    }
    rows.at(-1)?.push({ slab: cell.slab, x });
    x += cell.widthPt + GAP_PT;
  }
  return rows.map((row) => ({
    heightPt: Math.max(...row.map(({ slab }) => slab.heightPt)),
    ops: row.map(({ slab, x: left }) => moved(slab, left, 0)),
  }));
}

function screw(x: number, y: number): Op[] {
  const [r, slot] = [4, 2.6];
  return [
    { op: 'box', x: x - r, y: y - r, widthPt: 2 * r, heightPt: 2 * r, ink: 'ink', lineWidthPt: 1, radiusPt: r },
    { op: 'line', x1: x - slot, y1: y - slot, x2: x + slot, y2: y + slot, ink: 'ink', widthPt: 1.6 },
  ];
}
