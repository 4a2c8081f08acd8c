import type { MakeUp } from '@/lib/schemas/make-up';

/** Make-up of the invented machine of the worked job: two turrets, Y on the first only, sub-spindle carried by Z3. */
export const workedMachine: MakeUp = {
  kind: 'turning-centre-sub-spindle',
  sizeClass: { criterion: 'bar-diameter', valueMm: '32' },
  channels: [1, 2],
  linearAxes: [
    { id: 'X1', letter: 'X', number: 1, channel: 1, carries: 'T1', travelMm: '150', programmedOn: 'diameter' },
    { id: 'Y1', letter: 'Y', number: 1, channel: 1, carries: 'T1', travelMm: '80', programmedOn: 'radius' },
    { id: 'Z1', letter: 'Z', number: 1, channel: 1, carries: 'T1', travelMm: '500', programmedOn: 'radius' },
    { id: 'X2', letter: 'X', number: 2, channel: 2, carries: 'T2', travelMm: '140', programmedOn: 'diameter' },
    { id: 'Z2', letter: 'Z', number: 2, channel: 2, carries: 'T2', travelMm: '320', programmedOn: 'radius' },
    { id: 'Z3', letter: 'Z', number: 3, channel: 2, carries: 'S2', travelMm: '480', programmedOn: 'radius' },
  ],
  rotaryAxes: [],
  spindles: [
    { id: 'S1', type: 'main', channel: 1, carriedBy: null },
    { id: 'S2', type: 'sub', channel: 2, carriedBy: 'Z3' },
  ],
  turrets: [
    { id: 'T1', type: 'turret', channel: 1, stations: 12, axes: ['X1', 'Y1', 'Z1'], worksAt: ['S1'] },
    { id: 'T2', type: 'turret', channel: 2, stations: 8, axes: ['X2', 'Z2'], worksAt: ['S1', 'S2'] },
  ],
  tailstock: null,
  guideBush: null,
  distanceBetweenCentresMm: null,
  swingOverBedMm: null,
  swingOverCrossSlideMm: null,
  chuckDiameterMm: null,
  barDiameterMm: '32',
};
