import type { MakeUp } from '@/lib/schemas/make-up';
import type { Unit } from '@/lib/units/unit';
import type { BoundComponent, CellDefault, Layout } from '@/standards/types';
import { within } from './fit-positions';
import { proposedTargets } from './proposed-targets';

type SetUp = Record<string, CellDefault>;
type LayoutOf<K extends Layout['kind']> = Extract<Layout, { kind: K }>;

export const cell = (text: string, unit: Unit | null = null): CellDefault => ({ text, unit });

/** One cell a figure, in the order given. */
export const listed = (figures: readonly string[], unit: Unit | null, pointer: (row: number) => string): SetUp =>
  Object.fromEntries(figures.map((figure, row) => [pointer(row), cell(figure, unit)]));

export function gridCells(layout: LayoutOf<'grid'>): SetUp {
  const points = layout.yMm.flatMap((y) => layout.xMm.map((x) => ({ x, y })));
  return {
    ...listed(
      points.map(({ x }) => x),
      'mm',
      (row) => `/points/${row}/x`,
    ),
    ...listed(
      points.map(({ y }) => y),
      'mm',
      (row) => `/points/${row}/y`,
    ),
  };
}

/** The foot keeps its length; a travel that does not hold all steps gets fewer, two at least. */
export function stepCells(layout: LayoutOf<'angle-steps'>, travelMm: string | null): SetUp {
  const held = travelMm === null ? layout.steps : Math.floor(Number(travelMm) / Number(layout.stepLengthMm));
  const fewer: SetUp = held < layout.steps ? { '/steps': cell(String(Math.max(held, 2))) } : {};
  return { '/stepLength': cell(layout.stepLengthMm, 'mm'), ...fewer };
}

export function targetCells(
  layout: LayoutOf<'target-cycles'>,
  component: BoundComponent,
  travelMm: string | null,
): SetUp {
  if (layout.quantity === 'rotary') return listed(layout.targets, '°', (row) => `/targets/${row}`);
  const proposed = travelMm !== null && layout.targets.length === 0;
  const targets = proposed ? proposedTargets(travelMm, component.axis ?? '') : within(layout.targets, travelMm);
  return listed(targets, 'mm', (row) => `/targets/${row}`);
}

/** The radius as given, or the largest whole 5 mm that both travels hold. */
export function circleCells(layout: LayoutOf<'circle-trace'>, travels: (string | null)[]): SetUp {
  const half = Math.min(...travels.flatMap((travel) => (travel === null ? [] : [Number(travel) / 2])));
  const fits = Number(layout.nominalRadiusMm) <= half;
  const reach = half >= 10 ? Math.floor(half / 5) * 5 : Math.floor(half);
  const radius = fits ? layout.nominalRadiusMm : String(Math.max(reach, 1));
  return {
    '/nominalRadius': cell(radius, 'mm'),
    ...(layout.arcDeg === '360' ? {} : { '/arc': cell(layout.arcDeg, '°') }),
    ...listed(layout.anglesDeg, '°', (row) => `/counterclockwise/${row}/angle`),
    ...listed(layout.anglesDeg, '°', (row) => `/clockwise/${row}/angle`),
  };
}

const MOST_STATIONS = 12;

/** Every station of the turret; every second, third … where there are more than a person indexes by hand. */
export function stationCells(layout: LayoutOf<'stations'>, component: BoundComponent, makeUp: MakeUp): SetUp {
  const count = makeUp.turrets.find(({ id }) => id === component.turret)?.stations ?? 4;
  const every = Math.ceil(count / MOST_STATIONS);
  const all = Array.from({ length: count }, (_, k) => k).filter((k) => k % every === 0);
  const names = layout.stations ?? all.map((k) => String(k + 1));
  return {
    ...(layout.radiusMm === null ? {} : { '/radius': cell(layout.radiusMm, 'mm') }),
    ...listed(names, null, (row) => `/stations/${row}/name`),
  };
}

/** As the axis is programmed, unless the definition says; the control's own factor is to be looked up. */
export function foundCells(layout: LayoutOf<'target-and-found'>, component: BoundComponent, makeUp: MakeUp): SetUp {
  const axis = makeUp.linearAxes.find(({ id }) => id === component.axis);
  const basis = layout.basis ?? axis?.programmedOn ?? 'radius';
  return { '/basis': cell(basis), '/controlFactor': cell(basis === 'diameter' ? '2' : '1') };
}
