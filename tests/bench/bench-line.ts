/** One figure of a benchmark, printed as one line. */
export type BenchLine = {
  name: string;
  ours: string;
  reference: string;
  ratio: string;
  bar: string;
  /** null: no bar, or not measured on this machine. */
  meets: boolean | null;
};
