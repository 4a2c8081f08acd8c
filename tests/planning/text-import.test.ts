import { describe, expect, it } from 'vitest';
import { judgeSheet } from '@/lib/sheet/judge-sheet';
import {
  changeChoices,
  guessChoices,
  guessWays,
  importText,
  mappingOf,
  unitsFor,
} from '@/lib/sheet/text-import/import-text';
import type { ImportChoices, Mapped, MappingInput } from '@/lib/sheet/text-import/types';
import { readFigure, readTextTable } from '@/lib/sheet/text-table';
import type { Cells } from '@/lib/sheet/types';
import { currentDefinitions } from '@/standards/registry';
import type { Layout, TestDefinition } from '@/standards/types';

const targetCycles: Layout = { kind: 'target-cycles', quantity: 'linear', cycles: 5, targets: [] };
const circle: Layout = { kind: 'circle-trace', anglesDeg: [], nominalRadiusMm: '100', arcDeg: '360' };
const turning: Layout = { kind: 'rotation-turns', turns: 2, anglesDeg: [], direction: 'radial' };
const drift: Layout = { kind: 'time-series', minutes: [], temperature: true };

const plain: ImportChoices = {
  separator: 'tab',
  decimalMark: 'point',
  skipLines: 0,
  columns: [],
  units: {},
  directionBy: 'column',
  ways: {},
  positions: 'replace',
};

/** The mapping alone, with figures in the units of their fields. */
function map(layout: Layout, text: string, choices: Partial<ImportChoices>, cells: Cells = {}): Mapped {
  const said = { ...plain, ...choices };
  const lines = readTextTable(text, said).map(({ line, cells: written }) => {
    const of = (role: string, part: 'text' | 'value') =>
      said.columns.flatMap((one, column) => {
        if (one !== role) return [];
        const cell = written[column] ?? '';
        const figure = one === 'direction' ? { text: cell, value: cell } : readFigure(cell, said.decimalMark);
        if ('problem' in figure) throw new Error(figure.problem);
        return [figure[part]];
      });
    return { line, texts: (role: string) => of(role, 'text'), values: (role: string) => of(role, 'value') };
  });
  const decimal = (written: string) => {
    const figure = readFigure(written, 'point');
    return 'value' in figure && figure.value !== '' ? figure.value : null;
  };
  const input: MappingInput = {
    layout,
    lines,
    choices: said,
    cells,
    inUnit: (_, written) => decimal(written.replace(',', '.')),
    valueAt: (pointer) => decimal(cells[pointer]?.text ?? ''),
  };
  return mappingOf(layout)!.map(input);
}

const textsOf = ({ fills }: Pick<Mapped, 'fills'>) =>
  Object.fromEntries(fills.map(({ pointer, text }) => [pointer, text]));
const cellsOf = (texts: Record<string, string>): Cells =>
  Object.fromEntries(Object.entries(texts).map(([pointer, text]) => [pointer, { text, unit: null }]));

describe('positioning, a deviation a line', () => {
  const columns = ['position', 'run', 'direction', 'deviation'] as const;
  const text = ['0\t1\t+\t0.2', '105\t1\t+\t1.4', '105\t1\t-\t-0.6', '0\t1\t-\t-1.9', '0\t2\t+\t-0.1'].join('\n');

  it('targets in the order of the text, runs by their number, directions by the sign that the person explained', () => {
    const mapped = map(targetCycles, text, { columns: [...columns], ways: { '+': 'first', '-': 'second' } });
    expect(mapped.problems).toEqual([]);
    expect(textsOf(mapped)).toEqual({
      '/targets/0': '0',
      '/targets/1': '105',
      '/forward/0/0': '0.2',
      '/forward/1/0': '1.4',
      '/backward/1/0': '-0.6',
      '/backward/0/0': '-1.9',
      '/forward/0/1': '-0.1',
    });
    expect(mapped.notes).toEqual([{ line: null, message: 'Target 105 has 1 of 2 runs in the + direction.' }]);
  });

  it('words and arrows are what the person says that they are', () => {
    for (const [up, down] of [
      ['↑', '↓'],
      ['hin', 'zurück'],
    ] as const) {
      const written = text.replaceAll('\t+\t', `\t${up}\t`).replaceAll('\t-\t', `\t${down}\t`);
      const mapped = map(targetCycles, written, { columns: [...columns], ways: { [up]: 'second', [down]: 'first' } });
      expect(textsOf(mapped)).toMatchObject({ '/backward/1/0': '1.4', '/forward/1/0': '-0.6' });
    }
    expect(guessWays(['↑', '↓', 'hin', '+', 'backward'])).toEqual({
      '↑': 'first',
      '↓': 'second',
      '+': 'first',
      backward: 'second',
    });
    const unsaid = map(targetCycles, text, { columns: [...columns], ways: { '+': 'first' } });
    expect(unsaid.problems).toContainEqual({ line: 3, message: 'Say which direction “-” means.' });
  });

  it('without a direction column the targets show the way, and the turning point belongs to both', () => {
    const lines = '0\t1\n105\t2\n200\t3\n200\t4\n105\t5\n0\t6\n0\t7\n105\t8\n200\t9';
    const mapped = map(targetCycles, lines, { columns: ['position', 'deviation'], directionBy: 'travel' });
    expect(textsOf(mapped)).toMatchObject({
      '/forward/0/0': '1',
      '/forward/1/0': '2',
      '/forward/2/0': '3',
      '/backward/2/0': '4',
      '/backward/1/0': '5',
      '/backward/0/0': '6',
      '/forward/0/1': '7',
      '/forward/1/1': '8',
      '/forward/2/1': '9',
    });
  });

  it('runs that count through both ways are numbered for each direction', () => {
    const lines = '0\t1\t+\t1\n0\t2\t-\t2\n0\t3\t+\t3\n0\t4\t-\t4\n0\t10\t+\t5';
    const mapped = map(targetCycles, lines, { columns: [...columns], ways: { '+': 'first', '-': 'second' } });
    expect(textsOf(mapped)).toEqual({
      '/targets/0': '0',
      '/forward/0/0': '1',
      '/forward/0/1': '3',
      '/forward/0/2': '5',
      '/backward/0/0': '2',
      '/backward/0/1': '4',
    });
  });

  it('the same run twice, a target or a run that is missing: named with their lines', () => {
    const lines = '0\t1\t+\t1\n0\t1\t+\t2\n\t1\t+\t3\n0\t\t+\t4';
    const { problems } = map(targetCycles, lines, { columns: [...columns], ways: { '+': 'first' } });
    expect(problems).toEqual([
      { line: 3, message: 'The target position is missing.' },
      { line: 4, message: 'The number of the run is missing.' },
      { line: 2, message: 'Run 1 in the + direction at this target stands in line 1 already.' },
    ]);
  });

  it('targets are looked up among those of the sheet, by value', () => {
    const cells = cellsOf({ '/targets/0': '0', '/targets/1': '105.0', '/forward/1/0': '9' });
    const mapped = map(
      targetCycles,
      '105\t1\t+\t1.4\n50\t1\t+\t2',
      { columns: [...columns], ways: { '+': 'first' }, positions: 'match' },
      cells,
    );
    expect(textsOf(mapped)).toEqual({ '/forward/1/0': '1.4' });
    expect(mapped.clears).toEqual([]);
    expect(mapped.problems).toEqual([{ line: 2, message: 'The sheet has no target 50.' }]);
  });

  it('targets that take the place of the sheet’s empty what stood there', () => {
    const cells = cellsOf({ '/targets/0': '0', '/targets/1': '1', '/forward/1/3': '9', '/temperature': '21' });
    const mapped = map(targetCycles, '7\t1\t+\t1', { columns: [...columns], ways: { '+': 'first' } }, cells);
    expect(textsOf(mapped)).toEqual({ '/targets/0': '7', '/forward/0/0': '1' });
    expect(mapped.clears.sort()).toEqual(['/forward/1/3', '/targets/1']);
  });
});

describe('positioning, runs side by side', () => {
  it('a missing run keeps its place and is named', () => {
    const mapped = map(targetCycles, '0;1,5;;2,5;-1\n10;3;4;5;-2', {
      separator: 'semicolon',
      decimalMark: 'comma',
      columns: ['position', 'first', 'first', 'first', 'second'],
    });
    expect(textsOf(mapped)).toEqual({
      '/targets/0': '0',
      '/targets/1': '10',
      '/forward/0/0': '1,5',
      '/forward/0/2': '2,5',
      '/backward/0/0': '-1',
      '/forward/1/0': '3',
      '/forward/1/1': '4',
      '/forward/1/2': '5',
      '/backward/1/0': '-2',
    });
    expect(mapped.notes.map(({ message }) => message)).toEqual(['Target 0 has 2 of 3 runs in the + direction.']);
  });

  it('columns that contradict each other are refused', () => {
    const both = map(targetCycles, '0\t1\t2', { columns: ['position', 'deviation', 'first'] });
    expect([both.fills, both.problems[0]?.line]).toEqual([[], null]);
    expect(map(targetCycles, '0\t1', { columns: ['position', null] }).problems).toEqual([
      { line: null, message: 'Say which column holds the deviations.' },
    ]);
  });
});

describe('circular test', () => {
  it('5,000 lines, both directions one after the other', () => {
    const text = Array.from(
      { length: 5000 },
      (_, i) => `${((i % 2500) * 0.144).toFixed(3)}\t${i % 9}\t${i < 2500 ? 'cw' : 'ccw'}`,
    );
    const mapped = map(circle, text.join('\n'), {
      columns: ['angle', 'radius', 'direction'],
      ways: guessWays(['cw', 'ccw']),
    });
    expect([mapped.problems, mapped.fills.length]).toEqual([[], 10_000]);
    expect(textsOf(mapped)).toMatchObject({
      '/clockwise/1/angle': '0.144',
      '/clockwise/1/radius': '1',
      '/counterclockwise/2499/angle': '359.856',
      '/counterclockwise/2499/radius': '4',
    });
  });

  it('side by side; a closing reading is named; what stood in a direction that is there again is emptied', () => {
    const cells = cellsOf({ '/clockwise/7/radius': '1', '/counterclockwise/7/radius': '1', '/nominalRadius': '100' });
    const mapped = map(circle, '0\t1.5\n90\t2.5\n360\t1.4', { columns: ['angle', 'first'] }, cells);
    expect(textsOf(mapped)).toEqual({
      '/clockwise/0/angle': '0',
      '/clockwise/0/radius': '1.5',
      '/clockwise/1/angle': '90',
      '/clockwise/1/radius': '2.5',
    });
    expect(mapped.clears).toEqual(['/clockwise/7/radius']);
    expect(mapped.problems).toEqual([{ line: 3, message: expect.stringContaining('stands in line 1 already') }]);
  });
});

describe('other sheets', () => {
  it('turns of a spindle, by number or side by side', () => {
    const wanted = {
      '/angles/0': '0',
      '/angles/1': '90',
      '/turns/0/0': '1',
      '/turns/0/1': '2',
      '/turns/1/0': '3',
      '/turns/1/1': '4',
    };
    const long = map(turning, '0\t1\t1\n90\t1\t2\n0\t2\t3\n90\t2\t4', { columns: ['angle', 'turn', 'reading'] });
    const wide = map(turning, '0\t1\t3\n90\t2\t4', { columns: ['angle', 'reading', 'reading'] });
    expect([textsOf(long), textsOf(wide)]).toEqual([wanted, wanted]);
    expect(map(turning, '0\t1\t3\n90\t2\t', { columns: ['angle', 'reading', 'reading'] }).notes).toEqual([
      { line: null, message: 'At 90° there are 1 of 2 turns.' },
    ]);
  });

  it('readings over time, with temperatures', () => {
    const mapped = map(drift, '0\t0\t20.1\n5\t1.5\t\n5\t2\t21', { columns: ['minutes', 'reading', 'temperature'] });
    expect(textsOf(mapped)).toEqual({
      '/points/0/minutes': '0',
      '/points/0/reading': '0',
      '/points/0/temperature': '20.1',
      '/points/1/minutes': '5',
      '/points/1/reading': '1.5',
    });
    expect(mapped.problems).toEqual([{ line: 3, message: '5 minutes stand in line 2 already.' }]);
  });
});

describe('from a text to the verdict', () => {
  const base = currentDefinitions()[0]!;
  const judged = (layout: Layout, method: string, text: string, change: Partial<ImportChoices>) => {
    const definition: TestDefinition = { ...base, layout, method, direction: 'either', tolerance: null };
    const made = importText(definition, {}, text, { ...guessChoices(layout, text), positions: 'replace', ...change });
    expect(made.problems).toEqual([]);
    const cells = Object.fromEntries(
      made.fills.map(({ pointer, text: written, unit }) => [pointer, { text: written, unit }]),
    );
    const { id, code, edition, version } = definition;
    const rules = { definition: { id, code, edition, version }, tolerance: null, direction: 'either' as const };
    const outcome = judgeSheet({ ...rules, decisionRule: 'simple' }, definition, cells);
    if (outcome.state !== 'complete' && outcome.state !== 'partial') throw new Error(JSON.stringify(outcome));
    return outcome;
  };

  // The reference vector of five targets and five runs each way, written as somebody's spreadsheet would.
  const targets = ['0', '105', '198', '311', '402'];
  const forward = [
    '.2 -.1 .3 0 .1',
    '1.4 1.1 1.6 1.3 1.1',
    '2.9 2.6 3.1 2.8 2.6',
    '2.2 2.5 2 2.4 2.4',
    '4.1 3.8 4.4 4 4.2',
  ];
  const backward = [
    '-1.9 -2.2 -1.8 -2.1 -2',
    '-.6 -1 -.7 -.9 -.8',
    '.9 .5 1 .7 .9',
    '.4 .1 .6 .3 .1',
    '2.2 1.8 2.3 2 2.2',
  ];
  const runs = (list: string[]) => list.map((row) => row.split(' '));

  it('positioning, a line each, decimal commas, µm', () => {
    const lines = ['Ziel;Lauf;Richtung;Abweichung'];
    for (let run = 0; run < 5; run++) {
      for (const [i, target] of targets.entries()) lines.push(`${target};${run + 1};↑;${runs(forward)[i]![run]}`);
      for (const [i, target] of targets.entries()) lines.push(`${target};${run + 1};↓;${runs(backward)[i]![run]}`);
    }
    const text = lines.join('\r\n').replaceAll('.', ',');
    const outcome = judged(targetCycles, 'positioning', text, {
      columns: ['position', 'run', 'direction', 'deviation'],
      directionBy: 'column',
      ways: guessWays(['↑', '↓']),
    });
    expect(outcome.state).toBe('complete');
    expect(outcome.result).toMatchObject({ B: '2.1', meanB: '2.04', M: '4.05', E: '6.1', cycles: '5' });
    expect((outcome.result as { A: string }).A.slice(0, 6)).toBe('6.8634');
  });

  it('positioning, runs side by side, mm', () => {
    const mm = (row: string[]) => row.map((um) => (Number(um) / 1000).toFixed(4)).join('\t');
    const text = targets
      .map((target, i) => `${target}\t${mm(runs(forward)[i]!)}\t${mm(runs(backward)[i]!)}`)
      .join('\n');
    const outcome = judged(targetCycles, 'positioning', text, {
      columns: ['position', ...Array(5).fill('first'), ...Array(5).fill('second')],
      units: { first: 'mm', second: 'mm' },
    });
    expect(outcome.result).toMatchObject({ B: '2.1', meanB: '2.04', M: '4.05', E: '6.1', cycles: '5' });
  });

  it('circular test, 1,000 lines', () => {
    const text = Array.from(
      { length: 1000 },
      (_, i) => `${((i % 500) * 0.72).toFixed(2)},${i % 2 ? '1.5' : '-1.5'},${i < 500 ? '+' : '-'}`,
    );
    const outcome = judged(circle, 'circular', `angle,radius,dir\n${text.join('\n')}`, {});
    expect(outcome.result).toMatchObject({ Gb: '3', Fmax: '1.5', Fmin: '-1.5', D: '0' });
  });

  it('turns of a spindle and drift', () => {
    const turns = judged(turning, 'axis-of-rotation', '0 0 0\n90 1 1.5\n180 0.5 0\n270 -1 -1\n', {
      columns: ['angle', 'reading', 'reading'],
    });
    expect(turns.result).toMatchObject({ asynchronous: '0.5' });
    const over = judged(drift, 'drift', 'min temp reading\n0 20 0\n60 21 2\n120 22 3\n', {});
    expect(over.result).toMatchObject({ firstHour: '2', range: '3', rate: '1.5', temperatureRange: '2' });
  });
});

describe('a whole sheet', () => {
  const definition = currentDefinitions().find(({ layout }) => layout.kind === 'profile') as TestDefinition;
  const text = 'position;reading\n0;0,0012\n100;-0,0005\n200;0,002\n';

  it('is guessed, filled in and shown, with the unit that the person says', () => {
    const choices = guessChoices(definition.layout, text);
    expect(choices).toMatchObject({
      separator: 'semicolon',
      decimalMark: 'comma',
      skipLines: 1,
      columns: ['position', 'reading'],
    });
    const made = importText(definition, {}, text, { ...choices, positions: 'replace', units: { reading: 'mm' } });
    expect(made.problems).toEqual([]);
    expect(made.fills).toContainEqual({ pointer: '/points/1/reading', text: '-0,0005 mm', unit: 'mm' });
    expect(made.fills).toContainEqual({ pointer: '/points/1/position', text: '100', unit: 'mm' });
    expect(made.fields.order).toEqual(['/points/0/reading', '/points/1/reading', '/points/2/reading']);
  });

  it('says over how many fields it writes, and changes nothing itself', () => {
    const cells = cellsOf({ '/points/0/position': '0', '/points/0/reading': '7', '/points/1/position': '100' });
    const before = structuredClone(cells);
    const made = importText(definition, cells, text, { ...guessChoices(definition.layout, text), positions: 'match' });
    expect(made.over).toEqual(['/points/0/reading']);
    expect(made.problems).toEqual([{ line: 4, message: 'The sheet has no position 200.' }]);
    expect(made.fills.map(({ pointer }) => pointer)).toEqual(['/points/0/reading', '/points/1/reading']);
    expect(cells).toEqual(before);
  });

  it('names every line that cannot be read, and those for which there is no field', () => {
    const odd = 'position;reading\n0;1.234,5\n10;x\n20;1\n';
    const choices = { ...guessChoices(definition.layout, text), positions: 'replace' as const };
    expect(importText(definition, {}, odd, choices).problems.map(({ line }) => line)).toEqual([2, 3]);
    const long = Array.from({ length: 5000 }, (_, i) => `${i};1`).join('\n');
    const { problems, fills } = importText(definition, {}, long, { ...choices, skipLines: 0 });
    expect(problems.every(({ message }) => message === 'The sheet has no field left for this line.')).toBe(true);
    expect(fills.length + problems.length).toBe(10_000);
  });

  it('a direction column that is named is used, and what it holds is proposed', () => {
    const written = '0;+;1\n0;x;2';
    const before = guessChoices(targetCycles, written);
    expect(before.directionBy).toBe('first');
    const named = changeChoices(written, before, { columns: ['position', 'direction', 'deviation'] });
    expect(named).toMatchObject({ directionBy: 'column', ways: { '+': 'first' } });
    const said = changeChoices(written, named, { ways: { '+': 'second', x: 'first' } });
    expect(said.ways).toEqual({ '+': 'second', x: 'first' });
    expect(changeChoices(written, said, { columns: ['position', null, 'deviation'] }).directionBy).toBe('first');
  });

  it('a comma that would be both is refused', () => {
    const choices = { ...guessChoices(definition.layout, text), separator: 'comma' as const };
    expect(importText(definition, {}, text, choices)).toMatchObject({ fills: [], problems: [{ line: null }] });
  });

  it('units are those that fit the field', () => {
    const [position] = mappingOf(definition.layout)!.columns(definition.layout);
    expect(unitsFor(position!)).toEqual(['mm', 'µm', 'in']);
  });
});
