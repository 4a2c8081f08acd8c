import type { BoundComponent, SketchSpec } from '@/standards/types';

/** Words that stand in set-up sketches and in what is said of them, English. */
export const SKETCH_WORDS = {
  plungerIn: '+ in',
  slowTurn: 'one slow turn',
  squareTurned: 'then square turned over',
  sameTarget: 'same target from both sides',
  collars: ['D1', 'D2'],
} as const;

/** `0° 180°`; more than four: the first, the last and how many. */
export function angleWords(anglesDeg: readonly string[] | undefined): string {
  if (!anglesDeg?.length) return SKETCH_WORDS.slowTurn;
  if (anglesDeg.length <= 4) return anglesDeg.map((deg) => `${deg}°`).join(' ');
  return `${anglesDeg[0]}° to ${anglesDeg.at(-1)}°, ${anglesDeg.length} places`;
}

const SCENES: Record<SketchSpec['scene'], string> = {
  'spindle-nose': 'indicator on the centring diameter of the spindle nose',
  'spindle-bore-mandrel': 'indicator on a mandrel in the spindle bore',
  'mandrel-along-motion': 'indicator moved along a mandrel in the spindle',
  'disc-across-motion': 'indicator moved across a disc on the spindle',
  'square-two-motions': 'indicators on both arms of a square',
  'straightedge-along-motion': 'indicator moved along a straightedge',
  'two-spindles-sweep': 'indicator carried by one spindle, swept round a mandrel in the other',
  'tool-hole-sweep': 'indicator carried by the spindle, swept round the tool hole',
  'tool-hole-heights': 'heights of a mandrel in the spindle and of one in the tool hole compared',
  'slide-approach': 'slide brought to the same target from both sides, indicator fixed',
  'two-collar-piece': 'test piece with two collars, turned and measured',
};

/** What a set-up sketch shows, for somebody who cannot see it. */
export function sketchWords(spec: SketchSpec, component: BoundComponent): string {
  const parts = [`Set-up: ${SCENES[spec.scene]}`];
  const named: [string, string | undefined][] = [
    ['spindle', component.spindle],
    ['axis', component.axis],
    ['against', component.reference],
    ['turret', component.turret],
    ['plane', spec.plane ?? component.plane],
  ];
  for (const [what, id] of named) if (id) parts.push(`${what} ${id}`);
  if (spec.anglesDeg?.length) parts.push(angleWords(spec.anglesDeg));
  parts.push('pushing the plunger in counts positive');
  if (spec.positiveMeans) parts.push(`positive: ${spec.positiveMeans}`);
  return parts.join(', ');
}

/** The meaning of the sign as it stands under the sketch. */
export const signWords = (positiveMeans: string) => `+ : ${positiveMeans}`;
