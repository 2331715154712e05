/** Runs of mechanisms as tests make them up: blocks of readings, and one scheme with a closed form. */
import { followed, type Experiment } from '../../src/scheme/experiment';
import { fitMechanism, type MechanismFit } from '../../src/scheme/fitMechanism';
import { parseScheme } from '../../src/scheme/parse';
import { normal } from './random';

/** A run as a block of readings, a column a species. */
export function blockRun(
  text: string,
  initial: number[],
  times: number[],
  observed: (number | null)[][],
): Experiment {
  const scheme = parseScheme(text);
  const signals = scheme.species.map((name, j) =>
    followed(
      scheme,
      name,
      observed.map((row) => row[j]),
    ),
  );
  return { initial, times, signals };
}

export const times = [0, 2, 4, 7, 11, 16, 24, 36, 55, 80];

/** Closed form of A → B → C from 1, its columns with noise. */
export function consecutive(k1: number, k2: number, noise: number, seed = 1): (number | null)[][] {
  const scatter = normal(seed);
  return times.map((t) => {
    const a = Math.exp(-k1 * t);
    const b = (k1 / (k2 - k1)) * (a - Math.exp(-k2 * t));
    return [a, b, 1 - a - b].map((value) => value + noise * scatter());
  });
}

export const fitConsecutive = (observed: (number | null)[][], start: number[]): MechanismFit =>
  fitMechanism({
    scheme: parseScheme('A -> B -> C'),
    start,
    experiments: [blockRun('A -> B -> C', [1, 0, 0], times, observed)],
  });

/** Only some of the columns. */
export const seen = (rows: (number | null)[][], columns: number[]): (number | null)[][] =>
  rows.map((row) => row.map((value, j) => (columns.includes(j) ? value : null)));
