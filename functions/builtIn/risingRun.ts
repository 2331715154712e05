/** Runs without gaps whose times rise, which formulas that go from reading to reading are built on. */
import type { Given } from './given';
import { Pairs } from './pairs';
import type { Readings } from './readings';

export class RisingRun {
  readonly pairs: Pairs;
  private readonly times: Readings;
  private readonly values: Readings;

  constructor(given: Given) {
    this.pairs = Pairs.of(given, 'times', 'values');
    this.times = given.readings('times');
    this.values = given.readings('values');
  }

  /** That this is so on the day the formula is worked out. @param strictly whether equal times are refused */
  holds(strictly: boolean): string[] {
    const steps = `${this.times.without('first')}-${this.times.without('last')}`;
    return [
      ...this.pairs.holds,
      `${this.pairs.count}=${this.pairs.size}`,
      `SUM(IF(${steps}${strictly ? '>' : '>='}0,0,1))=0`,
    ];
  }

  /** 1, 2, 3 … beside the readings. */
  get places(): string {
    const first = this.time(0);
    const [row, column] = [`ROW(${this.pairs.x})-ROW(${first})`, `COLUMN(${this.pairs.x})-COLUMN(${first})`];
    return `(${this.pairs.rows > 1 ? row : column}+1)`;
  }

  time = (n: number): string => this.stretch('times', n, n);
  value = (n: number): string => this.stretch('values', n, n);

  /** From the reading at a place up to that at another, both counted from 0. */
  stretch(of: 'times' | 'values', from: number, to: number): string {
    return this[of].stretch(from, to);
  }
}
