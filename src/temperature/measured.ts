/** Rate coefficients measured at several temperatures: what every fit over temperature starts from. */
import { celsiusZero } from '../constants';
import { InvalidInput, NotDetermined, shown } from '../errors';

export interface MeasuredCoefficients {
  /** K; equal temperatures are replicates. */
  readonly temperatures: Float64Array;
  /** k, all in one unit. */
  readonly coefficients: Float64Array;
  /** Standard uncertainty of each k, up to a common factor; left out, all in proportion to k. */
  readonly uncertainties?: Float64Array;
}

/** K: 25 degC and 298.15 K are one temperature, though they can differ in their last digit. */
export const temperatureRounding = 1e-9;

/**
 * @param purpose as a message names it: `an activation energy`
 * @throws InvalidInput for lengths that differ, a number not above 0, or temperatures all alike; NotDetermined
 *   with fewer than two coefficients
 * @example requireMeasured({ temperatures: Float64Array.of(300, 300), coefficients: Float64Array.of(1, 2) }, 'a fit') // throws temperatures must differ: all 2 are 300 K, 26.85 degC
 */
export function requireMeasured(measured: MeasuredCoefficients, purpose: string): void {
  const { temperatures, coefficients, uncertainties } = measured;
  requireOneEach({ coefficients, uncertainties }, temperatures.length);
  requireAbove0({ temperatures, coefficients, uncertainties });
  if (temperatures.length < 2) {
    throw new NotDetermined(`${purpose} needs coefficients at two temperatures: got ${temperatures.length}`);
  }
  const [lowest, highest] = rangeOf(temperatures);
  if (highest - lowest < temperatureRounding) {
    const all = `all ${temperatures.length} are ${shown(lowest)} K`;
    throw new InvalidInput(`temperatures must differ: ${all}, ${shown(lowest - celsiusZero)} degC`);
  }
}

/** Lowest and highest. @example rangeOf(Float64Array.of(300, 280, 290)) // [280, 300] */
export const rangeOf = (numbers: Float64Array): readonly [number, number] => [
  numbers.reduce((least, value) => Math.min(least, value)),
  numbers.reduce((most, value) => Math.max(most, value)),
];

type Columns = Readonly<Record<string, Float64Array | undefined>>;

function requireOneEach(columns: Columns, count: number): void {
  for (const [name, numbers] of Object.entries(columns)) {
    if (numbers === undefined || numbers.length === count) continue;
    throw new InvalidInput(`${name} must be as many as temperatures: got ${numbers.length} for ${count}`);
  }
}

function requireAbove0(columns: Columns): void {
  for (const [name, numbers] of Object.entries(columns)) {
    numbers?.forEach((value, i) => {
      if (Number.isFinite(value) && value > 0) return;
      throw new InvalidInput(`${name} must be above 0: number ${i + 1} is ${shown(value)}`);
    });
  }
}
