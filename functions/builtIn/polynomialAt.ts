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
    private readonly firstCell: string,
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
    const any = this.fit(this.only(`${this.firstCell}+1`), degree + 1);
    return [
      `INDEX(${this.fit(readings, degree)},1,${degree})`,
      `INDEX(${this.fit(readings, degree + 1)},1,${degree + 1})`,
      // the same whatever the readings are, so of one that is 1 among zeros
      `(INDEX(${any},2,${degree + 1})/INDEX(${any},3,2))^2`,
    ];
  }

  /** Coefficients with their statistics, the highest power first. */
  private fit(readings: string, degree: number): string {
    const powers = Array.from({ length: degree }, (_, n) => n + 1).join(',');
    return `LINEST(${readings},${this.times}^{${powers}},TRUE,TRUE)`;
  }
}
