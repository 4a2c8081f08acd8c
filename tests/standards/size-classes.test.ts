import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { findSizeClass, liesWithin, sizeClassTables } from '@/standards/size-classes';

describe.each(sizeClassTables)('size classes by $criterion', ({ criterion, classes, provenance }) => {
  it('starts at 0 and follows without gap', () => {
    expect(classes.map((step) => step.class)).toEqual([1, 2, 3]);
    expect(classes[0]?.overMm).toBe('0');
    classes.slice(1).forEach((step, k) => void expect(step.overMm).toBe(classes[k]?.upToMm));
    expect(provenance.kind).toBe('from-memory');
  });

  it('puts every size into at most one class, boundaries into the lower one', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 1_200_000 }), (thousandths) => {
        const valueMm = (thousandths / 1000).toFixed(3);
        const inside = classes.filter((step) => liesWithin(valueMm, step));
        expect(inside.length).toBe(findSizeClass({ criterion, valueMm }) === null ? 0 : 1);
      }),
    );
    for (const step of classes)
      if (step.upToMm !== null) expect(findSizeClass({ criterion, valueMm: step.upToMm })?.class).toBe(step.class);
  });
});

it('says how a class was found', () => {
  expect(findSizeClass({ criterion: 'bar-diameter', valueMm: '25' })?.words).toBe(
    'size class 1 (nominal bar diameter 25 mm: up to 25)',
  );
  expect(findSizeClass({ criterion: 'bar-diameter', valueMm: '80' })?.words).toBe(
    'size class 3 (nominal bar diameter 80 mm: over 63)',
  );
  expect(findSizeClass({ criterion: 'swing-over-bed', valueMm: '1200' })).toBeNull();
});
