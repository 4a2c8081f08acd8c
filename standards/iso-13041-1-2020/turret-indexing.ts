import type { TestDefinition } from '../types';
import { workingSteps } from '../working-order';
import { base, halfMicrometre, indexedTurret } from './parts';
import { turretAccuracy, turretRepeatability } from './tool-tolerances';

const common = {
  ...base,
  appliesTo: { kind: 'turret' as const, types: ['turret' as const] },
  method: 'indexing',
  direction: 'either' as const,
  resolution: halfMicrometre,
  instruments: ['indicator', 'indicator stand', 'test mandrel'],
  cautions: indexedTurret,
  sketch: { scene: 'turret-index' as const },
  dependsOn: { components: ['turret' as const], moved: [], positioned: [] },
  workingStep: workingSteps.turret,
  setUpTogether: 'indicator on the bed at {turret}, 100 mm from its axis',
};

export const turretIndexRepeatability: TestDefinition = {
  ...common,
  id: 'TU-4',
  title: 'Turret indexing: repeatability',
  boundTitle: 'Indexing of {turret}: repeatability',
  procedure: [
    'Choose three stations at least, spread round the disc, and put a like mandrel or ball into each. Their place counts at a fixed radius from the turret axis; note it.',
    'Fix the indicator to the bed or the spindle, plunger along the circle on which the tools travel, so that it sees rotation. Pushing the plunger in counts positive.',
    'Bring the axes to a place that can be reached again exactly, index the first station in, let it clamp and set the indicator to zero. It is not set again.',
    'Move away, index the second station in, clamp, move to the same place and read; then the third. So each station comes back after a whole turn, always from the same side. Five rounds.',
    'That the stations differ among themselves does no harm here: only what one station repeats is judged.',
    'Now and then move back without indexing: the reading must return within a tenth of the tolerance, or the axes and not the turret are being measured.',
    'The result is the largest less the smallest reading of a station, of the worst station.',
  ],
  judge: 'repeatability',
  layout: {
    kind: 'stations',
    stations: ['first station', 'station a third of a turn on', 'station two thirds of a turn on'],
    repeats: 5,
    radiusMm: '100',
  },
  tolerance: turretRepeatability,
  judgedFigure: 'largest less smallest reading of the worst station',
  usualMistakes: [
    'Clamping again without indexing away: only the clamp is then tested, not the index.',
    'Moving the slide between readings without proving that it comes back to the same place.',
    'Always coming from the same neighbouring station, when the turret can come from both sides.',
  ],
  minutes: 30,
};

export const turretIndexAccuracy: TestDefinition = {
  ...common,
  id: 'TU-5',
  title: 'Turret indexing: station to station',
  boundTitle: 'Indexing of {turret}: accuracy from station to station',
  procedure: [
    'Take one mandrel or ball that fits every station in the same way, or the tool holes themselves. The readings are taken at 100 mm from the turret axis.',
    'Fix the indicator to the bed or the spindle, plunger along the circle on which the tools travel. Pushing the plunger in counts positive. It is not moved until every station has been read.',
    'Bring the axes to a place that can be reached again exactly, index the first station in, let it clamp and set the indicator to zero.',
    'Index the next station in, carry the mandrel over, move to the same place and read; so on through all stations, always turning the same way.',
    'Go round a second time, so that each station has two readings.',
    'Back at the first station, the reading must return within a tenth of the tolerance.',
    'The result is the largest departure of a station from the mean of all stations.',
  ],
  judge: 'accuracy',
  layout: { kind: 'stations', stations: null, repeats: 2, radiusMm: '100' },
  tolerance: turretAccuracy,
  judgedFigure: 'largest departure of a station from the mean of all stations, at a radius of 100 mm',
  usualMistakes: [
    'Touching the indicator between stations, which breaks the comparison.',
    'Holding the mandrel differently in each station, so that the fit of the holes is read.',
    'Reading at another radius without a tolerance for it: the same angle shows more further out.',
  ],
  minutes: 45,
};
