/** Runs as a mechanism is fitted to them: what went in, when it was looked at, and what was read. */
import { InvalidInput, shown } from '../errors';
import type { Scheme } from './scheme';

/** Readings that are a sum over species: one concentration, or an absorbance to which several contribute. */
export interface Signal {
  /** How much of each species a reading holds: 1 for the one that is followed, 0 elsewhere. */
  readonly weights: ArrayLike<number>;
  /** One a time; `null` where none was taken. */
  readonly readings: readonly (number | null)[];
  /**
   * Where the scale is not known, a name for the factor that readings are in proportion by: it is fitted, and
   * shared by all signals of that name. Left out, readings stand in the unit of the concentrations.
   */
  readonly factor?: string;
}

/** One run, from its own start. Several share the scheme's coefficients. */
export interface Experiment {
  /** Concentration of each species at time 0. */
  readonly initial: ArrayLike<number>;
  /** 0 or later. */
  readonly times: ArrayLike<number>;
  readonly signals: readonly Signal[];
}

/**
 * One species followed by its own concentration.
 *
 * @example followed(parseScheme('A -> B'), 'B', [0, 2]).weights // [0, 1]
 */
export const followed = (
  { species }: Scheme,
  name: string,
  readings: readonly (number | null)[],
): Signal => ({ weights: species.map((one) => (one === name ? 1 : 0)), readings });

/** A reading that was taken, and where it belongs. */
export interface Reading {
  readonly experiment: number;
  readonly time: number;
  /** Place in the experiment's times. */
  readonly place: number;
  readonly signal: Signal;
  readonly value: number;
}

/**
 * All readings of all runs, gaps left out, in order.
 *
 * @throws InvalidInput where lengths do not agree, a reading is not finite, or none was taken
 * @example readingsOf(parseScheme('A ->'), [{ initial: [1], times: [0, 1], signals: [{ weights: [1], readings: [1, null] }] }]).length // 1
 */
export function readingsOf(scheme: Scheme, experiments: readonly Experiment[]): Reading[] {
  const readings = experiments.flatMap((experiment, run) =>
    experiment.signals.flatMap((signal) => {
      requireLengths(scheme, experiment, signal);
      return signal.readings.flatMap((value, place) =>
        value === null ? [] : [{ experiment: run, time: experiment.times[place], place, signal, value }],
      );
    }),
  );
  if (readings.length === 0) throw new InvalidInput('observed must hold readings: none was found');
  for (const { value, place } of readings) {
    if (!Number.isFinite(value)) {
      throw new InvalidInput(`observed must be finite numbers: row ${place + 1} (${shown(value)})`);
    }
  }
  return readings;
}

function requireLengths({ species }: Scheme, { times }: Experiment, { weights, readings }: Signal): void {
  if (weights.length !== species.length) {
    throw new InvalidInput(`a signal needs a weight a species: got ${weights.length} for ${species.length}`);
  }
  if (readings.length !== times.length) {
    throw new InvalidInput(`observed must be as many as times: got ${readings.length} for ${times.length}`);
  }
}
