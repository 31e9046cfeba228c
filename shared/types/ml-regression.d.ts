/** The part of ml-regression that is used; the package ships no types. */
declare module 'ml-regression' {
  /** y = A · x^B by least squares on logarithms. */
  export class PowerRegression {
    constructor(x: number[], y: number[]);
    readonly A: number;
    readonly B: number;
  }
}
