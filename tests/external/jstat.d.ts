/** The part of jstat used as a second opinion; the package brings no types. */
declare module 'jstat' {
  export const jStat: {
    studentt: { inv(probability: number, degrees: number): number };
    normal: { cdf(z: number, mean: number, deviation: number): number };
  };
}
