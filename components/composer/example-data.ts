import type { SheetData } from '@/components/sheet/sheet-data';
import { componentWords } from '@/lib/planning/component-words';
import type { exampleSheet } from '@/lib/planning/example-sheet';
import { wordsOnSheet } from '@/lib/planning/words-on-sheet';
import { cautionText } from '@/standards/cautions';
import { codeTitle } from '@/standards/registry';
import type { TestDefinition } from '@/standards/types';

export const examplePass = 'example';

/** A sheet of no job, for the sheet's own components to draw: what the inspector will find. */
export function exampleData(
  definition: TestDefinition,
  { sheet, machine }: NonNullable<ReturnType<typeof exampleSheet>>,
): SheetData {
  const cells = Object.fromEntries(
    Object.entries(sheet.setUp).map(([pointer, { text, unit }]) => [pointer, { text, unit, version: 0 }]),
  );
  return {
    sheet: {
      ...{ id: 'example', position: 1, title: sheet.title, component: sheet.component },
      ...{ leftOut: null, remark: null, version: 1 },
    },
    job: { id: 'example', reference: 'example', closed: null },
    machine: { manufacturer: '', model: machine.title, serialNumber: '' },
    place: componentWords(sheet.component, machine.makeUp),
    definition,
    cautions: definition.cautions.map(cautionText),
    words: wordsOnSheet(definition),
    rules: {
      definition: sheet.definition,
      tolerance: sheet.tolerance,
      direction: sheet.direction,
      decisionRule: 'simple',
    },
    codeTitle: codeTitle(definition.code, definition.edition),
    passes: [
      {
        ...{ id: examplePass, kind: 'as-found', number: 1, linkedTo: null, takenAt: null, takenBy: null },
        ...{ temperatureText: null, version: 1, cells, instruments: [], result: null },
      },
    ],
    instruments: [],
    recentInstruments: [],
    neighbours: { previous: null, next: null, count: 1 },
    viewer: { accountId: 'example', name: '', mayMeasure: true, mayAllow: false },
    timeZone: 'UTC',
    readAt: '',
  } satisfies SheetData;
}
