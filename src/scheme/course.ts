/** The course of a mechanism: the concentration of every species at the times asked for. */
import { InvalidInput, NotDetermined, shown } from '../errors';
import {
  integrate,
  IntegrationStopped,
  type IntegrationOptions,
  type Trajectory,
} from '../numerics/integrate';
import { MassAction } from './massAction';
import { reactionInWords, type Scheme } from './scheme';

/** A concentration so high that the scheme has run away. */
const runaway = 1e12;

/** Of the highest concentration at the start: where a species of broken order counts as spent. */
const spent = 1e-14;

/** Sensitivities are ∂c/∂ln k; a coefficient's place is its parameter. */
export type CourseOptions = IntegrationOptions;

/**
 * Integrates a scheme from time 0.
 *
 * @param coefficients one a reaction, 0 or more
 * @param initial concentration of each species at time 0, 0 or more
 * @param times 0 or later, in any order, repeated where wanted
 * @returns one row a time, one concentration a species, in their order; 8 digits and more as a rule
 * @throws InvalidInput where something is missing or out of range, or a species grows without bound
 * @throws NotDetermined where it takes too much work
 * @example courseOf(parseScheme('A -> B'), [Math.LN2], [1, 0], [1])[0] // Float64Array [0.50000000, 0.50000000]
 * @see G. Steinebach, BIT Numer. Math. 63 (2023) 27, doi:10.1007/s10543-023-00967-x
 */
export function courseOf(
  scheme: Scheme,
  coefficients: ArrayLike<number>,
  initial: ArrayLike<number>,
  times: ArrayLike<number>,
  options: CourseOptions = {},
): Float64Array[] {
  return trajectoryOf(scheme, coefficients, initial, times, options).states.map((state) =>
    state.map((concentration) => Math.max(0, concentration)),
  );
}

/**
 * The same with all that the integration knows, in the order of the times.
 *
 * @example trajectoryOf(parseScheme('A ->'), [1], [1], [1], { sensitivities: [0] }).sensitivities[0][0][0] // -0.3678794
 */
export function trajectoryOf(
  scheme: Scheme,
  coefficients: ArrayLike<number>,
  initial: ArrayLike<number>,
  times: ArrayLike<number>,
  options: CourseOptions = {},
): Trajectory {
  requireCourse(scheme, coefficients, initial, times);
  const order = ascending(times);
  const sorted = Float64Array.from(order, (place) => times[place]);
  const system = new MassAction(scheme, Float64Array.from(coefficients), spent * highest(initial));
  const found = inWords(scheme, sorted, () => integrate(system, initial, sorted, options));
  const place = new Int32Array(order.length);
  order.forEach((original, i) => (place[original] = i));
  return {
    ...found,
    states: Array.from(place, (i) => found.states[i]),
    sensitivities: found.sensitivities.length > 0 ? Array.from(place, (i) => found.sensitivities[i]) : [],
  };
}

/**
 * What every course must be given.
 *
 * @throws InvalidInput where something is missing or out of range
 * @example requireCourse(parseScheme('A -> B'), [1], [1, 0], [0, 10]) // undefined
 */
export function requireCourse(
  scheme: Scheme,
  coefficients: ArrayLike<number>,
  initial: ArrayLike<number>,
  times: ArrayLike<number>,
): void {
  requireCoefficients(scheme, coefficients);
  requireInitial(scheme, initial);
  requireTimes(times);
}

function requireCoefficients(scheme: Scheme, coefficients: ArrayLike<number>): void {
  const { reactions } = scheme;
  if (coefficients.length < reactions.length) {
    throw new InvalidInput(
      `coefficients must be one for each direction of each step: none for ${reactionInWords(scheme, coefficients.length)}`,
    );
  }
  if (coefficients.length > reactions.length) {
    throw new InvalidInput(
      `coefficients must be one for each direction of each step: got ${coefficients.length} for ${reactions.length}`,
    );
  }
  reactions.forEach((_, place) => {
    if (Number.isFinite(coefficients[place]) && coefficients[place] >= 0) return;
    throw new InvalidInput(
      `coefficients must be 0 or more: ${reactionInWords(scheme, place)} (${shown(coefficients[place])})`,
    );
  });
}

function requireInitial({ species }: Scheme, initial: ArrayLike<number>): void {
  const rule = `initial must hold one concentration a species, in the order ${species.join(', ')}`;
  if (initial.length < species.length) throw new InvalidInput(`${rule}: none for ${species[initial.length]}`);
  if (initial.length > species.length) {
    throw new InvalidInput(`${rule}: got ${initial.length} for ${species.length}`);
  }
  species.forEach((name, place) => {
    if (Number.isFinite(initial[place]) && initial[place] >= 0) return;
    throw new InvalidInput(`initial must be 0 or more: ${name} (${shown(initial[place])})`);
  });
}

function requireTimes(times: ArrayLike<number>): void {
  Array.from(times).forEach((time, place) => {
    if (Number.isFinite(time) && time >= 0) return;
    throw new InvalidInput(
      `times must be 0 or later, since initial belongs to time 0: row ${place + 1} (${shown(time)})`,
    );
  });
}

/** Places of the times, earliest first. */
const ascending = (times: ArrayLike<number>): number[] =>
  Array.from(times, (_, place) => place).sort((one, other) => times[one] - times[other]);

const highest = (values: ArrayLike<number>): number =>
  Array.from(values).reduce((largest, value) => Math.max(largest, value), 0) || 1;

/** Says in the chemist's words why an integration stopped. */
function inWords(scheme: Scheme, times: Float64Array, work: () => Trajectory): Trajectory {
  try {
    return work();
  } catch (error) {
    if (!(error instanceof IntegrationStopped)) throw error;
    throw explained(scheme, times, error);
  }
}

function explained({ species }: Scheme, times: Float64Array, stopped: IntegrationStopped): Error {
  const { state, time, steps, reason } = stopped;
  const end = shown(times[times.length - 1]);
  const largest = state.reduce((best, value, i) => (value > state[best] ? i : best), 0);
  if (state[largest] > runaway || reason === 'no step is small enough') {
    return new InvalidInput(
      `scheme must keep concentrations within bounds: ${species[largest]} grows without end near time ${shown(time)} (${shown(state[largest])})`,
    );
  }
  return new NotDetermined(
    `course takes too much work: after ${steps} steps it has come to time ${shown(time)} of ${end}`,
  );
}
