import type { AppliesTo, CautionId, TestDefinition } from '../types';
import { workingSteps } from '../working-order';
import { base, closedTurn, eighths, halfMicrometre, handTurned } from './parts';
import { toolSpindleAt100, toolSpindleAtNose, toolSpindleFace, toolSpindleSlip } from './tool-tolerances';

/** A tool spindle of its own, or the driven tools that a turret holds: measured alike. */
export interface ToolSpindleKind {
  name: string;
  /** In the middle of a sentence, with the placeholder of the part that it belongs to. */
  bound: string;
  appliesTo: AppliesTo;
  rests: TestDefinition['dependsOn']['components'];
  /** How it is brought into place and kept still. */
  prepare: string;
}

export const toolSpindle: ToolSpindleKind = {
  name: 'Tool spindle',
  bound: '{spindle}',
  appliesTo: { kind: 'tool-spindle' },
  rests: ['spindle'],
  prepare: 'Bring the tool spindle to a place where it can be reached, its swivel axis clamped where it has one.',
};

export const drivenTool: ToolSpindleKind = {
  name: 'Driven tool',
  bound: 'driven tool of {turret}',
  appliesTo: { kind: 'driven-tools' },
  rests: ['turret'],
  prepare:
    'Put the driven holder that is to be measured into its station, index it to the working place and let the turret clamp. Note station and holder.',
};

const cautions: CautionId[] = [...handTurned, 'turret-and-sub-spindle-pinch'];

const common = (kind: ToolSpindleKind) => ({
  ...base,
  appliesTo: kind.appliesTo,
  direction: 'either' as const,
  resolution: halfMicrometre,
  cautions,
  dependsOn: { components: kind.rests, moved: [], positioned: [] },
  workingStep: workingSteps['live-tools'],
  instruments: ['indicator', 'indicator stand', 'test mandrel'],
  minutes: 20,
});

export function toolSpindleRunOut(kind: ToolSpindleKind, place: 'nose' | '100 mm', id: string): TestDefinition {
  const nose = place === 'nose';
  const words = nose ? 'at the nose' : 'at 100 mm';
  return {
    ...common(kind),
    id,
    title: `${kind.name}: radial run-out ${words}`,
    boundTitle: `${kind.bound}: radial run-out ${words}`,
    procedure: [
      kind.prepare,
      'Wipe taper or collet seat and mandrel clean, put the mandrel in and draw it home as a tool is drawn home; mark 0° on both.',
      `Fix the indicator to a part that stands still against it and set the stylus square to the mandrel ${nose ? 'close to the nose' : '100 mm from the nose; run-out is never worked out for another length'}. Set it near zero at 0°; pushing the plunger in counts positive.`,
      'Turn the tool spindle slowly by hand, always the same way, and read every 45°. Back at 0° the indicator must show the first value again within a tenth of the tolerance.',
      'Draw the mandrel, turn it 90° against the spindle, put it in again and take the next turn. Four insertions: 0°, 90°, 180°, 270°. Count the angles on the spindle.',
      'The result is the mean of the four total readings.',
    ],
    method: 'run-out',
    layout: { kind: 'turns', insertions: 4, anglesDeg: eighths, insertionLabel: 'insertion' },
    tolerance: nose ? toolSpindleAtNose : toolSpindleAt100,
    sketch: { scene: 'tool-spindle-mandrel', anglesDeg: ['0', '90', '180', '270'], atMm: nose ? '0' : '100' },
    judgedFigure: 'mean of the total readings of four insertions',
    usualMistakes: [
      'Holding the mandrel in a worn collet and taking the collet for the spindle.',
      'Turning the spindle by its drive with the enabling device instead of by hand, which adds the play of the drive.',
      'Measuring one holder and believing the others to be alike.',
    ],
    setUpTogether: `test mandrel in ${kind.bound}`,
  };
}

export function toolSpindleEndFace(kind: ToolSpindleKind, what: 'slip' | 'face', id: string): TestDefinition {
  const slip = what === 'slip';
  const words = slip ? 'axial slip' : 'run-out of the face';
  return {
    ...common(kind),
    id,
    title: `${kind.name}: ${words}`,
    boundTitle: `${kind.bound}: ${words}`,
    procedure: [
      kind.prepare,
      slip
        ? 'Put a short mandrel with a ground centre into the spindle and a clean ball with a little grease into the centre, so that the ball lies on the axis.'
        : 'Wipe the face of the spindle nose clean and stone off burrs.',
      `Fix the indicator to a part that stands still, plunger along the axis of the tool spindle, ${slip ? 'flat contact point against the ball' : 'as near to the edge of the face as it allows'}. Pushing the plunger in counts positive.`,
      'Mark 0°, set the indicator near zero there, turn slowly by hand, always the same way, and read every 45°.',
      'Read once more back at 0°: the closing reading must agree with the first within a tenth of the tolerance.',
      'The result is the largest less the smallest reading of the turn.',
    ],
    method: 'axial-run-out',
    layout: {
      kind: 'circles',
      names: [slip ? 'ball on the axis' : 'face, near its edge'],
      anglesDeg: closedTurn,
      turned: 'tool spindle',
    },
    tolerance: slip ? toolSpindleSlip : toolSpindleFace,
    instruments: slip ? ['indicator', 'indicator stand', 'centre plug with ball'] : ['indicator', 'indicator stand'],
    sketch: { scene: slip ? 'axial-slip' : 'face-run-out', anglesDeg: ['0', '90', '180', '270'] },
    judgedFigure: `largest less smallest reading of the turn, ${slip ? 'on the axis' : 'on the face, axial slip included'}`,
    usualMistakes: [
      slip
        ? 'A ball that does not lie on the axis: the reading then contains the run-out of its seat.'
        : 'Reading over a drive key or slot, which moves the stand.',
      'Pushing or pulling the spindle while turning it, so that play is read.',
    ],
    setUpTogether: `bare nose of ${kind.bound}`,
    minutes: 15,
  };
}
