/** Fitted rate laws, which a copy without the add-in cannot fit anew, but can watch: the law, and its readings. */
import { lawOf, type RateLaw } from '../src/order/curve';
import type { RateLawFit } from '../src/order/fit';
import type { Series } from '../src/series/series';

export interface WatchedLaw {
  /** Which of several: `run 3`, `order 2`; empty for the only one. */
  readonly name: string;
  readonly law: RateLaw;
  /** Weighted where uncertainties were given. */
  readonly residualSumOfSquares: number;
  /** Which column of a block holds the readings, counted from 0; left out where there is one alone. */
  readonly line?: number;
}

/** @typeParam V the values that a function runs on */
export interface WatchedLaws<V> {
  /** What is fitted, in words; functions that fit the same thing share these words. */
  readonly what: string;
  /** The parameter that holds the readings. */
  readonly readings: 'values' | 'block';
  /** @throws as the function itself does */
  of(values: V): readonly WatchedLaw[];
}

export const watched = (fit: RateLawFit, series: Series, name = ''): WatchedLaw => ({
  name,
  law: lawOf(fit, series),
  residualSumOfSquares: fit.residualSumOfSquares,
});
