import type { MachineKind, MakeUp } from './make-up';

type Axis = MakeUp['linearAxes'][number];
type Letter = Axis['letter'];

function axis(id: string, carries: string, travelMm: string, channel = 1, directionNote?: string): Axis {
  const letter = id[0] as Letter;
  return {
    id,
    letter,
    number: Number(id.slice(1)),
    channel,
    carries,
    travelMm,
    programmedOn: letter === 'X' ? 'diameter' : 'radius',
    ...(directionNote ? { directionNote } : {}),
  };
}

const noSizes = {
  distanceBetweenCentresMm: null,
  swingOverBedMm: null,
  swingOverCrossSlideMm: null,
  chuckDiameterMm: null,
  barDiameterMm: null,
};

/** The make-ups from which a person starts; each is a whole, valid machine whose sizes are then changed. */
export const startingMakeUps: { kind: MachineKind; title: string; makeUp: MakeUp }[] = [
  {
    kind: 'turning-centre',
    title: 'Turning centre with one spindle',
    makeUp: {
      kind: 'turning-centre',
      sizeClass: { criterion: 'chuck-diameter', valueMm: '250' },
      channels: [1],
      linearAxes: [axis('X1', 'T1', '220'), axis('Z1', 'T1', '600')],
      rotaryAxes: [],
      spindles: [{ id: 'S1', type: 'main', channel: 1, carriedBy: null }],
      turrets: [
        {
          id: 'T1',
          type: 'turret',
          channel: 1,
          stations: 12,
          axes: ['X1', 'Z1'],
          worksAt: ['S1'],
          drivenTools: 'none',
        },
      ],
      tailstock: null,
      guideBush: null,
      toolChanger: null,
      ...noSizes,
      chuckDiameterMm: '250',
    },
  },
  {
    kind: 'turning-centre-sub-spindle',
    title: 'Turning centre with sub-spindle and two turrets',
    makeUp: {
      kind: 'turning-centre-sub-spindle',
      sizeClass: { criterion: 'bar-diameter', valueMm: '65' },
      channels: [1, 2],
      linearAxes: [
        axis('X1', 'T1', '200'),
        axis('Y1', 'T1', '100'),
        axis('Z1', 'T1', '700'),
        axis('X2', 'T2', '190', 2),
        axis('Z2', 'T2', '650', 2),
        axis('Z3', 'S2', '700', 2, '+ away from the main spindle'),
      ],
      rotaryAxes: [
        { id: 'C1', channel: 1, carries: 'S1' },
        { id: 'C2', channel: 2, carries: 'S2' },
      ],
      spindles: [
        { id: 'S1', type: 'main', channel: 1, carriedBy: null },
        { id: 'S2', type: 'sub', channel: 2, carriedBy: 'Z3' },
      ],
      turrets: [
        {
          id: 'T1',
          type: 'turret',
          channel: 1,
          stations: 12,
          axes: ['X1', 'Y1', 'Z1'],
          worksAt: ['S1', 'S2'],
          drivenTools: 'both',
        },
        {
          id: 'T2',
          type: 'turret',
          channel: 2,
          stations: 12,
          axes: ['X2', 'Z2'],
          worksAt: ['S1', 'S2'],
          drivenTools: 'none',
        },
      ],
      tailstock: null,
      guideBush: null,
      toolChanger: null,
      ...noSizes,
      barDiameterMm: '65',
    },
  },
  {
    kind: 'sliding-head-lathe',
    title: 'Sliding-head lathe',
    makeUp: {
      kind: 'sliding-head-lathe',
      sizeClass: { criterion: 'bar-diameter', valueMm: '20' },
      channels: [1, 2],
      linearAxes: [
        axis('X1', 'T1', '110'),
        axis('Y1', 'T1', '300'),
        axis('Z1', 'S1', '205', 1, 'moving headstock'),
        axis('X2', 'S2', '300', 2, 'crosses from the gang slide to the rear post'),
        axis('Z2', 'S2', '210', 2),
      ],
      rotaryAxes: [{ id: 'C1', channel: 1, carries: 'S1' }],
      spindles: [
        { id: 'S1', type: 'main', channel: 1, carriedBy: 'Z1' },
        { id: 'S2', type: 'sub', channel: 2, carriedBy: 'Z2' },
      ],
      turrets: [
        {
          id: 'T1',
          type: 'gang-slide',
          channel: 1,
          stations: 6,
          axes: ['X1', 'Y1'],
          worksAt: ['S1'],
          drivenTools: 'radial',
        },
        { id: 'T2', type: 'tool-post', channel: 2, stations: 4, axes: [], worksAt: ['S2'], drivenTools: 'axial' },
      ],
      tailstock: null,
      guideBush: { id: 'GB1', channel: 1 },
      toolChanger: null,
      ...noSizes,
      barDiameterMm: '20',
    },
  },
  {
    kind: 'engine-lathe',
    title: 'Engine lathe with tailstock',
    makeUp: {
      kind: 'engine-lathe',
      sizeClass: { criterion: 'swing-over-bed', valueMm: '400' },
      channels: [1],
      linearAxes: [axis('X1', 'T1', '200'), axis('Z1', 'T1', '900')],
      rotaryAxes: [],
      spindles: [{ id: 'S1', type: 'main', channel: 1, carriedBy: null }],
      turrets: [
        {
          id: 'T1',
          type: 'tool-post',
          channel: 1,
          stations: 4,
          axes: ['X1', 'Z1'],
          worksAt: ['S1'],
          drivenTools: 'none',
        },
      ],
      tailstock: { id: 'TS1', channel: 1 },
      guideBush: null,
      toolChanger: null,
      ...noSizes,
      swingOverBedMm: '400',
      distanceBetweenCentresMm: '1000',
    },
  },
  {
    kind: 'multi-channel-turning-centre',
    title: 'Turning centre with two turrets, gang slide and three channels',
    makeUp: {
      kind: 'multi-channel-turning-centre',
      sizeClass: { criterion: 'bar-diameter', valueMm: '65' },
      channels: [1, 2, 3],
      linearAxes: [
        axis('X1', 'T1', '210'),
        axis('Y1', 'T1', '100'),
        axis('Z1', 'T1', '750'),
        axis('X2', 'T2', '195', 2),
        axis('Z2', 'T2', '700', 2),
        axis('X3', 'T3', '260', 3),
        axis('Y3', 'T3', '120', 3),
        axis('Z3', 'T3', '600', 3),
        axis('Z4', 'S2', '720', 2, '+ away from the main spindle'),
      ],
      rotaryAxes: [
        { id: 'C1', channel: 1, carries: 'S1' },
        { id: 'C2', channel: 2, carries: 'S2' },
        { id: 'B1', channel: 3, carries: 'S3', directionNote: 'swivels the milling spindle in ZX' },
      ],
      spindles: [
        { id: 'S1', type: 'main', channel: 1, carriedBy: null },
        { id: 'S2', type: 'sub', channel: 2, carriedBy: 'Z4' },
        { id: 'S3', type: 'tool', channel: 3, carriedBy: null, onTurret: 'T3' },
      ],
      turrets: [
        {
          id: 'T1',
          type: 'turret',
          channel: 1,
          stations: 12,
          axes: ['X1', 'Y1', 'Z1'],
          worksAt: ['S1', 'S2'],
          drivenTools: 'both',
        },
        {
          id: 'T2',
          type: 'turret',
          channel: 2,
          stations: 12,
          axes: ['X2', 'Z2'],
          worksAt: ['S1', 'S2'],
          drivenTools: 'axial',
        },
        {
          id: 'T3',
          type: 'gang-slide',
          channel: 3,
          stations: 5,
          axes: ['X3', 'Y3', 'Z3'],
          worksAt: ['S1', 'S2'],
          drivenTools: 'radial',
        },
      ],
      tailstock: null,
      guideBush: null,
      toolChanger: null,
      ...noSizes,
      barDiameterMm: '65',
    },
  },
];
