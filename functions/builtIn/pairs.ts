/**
 * Two columns that belong together, in array formulas: a pair with a gap counts as nothing. Gaps and order are
 * those of the day a formula is worked out, not of the day it was written.
 */
import { pairReadings, type Series } from '../../src/series/series';
import type { Given } from './given';
import { sure, type Phrase } from './phrase';
import type { Readings } from './readings';
import { NotSaid } from './said';

export class Pairs {
  /** 1 for a pair of numbers, 0 for one with a gap. */
  readonly both: string;
  readonly count: string;
  /** How many pairs there is room for. */
  readonly size: number;
  readonly x: string;
  readonly y: string;
  /** They lie beside each other, not one below the other. */
  readonly isRow: boolean;

  private constructor(
    private readonly first: Readings,
    private readonly second: Readings,
  ) {
    this.x = first.whole;
    this.y = second.whole;
    this.both = `ISNUMBER(${this.x})*ISNUMBER(${this.y})`;
    this.count = `SUM(${this.both})`;
    this.size = first.rows * first.columns;
    this.isRow = first.columns > 1;
  }

  /**
   * @param most of them; more would take too long
   * @throws NotSaid where the columns do not lie alike, or hold what a formula cannot judge
   */
  static of(given: Given, x: string, y: string, most = mostPairs): Pairs {
    const [first, second] = [given.column(x), given.column(y)];
    if (!first.isPlaced || !second.isPlaced) throw new NotSaid('a column is worked out within the formula');
    if (first.rows !== second.rows || first.columns !== second.columns)
      throw new NotSaid(`${x} and ${y} do not lie alike`);
    if (first.rows > 1 && first.columns > 1) throw new NotSaid(`${x} is a block`);
    requireAtMost(most, first.rows * first.columns);
    return new Pairs(first, second);
  }

  get holds(): string[] {
    return [`${this.doubt}=0`, `${this.count}>0`];
  }

  /** 0 where every cell is a number or a gap, and an error among them itself. */
  get doubt(): string {
    return `${this.first.doubt}+${this.second.doubt}`;
  }

  /** How many different x there are. */
  get different(): string {
    return `SUM(IF(FREQUENCY(${this.some(this.x)},${this.x})>0,1,0))`;
  }

  /** One of them, counted from 0: its x, and whether it is without a gap. */
  element(n: number): { readonly x: string; readonly isPair: string } {
    const place: [number, number] = this.isRow ? [0, n] : [n, 0];
    const [x, y] = [this.first, this.second].map((one) => one.element(...place));
    return { x, isPair: `ISNUMBER(${x})*ISNUMBER(${y})` };
  }

  /** On the day of the copy; nothing where there is no pair, or an error among them. */
  get today(): Series | undefined {
    const [x, y] = [this.first.numbers, this.second.numbers];
    return x && y && x.some((one, n) => one !== null && y[n] !== null) ? pairReadings(x, y) : undefined;
  }

  /** 1, 2, 3 … beside the pairs, where they stand in cells. */
  get places(): string {
    const first = this.x.replace(/:.*/, '');
    return this.isRow ? `COLUMN(${this.x})-COLUMN(${first})+1` : `ROW(${this.x})-ROW(${first})+1`;
  }

  /** Of a column that lies as they do: what stands at one of these places. */
  standingAt(column: string, place: string): string {
    return `INDEX(${column},${this.isRow ? '1,' : ''}${place})`;
  }

  /** Of each pair what the text says, and nothing of one with a gap: for MIN, MAX, SMALL and the like. */
  some(text: string): string {
    return `IF(${this.both},${text},"")`;
  }

  /** Of each pair what the text says, and 0 of one with a gap: for sums. */
  each(text: string): string {
    return `IF(${this.both},${text},0)`;
  }

  /** The sign of the slope through all pairs; 1 for a level column. */
  trend(): string {
    const x = this.each(this.x);
    return `IF(SUM((${x}-SUM(${x})/MAX(1,${this.count}))*${this.each(this.y)})<0,-1,1)`;
  }

  /** As given, or by the trend. */
  stoichiometricNumber(given: Given): Phrase {
    if (!given.has('coefficient')) return sure(this.trend());
    const { text, holds } = given.number('coefficient');
    return { text, holds: [...holds, `${text}<>0`] };
  }

  /** Least squares of y against terms of x, of which the first is a constant: a row of coefficients, last term first. */
  fit({ y, terms, weight }: Fit): string {
    const unit = (n: number): string =>
      `{${terms.map((_, place) => (place === n ? 1 : 0)).join(this.isRow ? ';' : ',')}}`;
    const columns = terms.map((term, n) => (term === '1' ? unit(n) : `${term}*${unit(n)}`)).join('+');
    return `LINEST(${weight}*${y},${weight}*(${columns}),FALSE,TRUE)`;
  }
}

interface Fit {
  readonly y: string;
  readonly terms: readonly string[];
  /** 0 leaves a pair out; else the root of its weight. */
  readonly weight: string;
}

/** @throws NotSaid */
export function requireAtMost(most: number, pairs: number): void {
  if (pairs > most) throw new NotSaid(`a column of more than ${most} pairs would make it slow`);
}

/** Where each cell that asks, or each line of a table, works through all pairs. */
export const mostPairs = 500;
