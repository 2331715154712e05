/** Time on a scale that allows for a changing concentration. */
import { InvalidInput, shown } from '../errors';
import { requireDistinctTimes, type Series } from '../series/series';

/**
 * Normalised time τ = ∫cᵝdt, counted from the first reading: Σ [(cᵢ + cᵢ₋₁)/2]ᵝ (tᵢ − tᵢ₋₁). Products of runs
 * that differ in c fall on one curve against it when β is the order in that species.
 *
 * @param series times and concentrations
 * @param exponent β; with one that is not a whole number above 0, concentrations must be above 0
 * @returns τ at each reading, in order of time
 * @throws InvalidInput where a concentration does not allow the exponent
 * @see variable time normalization: J. Burés, Angew. Chem. Int. Ed. 55 (2016) 16084, doi:10.1002/anie.201609757
 * @example normalisedTimes(pairReadings([0, 2, 4], [3, 2, 2]), 1) // Float64Array [0, 5, 9]
 */
export function normalisedTimes(series: Series, exponent: number): Float64Array {
  requireDistinctTimes(series, 2, 'a normalised time');
  const { times, values } = series;
  requireAllowed(series, exponent);
  const normalised = new Float64Array(times.length);
  for (let i = 1; i < times.length; i++) {
    const mean = (values[i] + values[i - 1]) / 2;
    normalised[i] = normalised[i - 1] + (exponent === 0 ? 1 : mean ** exponent) * (times[i] - times[i - 1]);
  }
  return normalised;
}

function requireAllowed({ values, places }: Series, exponent: number): void {
  if (!Number.isFinite(exponent))
    throw new InvalidInput(`exponent must be a finite number: got ${shown(exponent)}`);
  if (Number.isInteger(exponent) && exponent >= 0) return;
  const strict = exponent < 0;
  const bad = values.findIndex((value) => (strict ? value <= 0 : value < 0));
  if (bad === -1) return;
  throw new InvalidInput(
    `values must be ${strict ? 'above 0' : '0 or more'} for the exponent ${shown(exponent)}: row ${places[bad] + 1} (${shown(values[bad])})`,
  );
}
