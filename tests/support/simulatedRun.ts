/**
 * Runs made up from the integrated rate laws as tables print them, one formula an order, with noise on
 * top: a second way to the same law, so that the code under test does not judge itself.
 */
import { normal } from './random';

/** c(t) for c₀ = 1 and k = 1. P. Atkins, J. de Paula, J. Keeler, Physical Chemistry, 12th ed., table 17B.3. */
const concentrationAt: Readonly<Record<number, (t: number) => number>> = {
  0: (t) => Math.max(0, 1 - t),
  0.5: (t) => Math.max(0, 1 - t / 2) ** 2,
  1: (t) => Math.exp(-t),
  1.5: (t) => 1 / (1 + t / 2) ** 2,
  2: (t) => 1 / (1 + t),
  3: (t) => 1 / Math.sqrt(1 + 2 * t),
};

/** The time at which a share is left, from the same table. */
const timeTo: Readonly<Record<number, (share: number) => number>> = {
  0: (share) => 1 - share,
  0.5: (share) => 2 * (1 - Math.sqrt(share)),
  1: (share) => -Math.log(share),
  1.5: (share) => 2 * (1 / Math.sqrt(share) - 1),
  2: (share) => 1 / share - 1,
  3: (share) => (1 / share ** 2 - 1) / 2,
};

export interface Simulation {
  readonly order: number;
  readonly halfLives: number;
  readonly readings: number;
  /** Standard deviation of the noise, as a share of c₀. */
  readonly noise: number;
  readonly seed: number;
  readonly endpoint?: number;
}

/** Evenly spaced readings from the start until so many half lives have passed; c₀ = 1 above the endpoint, k = 1. */
export function simulatedRun({ order, halfLives, readings, noise, seed, endpoint = 0 }: Simulation): {
  times: number[];
  values: number[];
} {
  const deviate = normal(seed);
  const end = timeTo[order](2 ** -halfLives);
  const times = Array.from({ length: readings }, (_, i) => (end * i) / (readings - 1));
  return { times, values: times.map((t) => endpoint + concentrationAt[order](t) + noise * deviate()) };
}
