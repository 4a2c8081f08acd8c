import type { MachineKind, MakeUp } from '@/lib/schemas/make-up';
import { startingMakeUps } from '@/lib/schemas/starting-make-ups';

export interface DemoMachine {
  manufacturer: string;
  model: string;
  serialNumber: string;
  year: number;
  control: string;
  site: string;
  customer: string;
  makeUp: MakeUp;
}

const from = (kind: MachineKind, change: Partial<MakeUp> = {}): MakeUp => {
  const start = startingMakeUps.find((entry) => entry.kind === kind);
  if (!start) throw new Error(`no make-up to start from: ${kind}`);
  return { ...start.makeUp, ...change };
};

/** Two turrets, Y on the first only, the sub-spindle carried by Z3. */
const larkfield: MakeUp = {
  ...from('turning-centre-sub-spindle'),
  sizeClass: { criterion: 'bar-diameter', valueMm: '32' },
  linearAxes: [
    { id: 'X1', letter: 'X', number: 1, channel: 1, carries: 'T1', travelMm: '150', programmedOn: 'diameter' },
    { id: 'Y1', letter: 'Y', number: 1, channel: 1, carries: 'T1', travelMm: '80', programmedOn: 'radius' },
    { id: 'Z1', letter: 'Z', number: 1, channel: 1, carries: 'T1', travelMm: '500', programmedOn: 'radius' },
    { id: 'X2', letter: 'X', number: 2, channel: 2, carries: 'T2', travelMm: '140', programmedOn: 'diameter' },
    { id: 'Z2', letter: 'Z', number: 2, channel: 2, carries: 'T2', travelMm: '320', programmedOn: 'radius' },
    { id: 'Z3', letter: 'Z', number: 3, channel: 2, carries: 'S2', travelMm: '480', programmedOn: 'radius' },
  ],
  turrets: [
    { id: 'T1', type: 'turret', channel: 1, stations: 12, axes: ['X1', 'Y1', 'Z1'], worksAt: ['S1'] },
    { id: 'T2', type: 'turret', channel: 2, stations: 8, axes: ['X2', 'Z2'], worksAt: ['S1', 'S2'] },
  ],
  barDiameterMm: '32',
};

/** Invented makers; serial numbers that are easy to misread: O and 0, I and 1, B and 8, S and 5, Z and 2. */
export const demoMachines: DemoMachine[] = [
  {
    manufacturer: 'Larkfield',
    model: 'SL-32 II',
    serialNumber: 'LK32-0O81-B',
    year: 2011,
    control: 'Orrin 18 T',
    site: 'Ashdown works, bay 3',
    customer: 'Ashdown Turned Parts',
    makeUp: larkfield,
  },
  {
    manufacturer: 'Larkfield',
    model: 'SL-32 II',
    serialNumber: 'LK32-0081-8',
    year: 2012,
    control: 'Orrin 18 T',
    site: 'Ashdown works, bay 4',
    customer: 'Ashdown Turned Parts',
    makeUp: larkfield,
  },
  {
    manufacturer: 'Harrow & Pell',
    model: 'TC 250',
    serialNumber: 'HP25-1I10-S5',
    year: 2018,
    control: 'Cadence 4',
    site: 'Ashdown works, bay 1',
    customer: 'Ashdown Turned Parts',
    makeUp: from('turning-centre'),
  },
  {
    manufacturer: 'Harrow & Pell',
    model: 'TC 250',
    serialNumber: 'HP25-I110-55',
    year: 2019,
    control: 'Cadence 4',
    site: 'Millbrook yard',
    customer: 'Millbrook Hydraulics',
    makeUp: from('turning-centre'),
  },
  {
    manufacturer: 'Stennick',
    model: 'Swift 20',
    serialNumber: 'SW20Z-2Z7O',
    year: 2021,
    control: 'Orrin 31 S',
    site: 'Tolland Medical, hall 2',
    customer: 'Tolland Medical Fittings',
    makeUp: from('sliding-head-lathe'),
  },
  {
    manufacturer: 'Brandreth',
    model: 'Senior 17',
    serialNumber: '17-S5O8B',
    year: 1994,
    control: 'none, by hand',
    site: 'Millbrook yard, tool room',
    customer: 'Millbrook Hydraulics',
    makeUp: from('engine-lathe'),
  },
  {
    manufacturer: 'Larkfield',
    model: 'TL-65 Y',
    serialNumber: 'LK65-B8I0-2',
    year: 2024,
    control: 'Orrin 31 T',
    site: 'Tolland Medical, hall 1',
    customer: 'Tolland Medical Fittings',
    makeUp: from('turning-centre-sub-spindle'),
  },
  {
    manufacturer: 'Quorn Works',
    model: 'QT 10',
    serialNumber: 'QT-10-0DB1',
    year: 2026,
    control: 'Cadence 5',
    site: 'Ashdown works, bay 6',
    customer: 'Ashdown Turned Parts',
    makeUp: from('turning-centre'),
  },
  {
    manufacturer: 'Corrand',
    model: 'Triad 52',
    serialNumber: 'CT52-3Q0G-17',
    year: 2023,
    control: 'Orrin 31 T',
    site: 'Tolland Medical, hall 3',
    customer: 'Tolland Medical Fittings',
    makeUp: from('multi-channel-turning-centre'),
  },
  {
    manufacturer: 'Stennick',
    model: 'Swift 20',
    serialNumber: 'SW20Z-27Z0',
    year: 2022,
    control: 'Orrin 31 S',
    site: 'Tolland Medical, hall 2',
    customer: 'Tolland Medical Fittings',
    makeUp: from('sliding-head-lathe'),
  },
];
