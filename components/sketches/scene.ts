import type { SketchPen } from '@/components/sketches/sketch-pen';
import type { BoundComponent, SketchSpec } from '@/standards/types';

/** One set-up, drawn with the pen in the box of all scenes. */
export type Scene = (pen: SketchPen, spec: SketchSpec, component: BoundComponent) => void;
