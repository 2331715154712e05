/** A rate coefficient at a temperature that was not measured. */
import { NotDetermined, requirePositive, shown } from '../errors';
import type { Estimate } from '../estimate';
import type { ArrheniusFit } from './arrhenius';
import { heightEstimate } from './centredLine';
import { temperatureRounding } from './measured';

export interface PredictedCoefficient extends Estimate {
  /** Whether the temperature lies outside those measured, where the law is an assumption. */
  readonly isExtrapolated: boolean;
}

/**
 * k of the fitted law at a temperature. Limits are Student's on ln k, carried to k: they lie unevenly about it.
 *
 * @param temperature K, above 0
 * @throws InvalidInput for a temperature that is not above 0; NotDetermined where k is beyond what a number can hold
 * @see N. R. Draper and H. Smith, Applied Regression Analysis, 3rd ed. (1998), 3.1
 * @example predictCoefficient(fitArrhenius({ temperatures: Float64Array.of(250, 500), coefficients: Float64Array.of(1, Math.E) }), 1000).value // 4.48169
 */
export function predictCoefficient(fit: ArrheniusFit, temperature: number): PredictedCoefficient {
  requirePositive({ temperature });
  const log = heightEstimate(fit.line, 1 / temperature);
  const value = Math.exp(log.value);
  if (value === 0 || value === Infinity) {
    throw new NotDetermined(
      `rate coefficient must be a number that can be held: ln k is ${shown(log.value)} at ${shown(temperature)} K`,
    );
  }
  const [lowest, highest] = fit.range;
  return {
    value,
    standardUncertainty: log.standardUncertainty === null ? null : value * log.standardUncertainty,
    lower: log.lower === null ? null : Math.exp(log.lower),
    upper: log.upper === null ? null : Math.exp(log.upper),
    degreesOfFreedom: log.degreesOfFreedom,
    isExtrapolated: temperature < lowest - temperatureRounding || temperature > highest + temperatureRounding,
  };
}
