import type { CautionId, Provenance, TestDefinition, ToleranceRule } from '../types';
import { workingSteps } from '../working-order';
import { code, edition, source } from './source';

const cautions: CautionId[] = [
  'isolate-before-touching',
  'turret-and-sub-spindle-pinch',
  'turn-spindle-by-hand',
  'other-channels-at-rest',
  'support-heavy-parts',
  'maker-and-local-rules-first',
];

const base = {
  code,
  edition,
  version: 1,
  source,
  direction: 'either' as const,
  resolution: { valueUm: '0.5', rule: 'half-even' as const },
  instruments: ['indicator', 'indicator stand', 'test mandrel'],
  cautions,
};

const practice = (text: string): Provenance => ({ kind: 'common-practice', text });

const overHundred = (allUm: string, text: string): ToleranceRule => ({
  by: 'all',
  allUm,
  perLength: { baseLengthMm: '100', minimumUm: '5' },
  provenance: practice(text),
});

const along = (anglesDeg: string[], positionsMm: string[]) => ({
  kind: 'angles-by-position' as const,
  anglesDeg,
  positionsMm,
  positionName: 'z' as const,
  sag: false,
});

function casting(id: string, plane: 'ZX' | 'YZ'): TestDefinition {
  const rises = plane === 'YZ';
  return {
    ...base,
    id,
    title: `Turret casting parallel to the longitudinal motion, in ${plane}`,
    boundTitle: `Casting of {turret} parallel to {axis} motion, in ${plane}`,
    procedure: [
      'Find the machined face or edge of the casting that the maker names as its reference, and clean it. Indicator on the bed or the spindle, plunger square to it.',
      'At the first position set the indicator to zero. Pushing the plunger in counts positive.',
      'Move the turret along its longitudinal axis, always approaching from the same side, and read at every position. Back at the first one the reading must return within a tenth of the tolerance.',
      rises
        ? 'A turret without a Y axis has to be jacked parallel and onto centre height at once: both amounts follow from this slope and from the height of a tool hole.'
        : 'The casting is turned about its pivot by the push screws; tighten in a cross pattern and read again, since clamping shifts it by some micrometres.',
      'The result is the least-squares slope times the measuring length. Pin only when everything else is right.',
    ],
    appliesTo: { kind: 'turret-and-axis', role: 'longitudinal', plane },
    method: 'parallelism',
    layout: along(['0'], ['0', '50', '100', '150', '200']),
    tolerance: overHundred('20', '.020 per 100, taken over from the tool hole'),
    instruments: ['indicator', 'indicator stand'],
    sketch: {
      scene: 'turret-face',
      plane,
      positiveMeans: rises ? '+ rises with z' : '+ nearer to the tool side with z',
    },
    dependsOn: { components: ['turret'], moved: ['axis'], positioned: [] },
    workingStep: workingSteps.turret,
    judgedFigure: 'least-squares slope over the measuring length',
    positiveMeans: rises ? 'the casting rises with z' : 'the casting leans toward the tool side with z',
    negativeMeans: rises ? 'the casting falls with z' : 'the casting leans away from the tool side with z',
    usualMistakes: [
      'Measuring on a painted or bruised edge.',
      'Reading before the screws have their final torque.',
      'Setting the slope first and the height afterwards with one jack, which undoes the slope.',
    ],
    setUpTogether: 'indicator on the bed at {turret}',
    minutes: 20,
  };
}

export const castingInZx = casting('TC-1a', 'ZX');
export const castingInYz = casting('TC-1b', 'YZ');

const onCentre: ToleranceRule = {
  by: 'all',
  allUm: '30',
  provenance: practice('.030 to .040, taken over from the tool hole; the smaller taken'),
};

const centreHeight = {
  ...base,
  method: 'centre-height',
  tolerance: onCentre,
  resolution: { valueUm: '0.5', rule: 'half-even' as const, byForm: { sweep: '0.5', heights: '1' } },
  judgedFigure: 'height over the spindle axis',
  positiveMeans: 'above the spindle axis',
  negativeMeans: 'below the spindle axis',
};

export const castingHeight: TestDefinition = {
  ...centreHeight,
  id: 'TC-2',
  title: 'Turret casting on centre height',
  boundTitle: 'Casting of {turret} on the centre height of {spindle}',
  procedure: [
    'Put a mandrel into the spindle and one into the tool hole, or use the reference bore of the casting.',
    'Take both heights from the same base with the same indicator, at the place where the turret works. Pushing the plunger in counts positive.',
    'Turn the spindle’s mandrel by half a turn and take the mean.',
    'Back at the first mandrel the reading must return within a tenth of the tolerance.',
    'The result is the height of the casting over the spindle axis. Without a Y axis it is set with jacks or one shim under the full base.',
  ],
  appliesTo: { kind: 'turret-and-spindle' },
  layout: { kind: 'tool-centre', form: 'heights', surface: 'bore', radiiMm: ['1', '5', '25'] },
  sketch: { scene: 'tool-hole-heights', positiveMeans: '+ casting above the spindle axis' },
  dependsOn: { components: ['turret', 'spindle'], moved: [], positioned: ['turret-axes'] },
  workingStep: workingSteps.turret,
  usualMistakes: [
    'Comparing heights over two bases that are not of one height.',
    'Forgetting that the mandrels differ in diameter: heights are of their axes.',
  ],
  setUpTogether: 'mandrels in {spindle} and {turret}',
  minutes: 15,
};

export const stationHeight: TestDefinition = {
  ...centreHeight,
  id: 'GT-1',
  title: 'Gang slide: centre height of a station',
  boundTitle: 'Station {station} of {turret}: centre height at {spindle}',
  procedure: [
    'Clamp a mandrel or a ground bar in the holder of the station, as a tool is clamped.',
    'Take the height of the bar and that of a mandrel in the spindle from the same base with the same indicator. Pushing the plunger in counts positive.',
    'Back at the first one the reading must return within a tenth of the tolerance.',
    'Holders that no axis brings onto centre are shimmed, one piece, flat and without burrs.',
    'The result is the height of the station over the spindle axis.',
  ],
  appliesTo: { kind: 'station-and-spindle', types: ['gang-slide', 'tool-post'] },
  layout: { kind: 'tool-centre', form: 'heights', surface: 'outside', radiiMm: ['1', '5', '10'] },
  sketch: { scene: 'gang-stations', positiveMeans: '+ station above the spindle axis' },
  dependsOn: { components: ['turret', 'spindle'], moved: [], positioned: ['turret-axes'] },
  workingStep: workingSteps.turret,
  usualMistakes: [
    'Measuring a holder empty that bends when it is clamped.',
    'Setting one station by Y offset and forgetting that the offset belongs to all that share it.',
  ],
  setUpTogether: 'mandrel in {spindle}, bars in {turret}',
  minutes: 5,
};

export const holderParallel: TestDefinition = {
  ...base,
  id: 'GT-2',
  title: 'Gang slide: holder bores parallel to the longitudinal motion',
  boundTitle: 'Holder bores of {turret} parallel to {axis} motion',
  procedure: [
    'Clamp a ground bar in a holder bore so that 100 mm stand out. Indicator fixed to what moves along Z against it: the bed, or the headstock where that moves.',
    'At the first position set the indicator to zero, in the YZ plane. Pushing the plunger in counts positive.',
    'Move along Z and read at every position; turn the bar by half a turn in its bore and read again.',
    'Back at the first position the reading must return within a tenth of the tolerance.',
    'The result is the slope of the means over the measuring length; the other plane is a further set.',
  ],
  appliesTo: { kind: 'turret-and-axis', role: 'longitudinal', plane: 'YZ', types: ['gang-slide', 'tool-post'] },
  method: 'parallelism',
  layout: { ...along(['0', '180'], ['0', '50', '100']), turned: 'mandrel' },
  tolerance: overHundred('20', '.020 per 100, taken over from the tool hole'),
  sketch: { scene: 'gang-stations', plane: 'YZ', anglesDeg: ['0', '180'], positiveMeans: '+ rises with z' },
  dependsOn: { components: ['turret'], moved: ['axis'], positioned: [] },
  workingStep: workingSteps.turret,
  judgedFigure: 'least-squares slope over the measuring length',
  positiveMeans: 'the bore rises with z',
  negativeMeans: 'the bore falls with z',
  usualMistakes: ['A bar that is not straight: turn it by half a turn.', 'Reading one holder and believing all.'],
  setUpTogether: 'mandrel in {turret}',
  minutes: 15,
};
