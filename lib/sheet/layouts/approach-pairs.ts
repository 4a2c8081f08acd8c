import type { Cells, PlotSeries, SheetFields } from '@/lib/sheet/types';
import { Fraction } from '@/lib/units/fraction';
import type { Assembled, LayoutEngine, LayoutOf, SheetValues } from './layout-engine';
import { all, choiceField, counted, derivedDifference, readingField } from './parts';

type Pairs = LayoutOf<'approach-pairs'>;

const feedWords = { 'cutting-feed': 'Cutting feed', rapid: 'Rapid' } as const;
const forward = (place: number, pair: number) => `/places/${place}/pairs/${pair}/forward`;
const backward = (place: number, pair: number) => `/places/${place}/pairs/${pair}/backward`;
const both = (place: number, pair: number) => [forward(place, pair), backward(place, pair)];
const indices = (length: number) => Array.from({ length }, (_, k) => k);

/** Places as they stand in the input: all of one feed, then all of the next. */
function placesOf(layout: Pairs) {
  return layout.feeds
    .flatMap((feed) => layout.places.map((place) => ({ feed, place, words: `${feedWords[feed]}, ${place}` })))
    .map((entry, index) => ({ ...entry, index }));
}

function fields(layout: Pairs, cells: Cells): SheetFields {
  const places = placesOf(layout);
  return {
    setUp: [
      choiceField('/sense', 'moving in +', [
        { value: 'plus-pushes-in', label: 'pushes the plunger in' },
        { value: 'plus-releases', label: 'releases the plunger' },
      ]),
    ],
    tables: places.map(({ words, index }) => ({
      title: words,
      columns: ['approach in +', 'approach in −', 'difference'].map((label) => ({ label, unit: 'µm' as const })),
      rows: indices(layout.pairs).map((pair) => ({
        label: `${pair + 1}`,
        cells: [
          { field: readingField(forward(index, pair), `${words}, pair ${pair + 1}, approach in +`) },
          { field: readingField(backward(index, pair), `${words}, pair ${pair + 1}, approach in −`) },
          { derived: derivedDifference(cells, forward(index, pair), backward(index, pair)) },
        ],
      })),
    })),
    order: places.flatMap(({ index }) => indices(layout.pairs).flatMap((pair) => both(index, pair))),
  };
}

function completePairs(layout: Pairs, values: SheetValues) {
  return placesOf(layout).map((entry) => ({
    ...entry,
    pairs: indices(layout.pairs).flatMap((pair) => {
      const found = all(values, both(entry.index, pair));
      return found ? [{ forward: found[0]!, backward: found[1]! }] : [];
    }),
  }));
}

function assemble(layout: Pairs, values: SheetValues): Assembled {
  const places = completePairs(layout, values);
  const used = places.reduce((sum, { pairs }) => sum + pairs.length, 0);
  if (used === 0) return { input: null, reason: 'A pair is needed: the same target approached in + and in −.' };
  const sense = values.get('/sense');
  return {
    input: {
      method: 'lost-motion',
      places: places.filter(({ pairs }) => pairs.length > 0).map(({ feed, place, pairs }) => ({ feed, place, pairs })),
      ...(sense === undefined ? {} : { sense }),
    },
    basedOn: counted(used, places.length * layout.pairs, 'pairs'),
    lengthMm: null,
    notes: [],
  };
}

/** Mean reading of either approach at each place: the gap between them is the figure that is judged. */
function plot(layout: Pairs, values: SheetValues): PlotSeries | null {
  const points = completePairs(layout, values).flatMap(({ pairs, index }) => {
    if (pairs.length === 0) return [];
    const mean = (side: 'forward' | 'backward') =>
      Fraction.mean(pairs.map((pair) => Fraction.from(pair[side]))).toText();
    const x = `${index + 1}`;
    return [
      { x, y: mean('forward'), series: 'approach in +' },
      { x, y: mean('backward'), series: 'approach in −' },
    ];
  });
  const n = layout.places.length;
  const ranges = layout.feeds.map((feed, k) => `${k * n + 1}–${(k + 1) * n} ${feedWords[feed].toLowerCase()}`);
  return points.length
    ? { kind: 'pairs', xLabel: `place: ${ranges.join(', ')}`, yLabel: 'mean reading, µm', points }
    : null;
}

export const approachPairs: LayoutEngine<Pairs> = { fields, assemble, plot };
