import { allFields, sheetFields } from '@/lib/sheet/sheet-fields';
import type { Cells } from '@/lib/sheet/types';
import type { TestDefinition } from '@/standards/types';
import type { MethodLayout } from './default-layouts';
import type { MethodGuide } from './method-guide';

/** Every text of an input by its JSON pointer, which is the address of the field that it is typed into. */
export function textsByPointer(value: unknown, pointer = ''): Record<string, string> {
  if (typeof value === 'string') return { [pointer]: value };
  if (typeof value === 'boolean' || typeof value === 'number') return { [pointer]: String(value) };
  if (typeof value !== 'object' || value === null) return {};
  return Object.assign(
    {},
    ...Object.entries(value).map(([name, part]) => textsByPointer(part, `${pointer}/${name}`)),
  ) as Record<string, string>;
}

/** The worked example as it would be typed into the fields of its layout. */
export function exampleCells(guide: MethodGuide, definition: TestDefinition, { choices }: MethodLayout): Cells {
  const texts = { ...textsByPointer(guide.example.input), ...choices };
  const typed: Cells = Object.fromEntries(Object.entries(texts).map(([at, text]) => [at, { text, unit: null }]));
  return Object.fromEntries(
    allFields(sheetFields(definition, typed)).flatMap(({ pointer, unit }) => {
      const text = texts[pointer];
      return text === undefined ? [] : [[pointer, { text, unit }]];
    }),
  );
}

/** Where and how it is taken, without a reading: what stands in the fields before anybody types. */
export function startingCells(guide: MethodGuide, definition: TestDefinition, own: MethodLayout): Cells {
  const filled = exampleCells(guide, definition, own);
  const readings = new Set(
    allFields(sheetFields(definition, filled)).flatMap(({ role, pointer }) => (role === 'reading' ? [pointer] : [])),
  );
  return Object.fromEntries(Object.entries(filled).filter(([pointer]) => !readings.has(pointer)));
}
