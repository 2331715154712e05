import { InvalidInput, requireFinite, requirePositive, requireStoichiometricNumber } from '../errors';

/**
 * Rate from a timed event: the mean rate of reaction until a fixed change was reached.
 *
 * r = (1/ν) Δc/t. With no change given the answer is 1/t, proportional to the rate as long as the
 * event is the same from run to run.
 *
 * @param time time until the event, above 0
 * @param change signed change of the species by then, not 0
 * @param stoichiometricNumber signed ν; left out, the sign of the change, so that the rate is positive
 * @returns rate, unit of the change per unit of time
 * @throws InvalidInput outside those ranges
 * @see IUPAC Gold Book, rate of reaction, doi:10.1351/goldbook.R05156
 * @example eventRate(40) // 0.025
 * @example eventRate(40, -0.002, -2) // 0.000025
 */
export function eventRate(time: number, change = 1, stoichiometricNumber = Math.sign(change)): number {
  requirePositive({ time });
  requireFinite({ change });
  if (change === 0) throw new InvalidInput('change must not be 0: nothing happened');
  requireStoichiometricNumber(stoichiometricNumber);
  return change / (stoichiometricNumber * time);
}
