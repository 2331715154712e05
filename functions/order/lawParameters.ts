/** What the functions that fit a rate law have in common. */
import { fitRateLaw, type RateLawFit } from '../../src/order/fit';
import { tableOfLaws } from '../builtIn/law';
import type { FitTable } from '../builtIn/said';
import { detail, endpoint, uncertainties } from '../commonParameters';
import type { Values } from '../define';
import { column, number } from '../parameters';
import { seriesOf, uncertaintiesOf } from '../run';
import { watched, type WatchedLaws } from '../watchedLaw';

export const runParameters = {
  times: column({ help: 'times of the run', unit: 'time' }),
  values: column({ help: 'readings in proportion to what is left, or to what has formed' }),
};

export const lawParameters = { endpoint: endpoint(), uncertainties: uncertainties() };

/** One law of known order, and the answer with its uncertainty where it is asked for. */
export const knownLawParameters = {
  ...runParameters,
  order: number({ help: 'n in −dc/dt = kcⁿ, need not be whole' }),
  ...lawParameters,
  detail: detail(),
};

export function fitKnownLaw(given: Omit<Values<typeof knownLawParameters>, 'detail'>): RateLawFit {
  const { times, values, order, endpoint } = given;
  const series = seriesOf(times, values);
  return fitRateLaw(series, {
    order,
    endpoint,
    uncertainties: uncertaintiesOf(series, values, given.uncertainties),
  });
}

/** What COEFFICIENT, HALFLIFE and CURVE fit alike. */
export const knownLaw: WatchedLaws<Omit<Values<typeof knownLawParameters>, 'detail'>> = {
  what: 'Rate law of known order',
  readings: 'values',
  of: (given) => [watched(fitKnownLaw(given), seriesOf(given.times, given.values))],
};

export const knownLawTable: FitTable = (given) => tableOfLaws(knownLaw, given).table;

/** Of the method, which all state. */
export const lawMethod =
  'The integrated law of order n (the second line at order 1) is fitted to the readings as they are by nonlinear least squares; y₀ and y∞ enter linearly and are projected out. Nothing is linearised. Time counts from the first reading.';

export const lawLines = ['y = y∞ + (y₀ − y∞)[1 + (n − 1)κt]^(−1/(n − 1))', 'y = y∞ + (y₀ − y∞) exp(−κt)'];

export const lawQuantities = {
  y: 'reading',
  'y₀': 'reading at the first time, fitted',
  'y∞': 'endpoint, the reading at infinite time',
  n: 'order',
  κ: 'reduced rate coefficient, per time: k times the first distance from the end to the power n − 1',
  t: 'time since the first reading',
};

export const lawEquations = { lines: lawLines, where: lawQuantities };
