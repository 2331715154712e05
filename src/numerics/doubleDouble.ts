/**
 * Sums of products in twice the working precision: what is rounded off each step is kept and added at the end.
 *
 * @see T. Ogita, S. M. Rump and S. Oishi, SIAM J. Sci. Comput. 26 (2005) 1955, doi:10.1137/030601818 (Dot2)
 */

const splitter = 2 ** 27 + 1;

/** A sum that runs on. */
export class ExactSum {
  private high = 0;
  private low = 0;

  add(value: number): this {
    const sum = this.high + value;
    const part = sum - this.high;
    this.low += this.high - (sum - part) + (value - part);
    this.high = sum;
    return this;
  }

  /** Adds x y. */
  addProduct(x: number, y: number): this {
    const product = x * y;
    const xHigh = upperHalf(x);
    const xLow = x - xHigh;
    const yHigh = upperHalf(y);
    const yLow = y - yHigh;
    this.low += xLow * yLow - (product - xHigh * yHigh - xLow * yHigh - xHigh * yLow);
    return this.add(product);
  }

  get value(): number {
    return this.high + this.low;
  }
}

/** The upper half of a number's digits (Dekker). */
function upperHalf(x: number): number {
  const scaled = splitter * x;
  return scaled - (scaled - x);
}
