import type { EvaluationResult } from '@/lib/evaluation';
import type { Cells, PlotSeries, SheetFields } from '@/lib/sheet/types';
import { Fraction } from '@/lib/units/fraction';
import type { Assembled, LayoutEngine, LayoutOf, SheetValues } from './layout-engine';
import { countField, isFilled, readingField, setUpField } from './parts';
import { wholeCount } from './whole-count';

type AngleSteps = LayoutOf<'angle-steps'>;

const MAX_STEPS = 100;
const out = (step: number) => `/angles/${step}`;
const back = (step: number) => `/returnAngles/${step}`;
const indices = (length: number) => Array.from({ length }, (_, step) => step);

/** Steps that the travel holds, where a person wrote their number; goes into no input. */
const wantedSteps = (layout: AngleSteps, text: string | undefined): number =>
  wholeCount(text, { least: 2, most: MAX_STEPS }) ?? layout.steps;

/** As many steps as are wanted, and one more than are filled. */
function stepCount(wanted: number, filled: (pointer: string) => boolean): number {
  const last = indices(MAX_STEPS).findLast((step) => filled(out(step)) || filled(back(step))) ?? -1;
  return Math.min(Math.max(wanted, last + 2), MAX_STEPS);
}

function fields(layout: AngleSteps, cells: Cells): SheetFields {
  const wanted = wantedSteps(layout, cells['/steps']?.text);
  const steps = indices(stepCount(wanted, (pointer) => isFilled(cells, pointer)));
  const expected = steps.filter((step) => step < wanted || isFilled(cells, out(step)));
  return {
    setUp: [
      setUpField('/stepLength', 'step, the same as the foot of the instrument', 'mm'),
      countField('/steps', `number of steps (left empty: ${layout.steps})`),
    ],
    tables: [
      {
        title: null,
        columns: [
          { label: 'out', unit: 'µm/m' },
          ...(layout.returnRun ? [{ label: 'back', unit: 'µm/m' as const }] : []),
        ],
        rows: steps.map((step) => ({
          label: `step ${step + 1}`,
          cells: [
            { field: readingField(out(step), `step ${step + 1}, out`, 'µm/m') },
            ...(layout.returnRun ? [{ field: readingField(back(step), `step ${step + 1}, back`, 'µm/m') }] : []),
          ],
        })),
      },
    ],
    order: [...expected.map(out), ...(layout.returnRun ? [...expected].reverse().map(back) : [])],
  };
}

/** Steps from the first without a gap: a missing one would shift all heights after it. */
function readSteps(layout: AngleSteps, values: SheetValues) {
  const upTo = (pointer: (step: number) => string) => {
    const gap = indices(MAX_STEPS).find((step) => !values.has(pointer(step)));
    return gap ?? MAX_STEPS;
  };
  const [taken, returned] = [upTo(out), layout.returnRun ? upTo(back) : 0];
  const any = indices(MAX_STEPS).filter((step) => values.has(out(step)) || values.has(back(step))).length;
  const wanted = Math.max(any, wantedSteps(layout, values.get('/steps')));
  return { taken, withReturn: returned > 0 && returned >= taken, wanted };
}

function assemble(layout: AngleSteps, values: SheetValues): Assembled {
  const stepLength = values.get('/stepLength');
  if (stepLength === undefined) return { input: null, reason: 'The length of a step is needed.' };
  const count = values.get('/steps');
  if (count !== undefined && wholeCount(count, { least: 2, most: MAX_STEPS }) === null)
    return { input: null, reason: `The number of steps is a whole number from 2 to ${MAX_STEPS}.` };
  const { taken, withReturn, wanted } = readSteps(layout, values);
  if (taken < 2)
    return { input: null, reason: `Two steps one after another are needed from the first on; ${taken} so far.` };
  const steps = indices(taken);
  const few = taken < wanted ? `by the first ${taken} of ${wanted} steps` : null;
  return {
    input: {
      method: 'straightness-from-angles',
      reference: layout.reference,
      stepLength,
      angles: steps.map((step) => values.get(out(step))!),
      ...(withReturn ? { returnAngles: steps.map((step) => values.get(back(step))!) } : {}),
    },
    basedOn: few ?? (layout.returnRun && !withReturn ? 'the way out alone' : null),
    lengthMm: Fraction.from(stepLength).times(Fraction.of(taken)).toText(),
    notes: [],
  };
}

/** Heights over the length once there is a result; before that the angles step by step. */
function plot(_: AngleSteps, values: SheetValues, result: EvaluationResult | null): PlotSeries | null {
  const stepLength = values.get('/stepLength');
  if (result?.method === 'straightness-from-angles' && stepLength !== undefined) {
    const step = Fraction.from(stepLength);
    const points = result.heights.map((y, k) => ({ x: step.times(Fraction.of(k)).toText(), y }));
    return { kind: 'line', xLabel: 'position, mm', yLabel: 'height, µm', points };
  }
  const points = indices(MAX_STEPS).flatMap((k) => {
    const y = values.get(out(k));
    return y === undefined ? [] : [{ x: String(k + 1), y }];
  });
  return points.length ? { kind: 'line', xLabel: 'step', yLabel: 'angle, µm/m', points } : null;
}

export const angleSteps: LayoutEngine<AngleSteps> = { fields, assemble, plot };
