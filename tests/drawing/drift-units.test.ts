import { expect, it } from 'vitest';
import { driftDrawing } from '@/components/plots/drift-geometry';

const points = [
  { measuredOn: '2024-03-10', asLeftMm: '0.012' },
  { measuredOn: '2026-03-12', asLeftMm: '−0.018' },
];

it('says in its unit how a test moved; mm where none is named', () => {
  expect(driftDrawing(points, '0.06', 'Pitch of Z1', 'mm/m').description).toBe(
    'Pitch of Z1, as left: 2024 0.012 mm/m, 2026 −0.018 mm/m; tolerance 0.06 mm/m',
  );
  expect(driftDrawing(points, null, 'Pitch of Z1').description).toBe(
    'Pitch of Z1, as left: 2024 0.012 mm, 2026 −0.018 mm',
  );
});
