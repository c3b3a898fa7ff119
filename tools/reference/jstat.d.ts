/** The part of jstat that the reference uses; the package brings no types. */
declare module 'jstat' {
  interface ContinuousDistribution {
    pdf(x: number, mean: number, sd: number): number;
    cdf(x: number, mean: number, sd: number): number;
    inv(p: number, mean: number, sd: number): number;
  }
  export const jStat: { normal: ContinuousDistribution; lognormal: ContinuousDistribution };
}
