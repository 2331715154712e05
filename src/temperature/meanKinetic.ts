/** Mean kinetic temperature of a logged history. */
import { gasConstant } from '../constants';
import { InvalidInput, requirePositive, shown } from '../errors';

/**
 * The one temperature that would have done as much as the history did, to a reaction of that activation energy:
 *
 *   T = (Ea/R) / −ln[Σ wᵢ exp(−Ea/RTᵢ) / Σ wᵢ].
 *
 * Worked out from the highest temperature down, so that no exponential underflows.
 *
 * @param temperatures K, above 0
 * @param energy Ea, J/mol, above 0
 * @param durations wᵢ, 0 or more, one each; left out, all alike
 * @returns T, K, between the lowest and the highest temperature
 * @throws InvalidInput outside those ranges, or when no duration is above 0
 * @see J. D. Haynes, J. Pharm. Sci. 60 (1971) 927, doi:10.1002/jps.2600600629
 * @see ICH Q1A(R2), Stability Testing of New Drug Substances and Products (2003), glossary
 * @example meanKineticTemperature(Float64Array.of(293.15, 303.15), 83144) // 299.41
 */
export function meanKineticTemperature(
  temperatures: Float64Array,
  energy: number,
  durations: Float64Array = new Float64Array(temperatures.length).fill(1),
): number {
  requirePositive({ energy });
  const total = requireHistory(temperatures, durations);
  const highest = temperatures.reduce((most, temperature) => Math.max(most, temperature));
  // Σ w expm1(…)/Σ w keeps its digits where temperatures hardly differ
  let shortfall = 0;
  for (let i = 0; i < temperatures.length; i++) {
    const exponent = (energy / gasConstant) * (1 / highest - 1 / temperatures[i]);
    shortfall += (durations[i] / total) * Math.expm1(exponent);
  }
  return 1 / (1 / highest - (gasConstant / energy) * Math.log1p(shortfall));
}

/** @returns the whole duration */
function requireHistory(temperatures: Float64Array, durations: Float64Array): number {
  if (durations.length !== temperatures.length) {
    throw new InvalidInput(
      `durations must be as many as temperatures: got ${durations.length} for ${temperatures.length}`,
    );
  }
  let total = 0;
  for (let i = 0; i < temperatures.length; i++) {
    requirePositive({ temperature: temperatures[i] });
    if (!(durations[i] >= 0)) {
      throw new InvalidInput(`durations must be 0 or more: number ${i + 1} is ${shown(durations[i])}`);
    }
    total += durations[i];
  }
  if (total > 0) return total;
  throw new InvalidInput('a history must last: its durations add up to 0');
}

/**
 * How long each reading of a logger stands for: from halfway to the reading before until halfway to the
 * next, the outer ones up to their own time. Readings of one time share what it stands for.
 *
 * @param times in ascending order, two different ones at least
 * @returns one each, in the unit of the times; together the time from first to last
 * @example holdingTimes(Float64Array.of(0, 1, 5)) // Float64Array [0.5, 2.5, 2]
 */
export function holdingTimes(times: Float64Array): Float64Array {
  const last = times.length - 1;
  const held = new Float64Array(times.length);
  for (let from = 0; from <= last;) {
    let to = from;
    while (to < last && times[to + 1] === times[from]) to++;
    const start = from === 0 ? times[0] : (times[from - 1] + times[from]) / 2;
    const end = to === last ? times[last] : (times[to] + times[to + 1]) / 2;
    held.fill((end - start) / (to - from + 1), from, to + 1);
    from = to + 1;
  }
  return held;
}
