import type { Layout } from '@/standards/types';
import type { Simulation } from './simulated-readings';

interface Measured {
  /** Deviation that the readings are to come to, µm or µm/m. */
  size: number;
  /** Figure that is judged. */
  judge: string | undefined;
  /** Stations that are set up. */
  stations: number;
  phase: number;
  number(pointer: string, otherwise?: number): number;
  from: number;
  span: number;
}

const radians = (deg: number) => (deg * Math.PI) / 180;

/** What an indicator, a level or a laser would have shown in one field, in the unit of its column; for the demo scenario only. */
export function furtherReading(layout: Layout, parts: string[], measured: Measured): number {
  const { size, judge, stations, phase, number, from, span } = measured;
  const along = (pointer: string) => (number(pointer) - from) / span;
  switch (layout.kind) {
    case 'angle-steps': {
      const steps = number('/steps', layout.steps);
      const arch = (step: number) => 4 * size * (step / steps) * (1 - step / steps);
      const step = Number(parts[1]);
      return ((arch(step + 1) - arch(step)) / number('/stepLength')) * 1000;
    }
    case 'two-runs': {
      const x = along(`/positions/${parts[1]}`);
      const slide = 4 * size * x * (1 - x);
      return (parts[0] === 'second' ? slide : -slide) + 1.4 * x;
    }
    case 'grid': {
      const middle = (figures: string[]) => (Number(figures[0]) + Number(figures.at(-1))) / 2;
      const away = (x: number, y: number) => (x - middle(layout.xMm)) ** 2 + (y - middle(layout.yMm)) ** 2;
      const all = layout.yMm.flatMap((y) => layout.xMm.map((x) => away(Number(x), Number(y))));
      const [near, far] = [Math.min(...all), Math.max(...all)];
      const [x, y] = [number(`/points/${parts[1]}/x`), number(`/points/${parts[1]}/y`)];
      return (size * (away(x, y) - near)) / (far - near) + y * 0.01;
    }
    case 'angular-runs':
      return size * (along(`/positions/${parts[1]}`) - 0.5) + (parts[0] === 'backward' ? size * 0.08 : 0);
    case 'target-cycles': {
      const x = along(`/targets/${parts[1]}`);
      // Of several runs A counts their scatter too.
      const share = layout.cycles > 1 ? 0.55 : 0.95;
      return size * share * x + 0.8 * Math.sin(x * 9 + phase) - (parts[0] === 'backward' ? size * 0.12 : 0);
    }
    case 'circle-trace': {
      const theta = radians(number(`/${parts[0]}/${parts[1]}/angle`));
      const lag = parts[0] === 'clockwise' ? 0.35 : -0.35;
      return (size / 2) * 0.8 * Math.cos(2 * theta + phase) + lag * Math.sin(2 * theta) + 3 * Math.cos(theta);
    }
    case 'rotation-turns': {
      const theta = radians(Number(layout.anglesDeg[Number(parts[2])] ?? number(`/angles/${parts[2]}`)));
      return (
        2.5 * Math.cos(theta) + (size / 2) * 0.6 * Math.cos(2 * theta + phase) + 0.2 * Math.sin(Number(parts[1]) * 1.7)
      );
    }
    case 'stations': {
      const [station, repeat] = [Number(parts[1]), Number(parts[3])];
      const round = Math.cos((2 * Math.PI * station) / stations);
      const again = repeat % 2 === 0 ? 0.5 : -0.5;
      return judge === 'accuracy'
        ? size * (round + again * 0.1)
        : size * (round * 0.3 + again * (station === 0 ? 1 : 0.6));
    }
    case 'circles': {
      const k = Number(parts[3]);
      // What swings through less than half a turn leans; it has no whole wave.
      if (Number(layout.anglesDeg.at(-1)) < 180) return (size * k) / (layout.anglesDeg.length - 1);
      const theta = radians(Number(layout.anglesDeg[k] ?? '0'));
      return (size / 2) * Math.cos(theta + phase) * (parts[1] === '0' ? 1 : 0.9);
    }
    case 'diameters':
      return -size * along(`/sections/${parts[1]}/position`);
    case 'round-trace': {
      const theta = radians(number(`/points/${parts[1]}/angle`));
      return 4 * Math.cos(theta) + (size / 2) * Math.cos(3 * theta + phase);
    }
    case 'time-series': {
      const share = number(`/points/${parts[1]}/minutes`) / 120;
      const grown = 1 - Math.exp(-2 * share);
      return parts[2] === 'temperature' ? 19 + 1.8 * grown : size * grown;
    }
    default:
      throw new Error(`no readings are made up for ${layout.kind}`);
  }
}

/** Every item in order; where the share is 1 or more, the first one is not. */
export function checkAnswers(layout: Extract<Layout, { kind: 'check-list' }>, share: number): Record<string, string> {
  return Object.fromEntries(
    layout.items.flatMap(({ id, value }, index) => {
      const answer = share >= 1 && index === 0 ? 'no' : 'yes';
      const figure = value && (value.lower ?? value.upper);
      return [
        [`/items/${id}/answer`, answer] as const,
        ...(figure === undefined ? [] : [[`/items/${id}/value`, figure] as const]),
      ];
    }),
  );
}

/** A mandrel of 40 mm that is found beside its place. */
export function foundAt({ setUp, tolerance, share }: Simulation): Record<string, string> {
  const shift = Number(tolerance?.baseUm ?? 10) * share;
  const shown = setUp['/basis']?.text === 'diameter' ? 2 * shift : shift;
  return { '/target': '40.000', '/found': (40 + Math.round(shown) / 1000).toFixed(3) };
}
