import type { ToleranceRule } from '../types';

/** Nothing is published for lost motion read by an indicator: judged only where the contract or the builder gives a figure. */
export const lostMotion: ToleranceRule | null = null;
