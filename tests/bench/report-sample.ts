import type { PlotSeries } from '@/lib/sheet/types';

/** What one page of the comparison holds: a table of 20 rows and a plot of 200 points. The same for all three. */
export interface SamplePage {
  title: string;
  columns: string[];
  rows: string[][];
  points: { x: string; y: string }[];
}

export const FOOT = ['QMF-2026-000214 r1', 'LK32-0O81-B'] as const;

/** Invented readings, different on every page, the same in every run. */
export function samplePages(count: number): SamplePage[] {
  return Array.from({ length: count }, (_, page) => ({
    title: `${page + 1} · Z motion parallel to spindle axis, ZX`,
    columns: ['z, mm', '0°, µm', '180°, µm', 'mean, µm'],
    rows: Array.from({ length: 20 }, (_, row) => {
      const reading = ((page * 7 + row * 13) % 41) - 20;
      return [`${row * 15}`, `${reading}`, `${reading + 2}`, `${reading + 1}.0`].map((text) => text.replace('-', '−'));
    }),
    points: Array.from({ length: 200 }, (_, i) => ({
      x: `${i * 1.5}`,
      y: (4 * Math.sin(i / 17 + page) + (i % 3) / 2).toFixed(1),
    })),
  }));
}

export function seriesOf(page: SamplePage): PlotSeries {
  return { kind: 'line', xLabel: 'z, mm', yLabel: 'reading, µm', points: page.points };
}
