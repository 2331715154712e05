/** Average rate between two times, with what the scatter of the readings makes of it. */
import { InvalidInput, NotDetermined, requireFinite, shown } from '../errors';
import { withStudentLimits, type Estimate } from '../estimate';
import {
  averageReplicates,
  requireDistinctTimes,
  stoichiometricNumberFor,
  type Series,
} from '../series/series';

interface AveragedRun {
  readonly times: Float64Array;
  readonly values: Float64Array;
  readonly counts: Int32Array;
}

/**
 * Average rate of reaction between two times: r = (1/ν) [y(to) − y(from)] / (to − from).
 *
 * Where no reading sits, y is interpolated linearly; replicates are averaged. The standard uncertainty
 * carries the readings' scatter (see {@link readingScatter}) through the interpolation to first order.
 *
 * @param from start of the interval, within the run
 * @param to end of the interval, within the run, not equal to `from`
 * @returns rate in reading units per time unit
 * @throws InvalidInput when from equals to; NotDetermined outside the run
 * @see IUPAC Gold Book, rate of reaction, doi:10.1351/goldbook.R05156
 * @example averageRate(pairReadings([0, 10, 20], [9, 7, 5]), 0, 15).value // 0.2
 */
export function averageRate(
  series: Series,
  from: number,
  to: number,
  stoichiometricNumber?: number,
): Estimate {
  requireFinite({ from, to });
  if (from === to) throw new InvalidInput(`from and to must differ: both are ${shown(from)}`);
  requireDistinctTimes(series, 2, 'an average rate');
  const nu = stoichiometricNumberFor(series, stoichiometricNumber);
  const run = averageReplicates(series);
  const weights = new Float64Array(run.times.length);
  addInterpolation(run, to, 'to', 1, weights);
  addInterpolation(run, from, 'from', -1, weights);
  let difference = 0;
  let spread = 0;
  for (let i = 0; i < weights.length; i++) {
    difference += weights[i] * run.values[i];
    spread += weights[i] ** 2 / run.counts[i];
  }
  const perTime = 1 / (nu * (to - from));
  const { deviation, degreesOfFreedom } = readingScatter(run);
  const standardUncertainty =
    degreesOfFreedom === 0 ? null : deviation * Math.sqrt(spread) * Math.abs(perTime);
  return withStudentLimits(difference * perTime, standardUncertainty, degreesOfFreedom);
}

/** Adds ± the weights by which the readings make up y(time). */
function addInterpolation(
  { times }: AveragedRun,
  time: number,
  name: string,
  sign: number,
  weights: Float64Array,
): void {
  const last = times.length - 1;
  if (time < times[0] || time > times[last]) {
    throw new NotDetermined(
      `${name} must lie within the run, ${shown(times[0])} to ${shown(times[last])}: got ${shown(time)}`,
    );
  }
  let right = 1;
  while (right < last && times[right] < time) right++;
  const share = (time - times[right - 1]) / (times[right] - times[right - 1]);
  weights[right - 1] += sign * (1 - share);
  weights[right] += sign * share;
}

interface Scatter {
  readonly deviation: number;
  /** Effective, by matching the estimate's own variance; 0 when there are fewer than three times. */
  readonly degreesOfFreedom: number;
}

/**
 * Standard deviation of a single reading, without a model of the run: each reading is set against the
 * straight line through its two neighbours, which leaves the scatter and little of the bend.
 *
 * The pseudo-residuals overlap, so the degrees of freedom are fewer than their number: for even spacing
 * 0.51 of it, from the correlations 2/3 and 1/6 between neighbours.
 *
 * @see T. Gasser, L. Sroka and C. Jennen-Steinmetz, Biometrika 73 (1986) 625, doi:10.1093/biomet/73.3.625
 * @example readingScatter(averageReplicates(pairReadings([0, 1, 2], [0, 1, 4]))).deviation // 0.816497
 */
export function readingScatter({ times, values, counts }: AveragedRun): Scatter {
  const inner = times.length - 2;
  if (inner < 1) return { deviation: 0, degreesOfFreedom: 0 };
  let sum = 0;
  for (let i = 1; i <= inner; i++) {
    const right = (times[i] - times[i - 1]) / (times[i + 1] - times[i - 1]);
    const left = 1 - right;
    const pseudo = left * values[i - 1] + right * values[i + 1] - values[i];
    sum += pseudo ** 2 / (left ** 2 / counts[i - 1] + right ** 2 / counts[i + 1] + 1 / counts[i]);
  }
  const overlap = (2 * ((inner - 1) * (4 / 9) + Math.max(0, inner - 2) / 36)) / inner;
  return { deviation: Math.sqrt(sum / inner), degreesOfFreedom: inner / (1 + overlap) };
}
