import type { MakeUp } from '@/lib/schemas/make-up';
import type { BoundComponent, CellDefault, TestDefinition } from '@/standards/types';
import { cell, circleCells, foundCells, gridCells, listed, stationCells, stepCells, targetCells } from './default-rows';

type SetUp = Record<string, CellDefault>;

/** Steps at which a travel is read, mm; the smallest that needs no more than so many positions. */
const STEPS_MM = [5, 10, 20, 25, 50, 100, 200, 250, 500];
const MOST_STEPS = 12;

/** What a person would set up first on this machine: positions within the travel, the usual choices. All of it can be changed. */
export function defaultSetUp(definition: TestDefinition, component: BoundComponent, makeUp: MakeUp): SetUp {
  const { layout } = definition;
  const travel = (id: string | undefined) => makeUp.linearAxes.find((axis) => axis.id === id)?.travelMm ?? null;
  switch (layout.kind) {
    case 'turns':
      return {};
    case 'angles-by-position':
      return positionCells(within(layout.positionsMm, travel(component.axis)), (row) => `/positions/${row}`);
    case 'profile':
      return positionCells(alongTravel(layout.positionsMm, travel(component.axis)), (row) => `/points/${row}/position`);
    case 'square-reversed':
      return {
        ...positionCells(
          within(layout.referencePositionsMm, travel(component.reference)),
          (row) => `/first/referenceArm/points/${row}/position`,
        ),
        ...positionCells(
          within(layout.measuredPositionsMm, travel(component.axis)),
          (row) => `/first/measuredArm/points/${row}/position`,
        ),
      };
    case 'swept-sections':
      return {
        '/surface': cell(layout.surface),
        '/up': cell('90', '°'),
        ...positionCells(layout.positionsMm, (row) => `/sections/${row}/position`),
      };
    case 'tool-centre':
      return {
        '/form': cell(layout.form),
        ...(layout.form === 'sweep' ? { '/surface': cell(layout.surface), '/up': cell('90', '°') } : {}),
        ...positionCells(radiiFor(layout.radiiMm, makeUp), (k) => `/radii/${k}`),
      };
    case 'approach-pairs':
      return { '/sense': cell('plus-pushes-in') };
    case 'two-collars':
      return { '/distance': cell(within(['0', layout.distanceMm], travel(component.axis)).at(-1)!, 'mm') };
    case 'angle-steps':
      return stepCells(layout, travel(component.axis));
    case 'two-runs':
      return positionCells(alongTravel(layout.positionsMm, travel(component.axis)), (row) => `/positions/${row}`);
    case 'angular-runs':
      return positionCells(alongTravel(layout.positionsMm, travel(component.axis)), (row) => `/positions/${row}`);
    case 'grid':
      return gridCells(layout);
    case 'target-cycles':
      return targetCells(layout, component, travel(component.axis));
    case 'circle-trace':
      return circleCells(layout, [travel(component.axis), travel(component.reference)]);
    case 'rotation-turns':
      return listed(layout.anglesDeg, '°', (row) => `/angles/${row}`);
    case 'stations':
      return stationCells(layout, component, makeUp);
    case 'diameters':
      return positionCells(within(layout.positionsMm, travel(component.axis)), (row) => `/sections/${row}/position`);
    case 'round-trace':
      return { '/surface': cell(layout.surface), ...listed(layout.anglesDeg, '°', (row) => `/points/${row}/angle`) };
    case 'time-series':
      return listed(layout.minutes, 'min', (row) => `/points/${row}/minutes`);
    case 'target-and-found':
      return foundCells(layout, component, makeUp);
    case 'circles':
    case 'check-list':
      return {};
  }
}

const positionCells = (positions: string[], pointer: (row: number) => string): SetUp =>
  listed(positions, 'mm', pointer);

/** The positions as they stand where the travel reaches; otherwise as many, evenly, over what it reaches. */
function within(positions: string[], travelMm: string | null): string[] {
  const first = Number(positions[0]);
  const reach = travelMm === null ? Number.POSITIVE_INFINITY : Number(travelMm);
  if (Number(positions.at(-1)) - first <= reach) return positions;
  const step = reach / (positions.length - 1);
  const rounded = step >= 10 ? Math.floor(step / 5) * 5 : Math.floor(step * 10) / 10;
  return positions.map((_, row) => String(Math.round((first + row * rounded) * 10) / 10));
}

function alongTravel(positionsMm: string[], travelMm: string | null): string[] {
  if (travelMm === null) return positionsMm;
  const travel = Number(travelMm);
  const step = STEPS_MM.find((candidate) => travel / candidate <= MOST_STEPS) ?? STEPS_MM.at(-1)!;
  const count = Math.floor(travel / step);
  const positions = Array.from({ length: count + 1 }, (_, row) => String(row * step));
  return count * step < travel ? [...positions, travelMm] : positions;
}

/** The largest radius that matters is that of the thickest bar. */
function radiiFor(radii: string[], makeUp: MakeUp): string[] {
  if (makeUp.sizeClass.criterion !== 'bar-diameter') return radii;
  const bar = String(Number(makeUp.sizeClass.valueMm) / 2);
  return [...radii.filter((radius) => Number(radius) < Number(bar)), bar];
}
