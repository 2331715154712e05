/** What readings can tell of each coefficient: its uncertainty, what it moves with, or why they cannot tell. */
import { combinationVariance, factorQr, type QrFactor } from '../numerics/qr';
import { reactionInWords, type Scheme } from './scheme';

/** Below this share of the readings' length a coefficient leaves no trace that an integration can vouch for. */
const leastTrace = 1e-6;

/** Below this share of its own length a trace is made up of the others'. */
const leastOwnShare = 1e-5;

/** Beyond this u(ln k), a standard uncertainty as large as the value, readings do not tell a coefficient. */
const widest = 1;

/** Beyond this correlation it is the other coefficient that is to blame. */
const entangled = 0.99;

export interface Determination {
  /** u(ln k); `null` where it cannot be told, or there is no scatter to judge by. */
  readonly logUncertainty: number | null;
  /** Why the readings cannot tell this coefficient, or nothing. */
  readonly why: string;
}

export interface Determinations {
  /** One a coefficient that was searched. */
  readonly of: readonly Determination[];
  /** Correlation of ln k between any two; 0 with one that cannot be told. */
  readonly correlations: readonly (readonly number[])[];
  /** Those that can be told apart from each other, among what was searched. */
  readonly kept: readonly number[];
  /** u of g·ln k, in units of the readings' deviation. */
  readonly lengthOf: (slopes: ArrayLike<number>) => number;
}

/**
 * @param columns derivative of every reading with ln k, one a coefficient that was searched
 * @param searched their places in the scheme
 * @param size length of all readings, √Σy²
 * @param deviation residual deviation where so many are fitted; `null` where none is left
 * @example determine(parseScheme('A -> B'), [Float64Array.of(3, 4)], [0], 10, () => 0.1).of[0].logUncertainty // 0.02
 */
export function determine(
  scheme: Scheme,
  columns: readonly Float64Array[],
  searched: readonly number[],
  size: number,
  deviation: (rank: number) => number | null,
): Determinations {
  const why = columns.map(() => '');
  const name = (j: number): string => reactionInWords(scheme, searched[j]);
  let kept = columns
    .map((_, j) => j)
    .filter((j) => {
      if (lengthOf(columns[j]) > leastTrace * size) return true;
      why[j] = `${name(j)} cannot be told: the readings hardly depend on it`;
      return false;
    });
  let factor = factored(columns, kept);
  for (;;) {
    const shares = kept.map((j, i) => ownLength(factor, i) / lengthOf(columns[j]));
    const least = shares.reduce((best, share, i) => (share < shares[best] ? i : best), 0);
    if (!(shares[least] < leastOwnShare)) break;
    kept.forEach((j, i) => {
      if (!(shares[i] < leastOwnShare) || why[j] !== '') return;
      const other = kept.filter((_, o) => o !== i && shares[o] < leastOwnShare).map(name);
      why[j] =
        `${name(j)} cannot be told apart from ${other.join(' and ') || 'the others'}: only a combination of them shows`;
    });
    kept = kept.filter((_, i) => i !== least);
    factor = factored(columns, kept);
  }
  const scatter = deviation(kept.length);
  const correlations = correlationsOf(factor, kept, why);
  const of = columns.map((_, j): Determination => {
    if (why[j] !== '') return { logUncertainty: null, why: why[j] };
    if (scatter === null) return { logUncertainty: null, why: '' };
    const logUncertainty = scatter / ownLength(factor, kept.indexOf(j));
    if (logUncertainty <= widest) return { logUncertainty, why: '' };
    const others = columns.flatMap((_column, other) =>
      other !== j && Math.abs(correlations[j][other]) > entangled ? [name(other)] : [],
    );
    return {
      logUncertainty: null,
      why: `${name(j)} cannot be told in this scatter: its standard uncertainty is above 100 %${others.length > 0 ? `, since ${others.join(' and ')} can make up for it` : ''}`,
    };
  });
  const gradient = (slopes: ArrayLike<number>): number[] => kept.map((j) => slopes[j]);
  return {
    of,
    correlations,
    kept,
    lengthOf: (slopes) => Math.sqrt(combinationVariance(factor, gradient(slopes))),
  };
}

function factored(columns: readonly Float64Array[], kept: readonly number[]): QrFactor {
  const rows = columns[0]?.length ?? 0;
  const design = new Float64Array(rows * kept.length);
  kept.forEach((j, i) => design.set(columns[j], i * rows));
  return factorQr(design, rows, kept.length);
}

/** Length of what a column has of its own, once the others have taken what they can. */
function ownLength(factor: QrFactor, i: number): number {
  const unit = Array.from({ length: factor.columns }, (_, j) => (j === i ? 1 : 0));
  const variance = combinationVariance(factor, unit);
  return variance > 0 && Number.isFinite(variance) ? 1 / Math.sqrt(variance) : 0;
}

function correlationsOf(factor: QrFactor, kept: readonly number[], why: readonly string[]): number[][] {
  const variance = (slopes: Readonly<Record<number, number>>): number =>
    combinationVariance(
      factor,
      kept.map((_, i) => slopes[i] ?? 0),
    );
  return why.map((_, one) =>
    why.map((_, other) => {
      const [i, j] = [kept.indexOf(one), kept.indexOf(other)];
      if (one === other) return 1;
      if (i === -1 || j === -1) return 0;
      const covariance = (variance({ [i]: 1, [j]: 1 }) - variance({ [i]: 1, [j]: -1 })) / 4;
      return covariance / Math.sqrt(variance({ [i]: 1 }) * variance({ [j]: 1 }));
    }),
  );
}

function lengthOf(column: Float64Array): number {
  return Math.sqrt(column.reduce((sum, x) => sum + x * x, 0));
}
