import type { MakeUp } from '@/lib/schemas/make-up';
import type { BoundComponent, CellDefault, TestDefinition } from '@/standards/types';
import { cell, circleCells, foundCells, gridCells, listed, stationCells, stepCells, targetCells } from './default-rows';
import { alongTravel, shortest, within } from './fit-positions';

type SetUp = Record<string, CellDefault>;

/** What a person would set up first on this machine: positions within the travel, the usual choices. All of it can be changed. */
export function defaultSetUp(definition: TestDefinition, component: BoundComponent, makeUp: MakeUp): SetUp {
  const { layout } = definition;
  const travel = (id: string | undefined) => makeUp.linearAxes.find((axis) => axis.id === id)?.travelMm ?? null;
  const reach = reachOf(component, makeUp, travel);
  // A piece, a mandrel or a casting keeps its own positions; only a slide alone is read over all of its travel.
  const along = (positions: string[]) =>
    component.turret || component.reference || component.tailstock
      ? within(positions, reach)
      : alongTravel(positions, reach);
  switch (layout.kind) {
    case 'turns':
      return {};
    case 'angles-by-position':
      return positionCells(within(layout.positionsMm, reach), (row) => `/positions/${row}`);
    case 'profile':
      return positionCells(along(layout.positionsMm), (row) => `/points/${row}/position`);
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
      return positionCells(along(layout.positionsMm), (row) => `/positions/${row}`);
    case 'angular-runs':
      return positionCells(along(layout.positionsMm), (row) => `/positions/${row}`);
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
      return positionCells(within(layout.positionsMm, reach), (row) => `/sections/${row}/position`);
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

/** What the axis reaches; between centres no more than the machine takes there, along an interpolated line what both axes do. */
function reachOf(component: BoundComponent, makeUp: MakeUp, travel: (id?: string) => string | null): string | null {
  const centres = component.tailstock ? makeUp.distanceBetweenCentresMm : null;
  const other = component.turret && component.reference ? travel(component.reference) : null;
  return shortest([travel(component.axis), centres, other]);
}

/** The largest radius that matters is that of the thickest bar. */
function radiiFor(radii: string[], makeUp: MakeUp): string[] {
  if (makeUp.sizeClass.criterion !== 'bar-diameter') return radii;
  const bar = String(Number(makeUp.sizeClass.valueMm) / 2);
  return [...radii.filter((radius) => Number(radius) < Number(bar)), bar];
}
