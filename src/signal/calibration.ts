/** A straight calibration line, and what it says of an unknown. */
import { InvalidInput, NotDetermined, requireFinite, shown } from '../errors';
import { withStudentLimits, type Estimate } from '../estimate';
import { studentQuantile } from '../numerics/studentT';

export interface Standards {
  readonly concentrations: Float64Array;
  readonly readings: Float64Array;
  /** Standard uncertainty of each reading, up to a common factor; left out, all alike. */
  readonly uncertainties?: Float64Array;
}

export interface CalibrationLine {
  readonly standards: Standards;
  readonly slope: number;
  /** 0 for a line through the origin. */
  readonly intercept: number;
  readonly throughOrigin: boolean;
  /** Scatter of a reading of weight 1; `null` without degrees of freedom. */
  readonly deviation: number | null;
  readonly degreesOfFreedom: number;
  /** Weighted centre and spread of the concentrations, about the origin for a line through it. */
  readonly centre: number;
  readonly spread: number;
  readonly weight: number;
}

/** How far beyond the standards a reading may lie, as a share of their range (common practice). */
const reachBeyond = 0.1;

/**
 * Least-squares line reading = intercept + slope × concentration, weighted by 1/u².
 *
 * @throws InvalidInput for lengths that differ or an uncertainty that is not above 0; NotDetermined with too
 *   few different concentrations, or when the slope cannot be told from 0
 * @see EURACHEM/CITAC Guide CG 4, Quantifying Uncertainty in Analytical Measurement, 3rd ed. (2012), E.4
 * @example calibrationLine({ concentrations: Float64Array.of(0, 1, 3), readings: Float64Array.of(1, 3, 7) }).slope // 2
 */
export function calibrationLine(standards: Standards, throughOrigin = false): CalibrationLine {
  const { concentrations: x, readings: y } = standards;
  const weights = weightsOf(standards);
  requireDifferent(x, throughOrigin);
  const weight = weights.reduce((sum, w) => sum + w, 0);
  const mean = (values: Float64Array): number =>
    values.reduce((sum, v, i) => sum + weights[i] * v, 0) / weight;
  const centre = throughOrigin ? 0 : mean(x);
  const level = throughOrigin ? 0 : mean(y);
  let spread = 0;
  let product = 0;
  for (let i = 0; i < x.length; i++) {
    spread += weights[i] * (x[i] - centre) ** 2;
    product += weights[i] * (x[i] - centre) * (y[i] - level);
  }
  const slope = product / spread;
  const intercept = throughOrigin ? 0 : level - slope * centre;
  const degreesOfFreedom = x.length - (throughOrigin ? 1 : 2);
  let squares = 0;
  for (let i = 0; i < x.length; i++) squares += weights[i] * (y[i] - level - slope * (x[i] - centre)) ** 2;
  const deviation = degreesOfFreedom > 0 ? Math.sqrt(squares / degreesOfFreedom) : null;
  const line = {
    standards,
    slope,
    intercept,
    throughOrigin,
    deviation,
    degreesOfFreedom,
    centre,
    spread,
    weight,
  };
  requireSlope(line);
  return line;
}

function weightsOf({ readings, uncertainties }: Standards): Float64Array {
  if (!uncertainties) return new Float64Array(readings.length).fill(1);
  return uncertainties.map((u, i) => {
    if (!(Number.isFinite(u) && u > 0)) {
      throw new InvalidInput(`uncertainties must be above 0: that of standard ${i + 1} is ${shown(u)}`);
    }
    return 1 / u ** 2;
  });
}

function requireDifferent(concentrations: Float64Array, throughOrigin: boolean): void {
  const different = new Set(concentrations);
  if (throughOrigin) different.delete(0);
  const needed = throughOrigin ? 1 : 2;
  if (different.size < needed) {
    throw new NotDetermined(
      `a calibration line needs ${throughOrigin ? 'a standard other than 0' : 'two different standards'}: got ${different.size}`,
    );
  }
}

/** @throws NotDetermined where the slope's 95 % limits hold 0, since any concentration would then do */
function requireSlope({ slope, deviation, degreesOfFreedom, spread }: CalibrationLine): void {
  const reach =
    deviation === null ? 0 : (studentQuantile(0.975, degreesOfFreedom) * deviation) / Math.sqrt(spread);
  if (Math.abs(slope) > reach) return;
  throw new NotDetermined(
    `calibration line must rise or fall clearly: its slope is ${shown(slope)}, and 95 % limits are ± ${shown(reach)}`,
  );
}

/**
 * Concentration that belongs to a reading, with its standard uncertainty from the line and from the reading
 * itself: u = (1/|b|) √(s²/(w₀m) + var(a) + x² var(b) + 2x cov(a,b)).
 *
 * The reading counts as scattering like a standard of its size.
 *
 * @param reading of the unknown, or the mean of several
 * @param replicates m, how many readings it is the mean of
 * @returns concentration with Student's limits, in the unit of the standards
 * @throws NotDetermined for a reading more than a tenth of their range beyond those of the standards
 * @see EURACHEM/CITAC Guide CG 4, 3rd ed. (2012), E.4 and example A5
 * @example concentrationFromLine(calibrationLine({ concentrations: Float64Array.of(0, 4), readings: Float64Array.of(1, 9) }), 4).value // 1.5
 */
export function concentrationFromLine(line: CalibrationLine, reading: number, replicates = 1): Estimate {
  requireFinite({ reading });
  if (!(Number.isInteger(replicates) && replicates >= 1)) {
    throw new InvalidInput(`replicates must be a whole number, 1 or more: got ${shown(replicates)}`);
  }
  requireWithinStandards(line, reading);
  const { slope, intercept, deviation, degreesOfFreedom, centre, spread, weight, throughOrigin } = line;
  const value = (reading - intercept) / slope;
  if (deviation === null) return withStudentLimits(value, null, degreesOfFreedom);
  const ownVariance = uncertaintyAt(line.standards, reading) ** 2 / replicates;
  const lineVariance = (throughOrigin ? 0 : 1 / weight) + (value - centre) ** 2 / spread;
  const standardUncertainty = (deviation / Math.abs(slope)) * Math.sqrt(ownVariance + lineVariance);
  return withStudentLimits(value, standardUncertainty, degreesOfFreedom);
}

function requireWithinStandards({ standards, throughOrigin }: CalibrationLine, reading: number): void {
  const { readings } = standards;
  let low = throughOrigin ? 0 : Infinity;
  let high = throughOrigin ? 0 : -Infinity;
  for (const y of readings) {
    low = Math.min(low, y);
    high = Math.max(high, y);
  }
  const margin = reachBeyond * (high - low);
  if (reading >= low - margin && reading <= high + margin) return;
  throw new NotDetermined(
    `reading must lie among those of the standards, ${shown(low)} to ${shown(high)}: ${shown(reading)} needs a standard beyond it, or a dilution`,
  );
}

/** u of a reading of that size, linear between the standards next to it; 1 where all are alike. */
function uncertaintyAt({ readings, uncertainties }: Standards, reading: number): number {
  if (!uncertainties) return 1;
  const order = [...readings.keys()].sort((i, j) => readings[i] - readings[j]);
  const right = order.findIndex((i) => readings[i] >= reading);
  if (right === 0) return uncertainties[order[0]];
  if (right === -1) return uncertainties[order[order.length - 1]];
  const [i, j] = [order[right - 1], order[right]];
  const share = (reading - readings[i]) / (readings[j] - readings[i]);
  return uncertainties[i] + share * (uncertainties[j] - uncertainties[i]);
}
