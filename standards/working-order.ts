/**
 * The order of work that saves doing things twice (common practice): what later tests rest on comes first. The numbers are only
 * places in that order; the codes themselves leave the order free.
 */
export const workingSteps = {
  /** What is looked at and saved before anything is opened or loosened. */
  preparation: 5,
  level: 10,
  'spindle-run-out': 20,
  straightness: 30,
  'z-parallel-to-spindle': 40,
  'x-square-to-spindle': 50,
  'y-square': 60,
  tailstock: 70,
  turret: 80,
  'guide-bush': 85,
  'live-tools': 90,
  'rotary-axes': 95,
  'sub-spindle-run-out': 100,
  'sub-spindle-coaxiality': 101,
  /** Axes and turrets against the sub-spindle: after the sub-spindle itself is right. */
  'axes-to-sub-spindle': 102,
  'lost-motion': 110,
  'reference-points': 120,
  positioning: 130,
  circular: 140,
  'spindle-error-motion': 150,
  'cutting-test': 160,
  transfer: 165,
  thermal: 170,
  /** What must be back in place before the machine is handed over. */
  restore: 180,
} as const;

export type WorkingStepName = keyof typeof workingSteps;

export const workingStepWords: Record<WorkingStepName, string> = {
  preparation: 'Before the work begins',
  level: 'Level and twist',
  'spindle-run-out': 'Work spindle run-outs',
  straightness: 'Straightness of the slides',
  'z-parallel-to-spindle': 'Z to the spindle axis',
  'x-square-to-spindle': 'X to the spindle axis',
  'y-square': 'Y to X',
  tailstock: 'Tailstock',
  turret: 'Turrets and tool posts',
  'guide-bush': 'Gang slide and guide bush',
  'live-tools': 'Driven tools',
  'rotary-axes': 'Rotary axes',
  'sub-spindle-run-out': 'Sub-spindle by itself: run-outs and its own motion',
  'sub-spindle-coaxiality': 'Main spindle to sub-spindle',
  'axes-to-sub-spindle': 'Axes and turrets to the sub-spindle',
  'lost-motion': 'Lost motion',
  'reference-points': 'Reference points',
  positioning: 'Positioning',
  circular: 'Circular tests',
  'spindle-error-motion': 'Spindle error motion',
  'cutting-test': 'Cutting tests',
  transfer: 'Transfer from spindle to spindle',
  thermal: 'Thermal tests',
  restore: 'Restored, and run dry',
};

/** Heading of a working step. */
export function workingStepTitle(step: number): string {
  const name = (Object.keys(workingSteps) as WorkingStepName[]).find((candidate) => workingSteps[candidate] === step);
  return name ? workingStepWords[name] : 'Other tests';
}
