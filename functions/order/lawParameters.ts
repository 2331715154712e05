/** What the functions that fit a rate law have in common. */
import { fitRateLaw, type RateLawFit } from '../../src/order/fit';
import { detail, endpoint, uncertainties } from '../commonParameters';
import type { Values } from '../define';
import { column, number } from '../parameters';
import { seriesOf, uncertaintiesOf } from '../run';

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

export function fitKnownLaw(given: Values<typeof knownLawParameters>): RateLawFit {
  const { times, values, order, endpoint } = given;
  const series = seriesOf(times, values);
  return fitRateLaw(series, {
    order,
    endpoint,
    uncertainties: uncertaintiesOf(series, values, given.uncertainties),
  });
}

/** Of the method, which all state. */
export const lawMethod =
  'The integrated law of order n, y = y∞ + (y₀ − y∞)[1 + (n−1)κt]^(−1/(n−1)), is fitted to the readings as they are by nonlinear least squares, y₀ and y∞ projected out; nothing is linearised. Time counts from the first reading.';
