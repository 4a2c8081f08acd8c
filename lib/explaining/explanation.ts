import type { ProvenanceKind } from '@/standards/types';

/** One step from readings to a figure: what is done, the formula, the same with the figures put in, what it gives. */
export interface ExplainedStep {
  what: string;
  formula: string;
  withNumbers: string;
  /** With its unit. */
  value: string;
  /** JSON pointers of the readings that it uses, where they are few. */
  readings?: string[];
}

/** How a figure came about. The last step gives the figure that is judged. */
export interface Explanation {
  method: string;
  title: string;
  ruleSet: string;
  source: { kind: ProvenanceKind; text: string };
  steps: ExplainedStep[];
}
