/** Polynomials through the readings nearest to a time, in formulas of the sheet "Workings". */
import { nearerBy } from '../../src/rate/localPolynomial';
import type { SortedRun } from './sortedRun';

export class PolynomialAt {
  /** Readings before the window. */
  readonly first: string;
  private readonly times: string;
  readonly readings: string;
  private readonly numbers: string;

  /** @param firstCell where `first` is worked out */
  constructor(
    run: SortedRun,
    points: string,
    firstCell: string,
    at: string,
    private readonly degree: number,
  ) {
    const { times, values, count } = run;
    const [ahead, behind] = [
      `INDEX(${times},${points}+1):INDEX(${times},${count})-${at}`,
      `${at}-INDEX(${times},1):INDEX(${times},${count}-${points})`,
    ];
    this.first = `IF(${count}>${points},SUM(IF(${ahead}<${nearerBy}*(${behind}),1,0)),0)`;
    const window = (of: string): string => `INDEX(${of},${firstCell}+1):INDEX(${of},${firstCell}+${points})`;
    this.times = `(${window(times)}-${at})`;
    this.readings = window(values);
    this.numbers = window(run.numbers);
  }

  /** 1 for one reading of the window, by its number, and 0 for all others. */
  only(number: string): string {
    return `IF(${this.numbers}=${number},1,0)`;
  }

  finerHeight(readings: string): string {
    return `INDEX(${this.fit(readings, this.degree + 1)},1,${this.degree + 2})`;
  }

  /** Slope, slope of one degree more, and the variance of that in units of the readings' own. */
  get slopes(): string[] {
    const { degree, readings } = this;
    return [
      `INDEX(${this.fit(readings, degree)},1,${degree})`,
      `INDEX(${this.fit(readings, degree + 1)},1,${degree + 1})`,
      `1/INDEX(${this.timesByHigherPowers},5,2)`,
    ];
  }

  /** What the other powers leave of the times: its sum of squares is the slope's information (Frisch and Waugh 1933). */
  private get timesByHigherPowers(): string {
    const powers = Array.from({ length: this.degree }, (_, n) => n + 2).join(',');
    return `LINEST(${this.times},${this.times}^{${powers}},TRUE,TRUE)`;
  }

  /** Coefficients with their statistics, the highest power first. */
  private fit(readings: string, degree: number): string {
    const powers = Array.from({ length: degree }, (_, n) => n + 1).join(',');
    return `LINEST(${readings},${this.times}^{${powers}},TRUE,TRUE)`;
  }
}
