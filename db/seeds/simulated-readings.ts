import { scaleTolerance } from '@/lib/sheet/scale-tolerance';
import { sheetFields } from '@/lib/sheet/sheet-fields';
import type { Cells } from '@/lib/sheet/types';
import type { PlannedTolerance, TestDefinition } from '@/standards/types';
import { checkAnswers, foundAt, furtherReading } from './simulated-models';

/** Noise that is the same at every start, so that pictures and tests of the demo scenario stay the same. */
export function noise(seed: string): () => number {
  let state = [...seed].reduce((hash, sign) => Math.imul(hash ^ sign.charCodeAt(0), 0x01000193) >>> 0, 0x811c9dc5);
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4294967296 - 0.5;
  };
}

export interface Simulation {
  definition: TestDefinition;
  setUp: Cells;
  tolerance: PlannedTolerance | null;
  /** Deviation as a part of the tolerance: 0.4 is well within, 1.6 is out. */
  share: number;
  stepUm: number;
  seed: string;
}

/**
 * Readings as an indicator would have given them, for the demo scenario only: invented figures become text here, and are then read,
 * evaluated and judged like everybody's. Pointer → text.
 */
export function simulatedReadings(simulation: Simulation): Record<string, string> {
  const { definition, setUp, stepUm } = simulation;
  const random = noise(simulation.seed);
  const step = (um: number) => {
    const rounded = Math.round((um + random() * stepUm * 1.2) / stepUm) * stepUm;
    return rounded.toFixed(stepUm < 1 ? 1 : 0).replace(/^-0(\.0)?$/, '0$1');
  };
  const { layout } = definition;
  const order = sheetFields(definition, setUp).order;
  const model = readingModel(simulation, random);
  if (layout.kind === 'two-collars') return model.collars(order);
  if (layout.kind === 'check-list') return checkAnswers(layout, simulation.share);
  if (layout.kind === 'target-and-found') return foundAt(simulation);
  if (layout.kind === 'diameters')
    return Object.fromEntries(
      order.map((pointer) => [pointer, (40 + Math.round(model.at(pointer)) / 1000).toFixed(3)]),
    );
  return Object.fromEntries(order.map((pointer) => [pointer, step(model.at(pointer))]));
}

/** Limit over a length: the local one where it is the narrower for all of it. */
function limitOver({ tolerance }: Simulation, lengthMm: number): number {
  if (!tolerance) return 5;
  const whole = Number(scaleTolerance(tolerance, String(lengthMm)).toleranceUm);
  const { local } = tolerance;
  return local && lengthMm <= Number(local.lengthMm) ? Math.min(whole, Number(local.toleranceUm)) : whole;
}

function readingModel(simulation: Simulation, random: () => number) {
  const { definition, setUp, tolerance, share } = simulation;
  const number = (pointer: string, otherwise = 0) => Number(setUp[pointer]?.text.replace(',', '.') || otherwise);
  const positions = (list: string) =>
    Object.keys(setUp)
      .filter((pointer) => pointer.startsWith(list) && setUp[pointer]?.text)
      .map((pointer) => number(pointer));
  const along = [
    ...positions('/positions/'),
    ...positions('/points/'),
    ...positions('/first/measuredArm/'),
    ...positions('/targets/'),
    ...positions('/sections/'),
  ];
  const [from, to] = along.length > 1 ? [Math.min(...along), Math.max(...along)] : [0, 1];
  const span = to - from;
  const stations = Object.keys(setUp).filter((pointer) => /^\/stations\/\d+\/name$/.test(pointer)).length;
  const { layout } = definition;
  const stepped = layout.kind === 'angle-steps' ? number('/stepLength') * number('/steps', layout.steps) : null;
  const size = limitOver(simulation, stepped ?? span) * share;
  const phase = random() * 6;
  const angleOf = (text: string) => (Number(text) * Math.PI) / 180;

  const at = (pointer: string): number => {
    const parts = pointer.split('/').slice(1);
    switch (definition.layout.kind) {
      case 'turns':
        return (
          (size / 2) *
          Math.cos(angleOf(definition.layout.anglesDeg[Number(parts[3])] ?? '0') - phase - Number(parts[1]) * 0.4)
        );
      case 'angles-by-position': {
        const z = (number(`/positions/${parts[2]}`) - from) / span;
        const sign = definition.method === 'squareness-to-axis' ? -1 : 1;
        const runOut = (parts[1] === '0' ? 1 : -1) * (2 + 1.5 * z);
        return sign * size * z + runOut;
      }
      case 'profile': {
        const x = (number(`/points/${parts[1]}/position`) - from) / span;
        return 4 * size * x * (1 - x) + 3 * x;
      }
      case 'square-reversed': {
        if (parts[1] === 'referenceArm') return 0;
        const x = (number(`/first/measuredArm/points/${parts[3]}/position`) - from) / span;
        return (size + (parts[0] === 'first' ? 0.8 : -0.8)) * x;
      }
      case 'swept-sections':
        return (
          20 + size * Math.cos(angleOf(parts[3] ?? '0') - phase) + number('/sag') * Math.sin(angleOf(parts[3] ?? '0'))
        );
      case 'tool-centre': {
        if (parts[0] === 'spindleHeight') return 14;
        if (parts[0] === 'toolHeight') return 14 + size;
        const bore = setUp['/surface']?.text === 'bore' ? -1 : 1;
        const theta = angleOf(parts[1] ?? '0');
        return 40 + bore * (12 * Math.cos(theta) + (size + number('/sag')) * Math.sin(theta));
      }
      case 'approach-pairs':
        return parts[4] === 'backward' ? size : 0;
      case 'two-collars':
        return 0;
      default:
        return furtherReading(definition.layout, parts, {
          size,
          judge: definition.judge,
          stations,
          phase,
          number,
          from,
          span,
        });
    }
  };

  const collars = ([near, far]: string[]): Record<string, string> => {
    const distance = number('/distance', 100);
    const over = tolerance ? Number(scaleTolerance(tolerance, String(distance)).toleranceUm) * share : 1;
    const near_ = 40.012 + Math.round(random() * 8) / 1000;
    return { [near ?? '/D1']: near_.toFixed(3), [far ?? '/D2']: (near_ - (2 * over) / 1000).toFixed(3) };
  };
  return { at, collars };
}
