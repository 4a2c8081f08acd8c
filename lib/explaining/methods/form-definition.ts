import type { EvaluationInput, EvaluationMethod } from '@/lib/evaluation';
import { allFields } from '@/lib/sheet/sheet-fields';
import type { Cells, SheetFields } from '@/lib/sheet/types';
import type { TestDefinition } from '@/standards/types';
import { type Chosen, chosenOr, type SheetForm } from './calculator-form';

/** A definition of no code around a method's form, so that the sheet's own engine draws, reads and judges it. */
export function formDefinition(
  method: EvaluationMethod,
  title: string,
  form: SheetForm,
  chosen: Chosen,
): TestDefinition {
  const holds = chosenOr(form.options, chosen);
  const { layout, judge } = form.layoutOf(holds);
  const shownIn = form.shownIn?.(holds);
  return {
    id: 'calculator',
    code: 'calculator',
    edition: '',
    version: 1,
    title,
    boundTitle: title,
    procedure: [],
    appliesTo: { kind: 'machine' },
    method,
    ...(judge === undefined ? {} : { judge }),
    layout,
    tolerance: null,
    direction: 'either',
    ...(shownIn === undefined || shownIn === 'mm' ? {} : { shownIn }),
    resolution: { valueUm: '0.1', rule: 'half-even' },
    instruments: [],
    cautions: [],
    sketch: { scene: 'checklist' },
    dependsOn: { components: [], moved: [], positioned: [] },
    workingStep: 0,
    judgedFigure: title,
    ...(form.positiveMeans ? { positiveMeans: form.positiveMeans } : {}),
    ...(form.negativeMeans ? { negativeMeans: form.negativeMeans } : {}),
    source: { kind: 'derived', text: 'the method as the calculator has it' },
  };
}

/** Every figure and word of an input by its place: `/points/3/reading`. */
export function leavesOf(input: unknown, at = ''): [string, string][] {
  if (Array.isArray(input)) return input.flatMap((part, k) => leavesOf(part, `${at}/${k}`));
  if (typeof input === 'object' && input !== null)
    return Object.entries(input).flatMap(([name, part]) => leavesOf(part, `${at}/${name}`));
  return input === undefined ? [] : [[at, String(input)]];
}

/** What the fields of a form hold when an input is written into them; rows come as they are filled. */
export function cellsOfInput(
  fieldsOf: (cells: Cells) => SheetFields,
  input: EvaluationInput,
  begin: Cells = {},
): Cells {
  const leaves = new Map(leavesOf(input));
  let cells = begin;
  for (;;) {
    const fresh = allFields(fieldsOf(cells)).filter(
      ({ pointer }) => leaves.has(pointer) && cells[pointer]?.text !== leaves.get(pointer),
    );
    if (fresh.length === 0) return cells;
    cells = {
      ...cells,
      ...Object.fromEntries(fresh.map(({ pointer, unit }) => [pointer, { text: leaves.get(pointer)!, unit }])),
    };
  }
}

/** Choices under which a form holds an input: those that the input names, and those that its lists ask for. */
export function chosenFor(form: SheetForm, input: EvaluationInput): Chosen {
  const given = input as unknown as Record<string, unknown>;
  const chosen = Object.fromEntries(
    form.options.flatMap(({ name }) => (typeof given[name] === 'string' ? [[name, given[name]]] : [])),
  );
  return { ...chosen, ...listChoices(input) };
}

function listChoices(input: EvaluationInput): Chosen {
  const count = (list: readonly unknown[] | undefined) => String(list?.length ?? 0);
  const yes = (is: boolean) => (is ? 'yes' : 'no');
  switch (input.method) {
    case 'straightness-from-angles':
      return { returnAngles: yes(input.returnAngles !== undefined) };
    case 'parallelism':
    case 'squareness-to-axis':
      return { angles: Object.keys(input.readings).join(' '), sag: yes(input.sag !== undefined) };
    case 'run-out':
      return { insertions: count(input.insertions), angles: count(input.insertions[0]?.readings) };
    case 'axial-run-out':
      return { circles: count(input.circles), angles: count(input.circles[0]?.readings) };
    case 'angular-deviation':
      return { ways: input.backward ? 'both' : 'out' };
    case 'positioning':
      return { cycles: count(input.forward[0]), ways: input.backward ? 'both' : 'forward' };
    case 'axis-of-rotation':
      return { turns: count(input.turns) };
    case 'indexing':
      return { repeats: count(input.stations[0]?.readings) };
    case 'lost-motion': {
      const feeds = [...new Set(input.places.map(({ feed }) => feed))];
      return {
        feeds: feeds.join(' '),
        places: String(input.places.length / feeds.length),
        pairs: count(input.places[0]?.pairs),
      };
    }
    case 'drift':
      return { temperature: yes(input.points.some(({ temperature }) => temperature !== undefined)) };
    default:
      return {};
  }
}
