import type { SketchSpec } from './types';

type Scene = SketchSpec['scene'];

/** Every scene that a set-up sketch can be drawn of; the record makes the compiler name one that is missing. */
const all: Record<Scene, true> = {
  'spindle-nose': true,
  'spindle-bore-mandrel': true,
  'mandrel-along-motion': true,
  'disc-across-motion': true,
  'square-two-motions': true,
  'straightedge-along-motion': true,
  'two-spindles-sweep': true,
  'tool-hole-sweep': true,
  'tool-hole-heights': true,
  'slide-approach': true,
  'two-collar-piece': true,
  'face-run-out': true,
  'axial-slip': true,
  'level-on-carriage': true,
  'level-steps': true,
  'angle-instrument': true,
  'straightedge-turned-over': true,
  'laser-along-motion': true,
  'circular-gauge': true,
  'spindle-sensors': true,
  'turret-index': true,
  'turret-face': true,
  'mandrel-in-turret': true,
  'tool-spindle-mandrel': true,
  'tailstock-quill': true,
  'between-centres': true,
  'guide-bush': true,
  'rotary-axis': true,
  'swivel-axis': true,
  'test-piece-cylinder': true,
  'test-piece-face': true,
  'test-piece-pattern': true,
  'transfer-piece': true,
  'drift-at-tool': true,
  'target-and-found': true,
  'mandrel-half-turn': true,
  'gang-stations': true,
  checklist: true,
};

export const sketchScenes = Object.keys(all) as Scene[];
