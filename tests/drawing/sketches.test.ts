import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { setUpSketch } from '@/components/sketches/sketch-geometry';
import { SCENE_WORDS, SKETCH_WORDS } from '@/lib/reporting/words';
import type { SketchSpec } from '@/standards/types';
import { collisions, outside } from '../helpers/drawing-geometry';

const scenes = Object.keys(SCENE_WORDS) as SketchSpec['scene'][];
const component = {
  spindle: 'S1',
  axis: 'Z1',
  reference: 'S2',
  turret: 'T2',
  station: 14,
  tailstock: 'TS1',
  guideBush: 'GB1',
  rotary: 'C1',
  plane: 'ZX' as const,
};
const place = { widthPx: 360, heightPx: 234 };
const wordsOf = (spec: SketchSpec) =>
  setUpSketch(spec, component, place).items.flatMap((item) => (item.kind === 'text' ? [item.text] : []));

describe('set-up sketch', () => {
  it.each(scenes)('%s: inside its place, no word on a line or on another word', (scene) => {
    for (const spec of [
      { scene },
      { scene, anglesDeg: ['0', '180'], atMm: '300', positiveMeans: 'free end leans toward the tool' },
      { scene, anglesDeg: ['0', '45', '90', '135', '180', '225', '270', '315'], atMm: '0' },
    ] satisfies SketchSpec[]) {
      const drawing = setUpSketch(spec, component, place);
      expect(drawing.items.length).toBeGreaterThan(8);
      expect(outside(drawing)).toEqual([]);
      expect(collisions(drawing)).toEqual([]);
    }
  });

  it.each(scenes)('%s: says what it shows', (scene) => {
    const { description } = setUpSketch({ scene, anglesDeg: ['0', '180'] }, component, place);
    expect(description).toContain(SCENE_WORDS[scene]);
    expect(description).toContain('0° 180°');
  });

  it('names spindle, axis, angles, plane and the sense of the indicator', () => {
    expect(wordsOf({ scene: 'mandrel-along-motion', anglesDeg: ['0', '180'] })).toEqual(
      expect.arrayContaining(['S1', 'Z1', '0° 180°', 'Z', 'X', '+ in']),
    );
    expect(wordsOf({ scene: 'two-spindles-sweep' })).toEqual(expect.arrayContaining(['S1', 'S2']));
    expect(wordsOf({ scene: 'tool-hole-sweep' })).toEqual(expect.arrayContaining(['S1', 'T2']));
    expect(wordsOf({ scene: 'slide-approach' })).toEqual(expect.arrayContaining(['Z1 +', 'Z1 −']));
  });

  it('says the sense of a plunger only where there is one', () => {
    for (const scene of scenes) {
      const drawing = setUpSketch({ scene }, component, place);
      const shown = drawing.items.some((item) => item.kind === 'text' && item.text === SKETCH_WORDS.plungerIn);
      expect(drawing.description.includes(SKETCH_WORDS.plungerInCounts), scene).toBe(shown);
    }
  });

  it('names tailstock, guide bush, rotary axis and station where they are what is measured', () => {
    expect(wordsOf({ scene: 'between-centres' })).toEqual(expect.arrayContaining(['S1', 'TS1', 'Z1']));
    expect(wordsOf({ scene: 'guide-bush' })).toContain('GB1');
    expect(wordsOf({ scene: 'rotary-axis' })).toContain('C1');
    expect(wordsOf({ scene: 'gang-stations' })).toEqual(expect.arrayContaining(['T2', '14']));
    expect(setUpSketch({ scene: 'tailstock-quill' }, component, place).description).toContain('tailstock TS1');
  });

  it('draws every scene in a way of its own', () => {
    const drawn = scenes.map((scene) => JSON.stringify(setUpSketch({ scene }, {}, place).items));
    expect(new Set(drawn).size).toBe(scenes.length);
  });

  it('hatches material in every scene that shows some', () => {
    for (const scene of scenes.filter((one) => one !== 'checklist')) {
      const { items } = setUpSketch({ scene }, component, place);
      expect(items.some((item) => item.kind === 'path' && (item.d.match(/M/g) ?? []).length > 4)).toBe(true);
    }
  });

  it('keeps its proportions and stays inside any place', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...scenes),
        fc.integer({ min: 120, max: 1200 }),
        fc.integer({ min: 80, max: 900 }),
        (scene, widthPx, heightPx) => {
          const drawing = setUpSketch({ scene, anglesDeg: ['0', '90', '180', '270'], atMm: '100' }, component, {
            widthPx,
            heightPx,
          });
          expect(outside(drawing)).toEqual([]);
        },
      ),
    );
  });
});

it('finds a word on a line and on another word, and what leaves the place (control of the checks above)', () => {
  const word = {
    kind: 'text' as const,
    y: 20,
    text: 'S1',
    sizePx: 14,
    ink: 'ink' as const,
    anchor: 'start' as const,
    mono: true,
  };
  const drawing = { widthPx: 40, heightPx: 40, description: '' };
  const line = { kind: 'path' as const, d: 'M12 0L12 40', stroke: 'ink' as const };
  const arc = { kind: 'path' as const, d: 'M0 15A20 20 0 1 1 40 15A20 20 0 1 1 0 15Z', stroke: 'ink' as const };
  expect(collisions({ ...drawing, items: [{ ...word, x: 5 }, line] })).toHaveLength(1);
  expect(collisions({ ...drawing, items: [{ ...word, x: 15 }, line] })).toHaveLength(0);
  expect(
    collisions({
      ...drawing,
      items: [
        { ...word, x: 5 },
        { ...word, x: 10 },
      ],
    }),
  ).toHaveLength(1);
  expect(collisions({ ...drawing, items: [{ ...word, x: 32 }, arc] }).length).toBeGreaterThan(0);
  expect(outside({ ...drawing, items: [{ ...word, x: 32 }] }).length).toBeGreaterThan(0);
  expect(outside({ ...drawing, items: [arc] }).length).toBeGreaterThan(0);
});
