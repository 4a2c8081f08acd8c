import type { AppliesTo, BoundComponent } from '@/standards/types';

type Part = Exclude<keyof BoundComponent, 'channel'> | 'channel';

interface Choice {
  label: string;
  /** What every bound component has: may stand in the title, may be what the result rests on. */
  parts: Part[];
  /** The second part of the relation is an axis, not a spindle. */
  referenceIsAxis?: boolean;
}

/** On what a test can be done, in words, and which parts the component then has. */
export const appliesToChoices: Record<AppliesTo['kind'], Choice> = {
  machine: { label: 'the whole machine, once', parts: [] },
  channel: { label: 'each channel of the control', parts: ['channel'] },
  spindle: { label: 'each work spindle', parts: ['spindle'] },
  'main-and-sub-spindle': { label: 'sub-spindle against main spindle', parts: ['spindle', 'reference'] },
  'sub-spindle-and-its-axis': {
    label: 'sub-spindle with the axis that carries it',
    parts: ['spindle', 'axis', 'plane'],
  },
  'linear-axis': { label: 'each linear axis', parts: ['axis'] },
  'linear-axis-in-planes': { label: 'each linear axis, in planes', parts: ['axis', 'plane'] },
  'longitudinal-axis': { label: 'each Z-like axis, in planes', parts: ['axis', 'plane'] },
  'longitudinal-axis-and-spindle': {
    label: 'each Z-like axis with the spindle that it works at',
    parts: ['axis', 'spindle', 'plane'],
  },
  'cross-axis-and-spindle': {
    label: 'each X-like axis with the spindle that it works at',
    parts: ['axis', 'spindle', 'plane'],
  },
  'vertical-axis-and-spindle': {
    label: 'each Y-like axis with the spindle that it works at',
    parts: ['axis', 'spindle', 'plane'],
  },
  'y-and-x': { label: 'Y with X of the same turret', parts: ['axis', 'reference', 'plane'], referenceIsAxis: true },
  'axis-pair': { label: 'two axes that span a plane', parts: ['axis', 'reference', 'plane'], referenceIsAxis: true },
  'rotary-axis': { label: 'each rotary axis', parts: ['rotary'] },
  turret: { label: 'each turret or tool post', parts: ['turret'] },
  'turret-and-spindle': { label: 'turret with each spindle that it reaches', parts: ['turret', 'spindle'] },
  'turret-and-axis': { label: 'turret with one of its axes', parts: ['turret', 'axis'] },
  'turret-axis-and-spindle': { label: 'turret, one of its axes and the spindle', parts: ['turret', 'axis', 'spindle'] },
  'turning-turret-and-spindle': {
    label: 'turret that can turn a piece in a spindle',
    parts: ['turret', 'axis', 'spindle'],
  },
  'station-and-spindle': { label: 'each station with each spindle', parts: ['turret', 'station', 'spindle'] },
  'driven-tools': { label: 'turret with driven tools', parts: ['turret'] },
  'driven-tools-and-spindle': { label: 'turret with driven tools and the spindle', parts: ['turret', 'spindle'] },
  'tool-spindle': { label: 'each tool spindle', parts: ['spindle'] },
  'tool-spindle-and-spindle': { label: 'tool spindle with each work spindle', parts: ['spindle', 'reference'] },
  tailstock: { label: 'the tailstock', parts: ['tailstock'] },
  'tailstock-and-axis': { label: 'tailstock with the Z-like axis', parts: ['tailstock', 'axis'] },
  'tailstock-and-spindle': {
    label: 'tailstock with main spindle and Z-like axis',
    parts: ['tailstock', 'spindle', 'axis'],
  },
  'guide-bush': { label: 'the guide bush', parts: ['guideBush'] },
  'guide-bush-and-spindle': { label: 'guide bush with the main spindle', parts: ['guideBush', 'spindle'] },
  'guide-bush-and-axis': {
    label: 'guide bush with the axis of the moving headstock',
    parts: ['guideBush', 'axis', 'plane'],
  },
  'tool-changer': { label: 'the tool changer', parts: ['toolChanger'] },
};

/** Names that may stand in braces in the title of a sheet. */
export const titleParts = (kind: AppliesTo['kind']): readonly string[] => appliesToChoices[kind].parts;

export interface RestsOn {
  components: string[];
  moved: string[];
  positioned: string[];
}

const componentParts = { guideBush: 'guide-bush', toolChanger: 'tool-changer' } as const;

/**
 * What a later correction could touch: parts of the component that must not be loosened, axes whose motion is measured, axes whose
 * place enters the result. `can` is what may be chosen, `usual` what is proposed.
 */
export function restsOn(kind: AppliesTo['kind']): { can: RestsOn; usual: RestsOn } {
  const { parts, referenceIsAxis } = appliesToChoices[kind];
  const components = parts
    .filter(
      (part) => !['axis', 'plane', 'channel', 'station'].includes(part) && !(part === 'reference' && referenceIsAxis),
    )
    .map((part) => (part in componentParts ? componentParts[part as keyof typeof componentParts] : part));
  const moved = parts.filter(
    (part) => part === 'axis' || part === 'rotary' || (part === 'reference' && referenceIsAxis),
  ) as string[];
  const ofTurret = parts.includes('turret') ? ['turret-axes'] : [];
  const ofSpindle = parts.includes('spindle') ? ['spindle-axis'] : [];
  return {
    can: {
      components: ['bed', ...components],
      moved: [...moved, ...ofTurret, ...ofSpindle],
      positioned: [...moved, ...ofTurret, ...ofSpindle],
    },
    usual: { components: components.length > 0 ? components : ['bed'], moved, positioned: [] },
  };
}
