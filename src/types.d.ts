/** What we use of ml-regression, which ships no types. */
declare module 'ml-regression' {
  export class SimpleLinearRegression {
    constructor(x: readonly number[], y: readonly number[]);
    readonly slope: number;
    readonly intercept: number;
    predict(x: number): number;
    score(x: readonly number[], y: readonly number[]): { r: number; r2: number; chi2: number; rmsd: number };
  }
}
