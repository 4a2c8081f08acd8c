import { describe, expect, it } from 'vitest';
import { evaluationInput } from '@/lib/evaluation';
import { cautions } from '@/standards/cautions';
import { sketchScenes } from '@/standards/sketch-scenes';
import type { Layout, TestDefinition } from '@/standards/types';
import { workingSteps } from '@/standards/working-order';
import { expectProvenance } from './expect-provenance';
import { evaluated } from './sample-results';
import { isMeasured, named, partsOf } from './whole-catalogue';

/** Which methods the readings of a layout can be given to. */
const methodsOf: Record<Layout['kind'], string[]> = {
  turns: ['run-out'],
  'angles-by-position': ['parallelism', 'squareness-to-axis'],
  profile: ['straightness'],
  'square-reversed': ['squareness'],
  'swept-sections': ['coaxiality'],
  'tool-centre': ['centre-height'],
  'approach-pairs': ['lost-motion'],
  'two-collars': ['two-collar'],
  'angle-steps': ['straightness-from-angles'],
  'two-runs': ['straightness-reversal'],
  grid: ['flatness'],
  'angular-runs': ['angular-deviation'],
  'target-cycles': ['positioning'],
  'circle-trace': ['circular'],
  'rotation-turns': ['axis-of-rotation'],
  stations: ['indexing'],
  circles: ['axial-run-out'],
  diameters: ['diameter-consistency'],
  'round-trace': ['roundness'],
  'time-series': ['drift'],
  'target-and-found': ['reference-shift'],
  'check-list': ['function-check'],
};

const isSigned = ({ method, judge }: TestDefinition) =>
  ['squareness-to-axis', 'squareness', 'centre-height', 'two-collar'].includes(method) ||
  (method === 'parallelism' && judge !== 'range');

/** Figures that a method can be told to judge, by its own schema. */
function judgesOf(method: string): string[] {
  for (const schema of evaluationInput.options) {
    if (!('shape' in schema) || schema.shape.method.value !== method) continue;
    return 'judge' in schema.shape ? [...schema.shape.judge.unwrap().options] : [];
  }
  return [];
}

const placeholders = (text: string) => [...text.matchAll(/\{(\w+)\}/g)].map(([, part]) => part as string);

describe.each(named)('$name', ({ definition }) => {
  const measured = isMeasured(definition);

  it('is complete', () => {
    const { title, boundTitle, procedure, judgedFigure, instruments, sketch, source, minutes } = definition;
    for (const text of [title, boundTitle, judgedFigure, ...procedure]) expect(text.trim().length).toBeGreaterThan(5);
    for (const text of instruments) expect(text.trim().length).toBeGreaterThan(3);
    if (measured) expect(instruments.length).toBeGreaterThan(0);
    if (measured) expect(procedure.length).toBeGreaterThanOrEqual(4);
    expect(sketchScenes).toContain(sketch.scene);
    expect(Object.values(workingSteps) as number[]).toContain(definition.workingStep);
    expect(minutes).toBeGreaterThan(0);
    expectProvenance(source);
    if (definition.testNumber !== undefined) expectProvenance(definition.testNumberSource!);
  });

  it('names usual mistakes, each a sentence', () => {
    const mistakes = definition.usualMistakes ?? [];
    if (measured) expect(mistakes.length).toBeGreaterThanOrEqual(2);
    expect(mistakes.length).toBeLessThanOrEqual(4);
    for (const mistake of mistakes) expect(mistake).toMatch(/^[A-Z].{15,}\.$/);
    for (const step of definition.procedure) expect(step).toMatch(/^[A-Z].*[.:]$/s);
    expect(new Set([...mistakes, ...definition.procedure]).size).toBe(mistakes.length + definition.procedure.length);
  });

  it('puts only such parts into its titles as every component has', () => {
    const parts = partsOf(definition);
    for (const text of [definition.boundTitle, definition.setUpTogether ?? '']) {
      for (const part of placeholders(text)) expect(parts).toContain(part);
      expect(text.replace(/\{\w+\}/g, '')).not.toMatch(/[{}]/);
    }
    if (definition.setUpTogether !== undefined) expect(definition.setUpTogether.trim().length).toBeGreaterThan(5);
  });

  it('rests on parts that every component has', () => {
    const parts = partsOf(definition);
    const carriers = ['tool-spindle', 'tool-spindle-and-spindle', 'rotary-axis'];
    const { components, moved, positioned } = definition.dependsOn;
    const inMakeUp = { bed: null, 'guide-bush': 'guideBush', 'tool-changer': 'toolChanger' } as const;
    for (const part of components) {
      const name = part in inMakeUp ? inMakeUp[part as keyof typeof inMakeUp] : part;
      if (name !== null) expect(parts).toContain(name);
    }
    for (const part of [...moved, ...positioned]) {
      if (part === 'turret-axes' || part === 'turret-cross-axis')
        expect(parts.includes('turret') || carriers.includes(definition.appliesTo.kind)).toBe(true);
      else if (part === 'spindle-axis')
        expect(parts.some((one) => one === 'spindle' || one === 'reference')).toBe(true);
      else expect(parts).toContain(part);
    }
    if (measured) expect(components.length + moved.length + positioned.length).toBeGreaterThan(0);
  });

  it('has a layout whose readings its method takes, and judges a figure that the method knows', () => {
    expect(methodsOf[definition.layout.kind]).toContain(definition.method);
    if (definition.judge !== undefined) expect(judgesOf(definition.method)).toContain(definition.judge);
    for (const { figure } of definition.also ?? []) {
      const value = (evaluated(definition.method) as Record<string, unknown>)[figure];
      expect(typeof value, figure).toBe('string');
      expect(figure).not.toBe(definition.judge);
    }
  });

  it('permits one side only where the result has sides, and says in words what they are', () => {
    if (definition.direction !== 'either') expect(isSigned(definition)).toBe(true);
    if (isSigned(definition)) expect(definition.positiveMeans && definition.negativeMeans).toBeTruthy();
    if (definition.positiveMeans) expect(definition.negativeMeans).not.toBe(definition.positiveMeans);
  });

  it('shows angles as angles', () => {
    const { layout, shownIn } = definition;
    if (layout.kind === 'angular-runs') expect(shownIn).toBe('mm/m');
    if (layout.kind === 'target-cycles' && layout.quantity === 'rotary') expect(shownIn).toBe('″');
    if (layout.kind === 'check-list') expect(shownIn).toBe('items');
    if (shownIn === undefined || shownIn === 'mm') expect(definition.tolerance?.unit ?? 'µm').toBe('µm');
  });

  it('has cautions: makers and local rules always, and none that gets round a guard', () => {
    expect(definition.cautions).toContain('maker-and-local-rules-first');
    if (measured) expect(definition.cautions.length).toBeGreaterThanOrEqual(3);
    for (const id of definition.cautions) expect(cautions[id].length).toBeGreaterThan(20);
    expect(new Set(definition.cautions).size).toBe(definition.cautions.length);
  });

  it('checks that the reading returns, and says how the sign counts, where something is read one after another', () => {
    if (!measured || !['ISO 13041-1', 'ISO 1708'].includes(definition.code)) return;
    const text = definition.procedure.join(' ');
    expect(text).toMatch(/back at|come back|comes? back|once more|again at its end|reading must return|move back/i);
    expect(text).toMatch(/positive|plus where/i);
  });

  it('is written in British spelling, without words that say nothing', () => {
    const { title, boundTitle, procedure, judgedFigure, usualMistakes = [], tolerance, source } = definition;
    const text = [
      title,
      boundTitle,
      ...procedure,
      judgedFigure,
      ...usualMistakes,
      tolerance?.provenance.text,
      source.text,
    ]
      .join(' ')
      .replace(/step gauge/g, '');
    expect(text).not.toMatch(
      /\b(colou?r(?<!colour)\w*|center\w*|gage\w*|gray|meters?|millimeters?|aluminum|leveling|labeled|analyze\w*|traveling|canceled|fulfill)\b/i,
    );
    expect(text).not.toMatch(/simply|easily|seamless|leverage|please/i);
  });
});
