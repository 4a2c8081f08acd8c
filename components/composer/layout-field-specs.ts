import type { Layout } from '@/standards/types';

export interface LayoutFieldSpec {
  field: string;
  label: string;
  hint?: string;
  /** list: figures with spaces between; names: with commas; count, length: one figure; tick: yes or no; ticks: several; one of `options`. */
  kind: 'list' | 'names' | 'count' | 'length' | 'tick' | 'ticks' | 'choice';
  optional?: boolean;
  options?: { value: string; label: string }[];
}

const list = (field: string, label: string): LayoutFieldSpec => ({
  field,
  label,
  kind: 'list',
  hint: 'With spaces between, decimal points',
});
const angles = list('anglesDeg', 'Angles, °');
const positions = list('positionsMm', 'Positions, mm');
const lineReference: LayoutFieldSpec = {
  ...{ field: 'reference', label: 'Reference line', kind: 'choice' },
  options: [
    { value: 'minimum-zone', label: 'minimum zone' },
    { value: 'least-squares', label: 'least squares' },
    { value: 'end-points', label: 'through the end points' },
  ],
};
const surface: LayoutFieldSpec = {
  ...{ field: 'surface', label: 'Surface', kind: 'choice' },
  options: [
    { value: 'outside', label: 'outside' },
    { value: 'bore', label: 'bore' },
  ],
};
const count = (field: string, label: string): LayoutFieldSpec => ({ field, label, kind: 'count' });
const length = (field: string, label: string, hint?: string): LayoutFieldSpec => ({
  field,
  label,
  kind: 'length',
  hint,
});

/** The fields by which each kind of sheet is laid out, in the order in which a person thinks of them. */
export const layoutFieldSpecs: Record<Layout['kind'], LayoutFieldSpec[]> = {
  turns: [
    count('insertions', 'Turns'),
    angles,
    {
      ...{ field: 'insertionLabel', label: 'Between the turns', kind: 'choice' },
      options: [
        { value: 'turn', label: 'nothing is taken out' },
        { value: 'insertion', label: 'the mandrel is put in anew' },
      ],
    },
    { field: 'names', label: 'Names of the turns', kind: 'names', optional: true, hint: 'at the nose, at 300 mm' },
  ],
  'angles-by-position': [
    { ...angles, hint: 'One angle, or an even number evenly round: 0 180' },
    positions,
    {
      ...{ field: 'positionName', label: 'Positions are', kind: 'choice' },
      options: ['z', 'radius', 'along the face', 'along the slide', 'y'].map((value) => ({ value, label: value })),
    },
    { field: 'sag', label: 'The mandrel’s sag is taken into account', kind: 'tick' },
  ],
  profile: [positions, lineReference, { ...length('localLengthMm', 'Local length, mm'), optional: true }],
  'square-reversed': [
    list('referencePositionsMm', 'Positions on the reference arm, mm'),
    list('measuredPositionsMm', 'Positions on the measured arm, mm'),
  ],
  'swept-sections': [{ ...positions, label: 'Sections at, mm' }, surface],
  'tool-centre': [
    {
      ...{ field: 'form', label: 'Taken by', kind: 'choice' },
      options: [
        { value: 'sweep', label: 'sweeping the hole' },
        { value: 'heights', label: 'comparing two heights' },
      ],
    },
    surface,
    list('radiiMm', 'Turned radii of interest, mm'),
  ],
  'approach-pairs': [
    { field: 'places', label: 'Places', kind: 'names', hint: 'near the chuck, middle of the travel' },
    {
      ...{ field: 'feeds', label: 'Feeds', kind: 'ticks' },
      options: [
        { value: 'cutting-feed', label: 'cutting feed' },
        { value: 'rapid', label: 'rapid' },
      ],
    },
    count('pairs', 'Pairs of approaches'),
  ],
  'two-collars': [length('distanceMm', 'Collar to collar, mm')],
  'angle-steps': [
    length('stepLengthMm', 'Foot of the level, mm', 'One step is as long as the foot'),
    count('steps', 'Steps'),
    { field: 'returnRun', label: 'Read on the way back too', kind: 'tick' },
    lineReference,
  ],
  'two-runs': [positions, lineReference],
  grid: [
    list('xMm', 'Places along, mm'),
    list('yMm', 'Places across, mm'),
    { ...lineReference, label: 'Reference plane', options: lineReference.options?.slice(0, 2) },
  ],
  'angular-runs': [
    positions,
    {
      ...{ field: 'quantity', label: 'Angle', kind: 'choice' },
      options: ['pitch', 'yaw', 'roll'].map((value) => ({ value, label: value })),
    },
    { field: 'bothDirections', label: 'Read on the way back too', kind: 'tick' },
  ],
  'target-cycles': [list('targets', 'Targets, mm or °'), count('cycles', 'Cycles')],
  'circle-trace': [
    angles,
    length('nominalRadiusMm', 'Radius, mm'),
    length('arcDeg', 'Arc, °', '360 for a whole circle'),
  ],
  'rotation-turns': [
    count('turns', 'Turns'),
    angles,
    {
      ...{ field: 'direction', label: 'Direction', kind: 'choice' },
      options: ['radial', 'axial'].map((value) => ({ value, label: value })),
    },
  ],
  stations: [
    { field: 'stations', label: 'Stations', kind: 'names', optional: true, hint: 'Empty: those of the turret' },
    count('repeats', 'Times that each is indexed'),
    { ...length('radiusMm', 'Distance from the turret’s axis, mm'), optional: true },
  ],
  circles: [{ field: 'names', label: 'Circles', kind: 'names', hint: 'near the edge, at the bore' }, angles],
  diameters: [positions],
  'round-trace': [angles, surface],
  'time-series': [
    list('minutes', 'Read at, minutes'),
    { field: 'temperature', label: 'Temperature beside it', kind: 'tick' },
  ],
  'target-and-found': [
    {
      ...{ field: 'basis', label: 'Programmed as', kind: 'choice' },
      options: [
        { value: '', label: 'as the axis is' },
        { value: 'radius', label: 'radius' },
        { value: 'diameter', label: 'diameter' },
      ],
    },
  ],
  // Its items are a list of their own (check-items.tsx).
  'check-list': [],
};
