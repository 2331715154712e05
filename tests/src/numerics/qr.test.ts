/**
 * The factor on NIST's certified linear sets. Coefficients are not the module's own business; they are had
 * from the triangle of the design with the readings as its last column, whose last entry is the residual.
 */
import nist from '../../reference/nist-strd-linear.json';
import { combinationVariance, factorQr, type QrFactor } from '../../../src/numerics/qr';
import { agreeingDigits } from '../../support/compare';

interface LinearSet {
  readonly name: string;
  readonly degree: number | null;
  readonly intercept: boolean;
  readonly data: Readonly<Record<string, number[]>>;
  readonly certified: {
    readonly parameters: number[];
    readonly standardDeviations: number[];
    readonly residualStandardDeviation: number;
  };
}

function columnsOf({ degree, intercept, data }: LinearSet): number[][] {
  const { y, ...regressors } = data;
  const ones = y.map(() => 1);
  if (degree !== null)
    return Array.from({ length: degree + 1 }, (_, power) => regressors.x.map((x) => x ** power));
  return [...(intercept ? [ones] : []), ...Object.values(regressors)];
}

const factored = (columns: readonly number[][]): QrFactor =>
  factorQr(Float64Array.from(columns.flat()), columns[0].length, columns.length);

function solved({ r, scales, columns }: QrFactor): { coefficients: number[]; residual: number } {
  const last = columns - 1;
  const coefficients = new Array<number>(last);
  for (let row = last - 1; row >= 0; row--) {
    let sum = r[row * columns + last];
    for (let k = row + 1; k < last; k++) sum -= r[row * columns + k] * coefficients[k];
    coefficients[row] = sum / r[row * columns + row];
  }
  return {
    coefficients: coefficients.map((x, k) => (x * scales[last]) / scales[k]),
    residual: Math.abs(r[last * columns + last]) * scales[last],
  };
}

const leastDigits = (got: readonly number[], certified: readonly number[]): number =>
  Math.min(...got.map((x, i) => agreeingDigits(x, certified[i])));

// double precision leaves 16 − log₁₀(condition number) digits or so; Wampler4's coefficients are 1 ± 200000
test.each([
  ['Norris', 12, 13],
  ['NoInt1', 14, 14],
  ['Longley', 10, 12],
  ['Wampler4', 7, 13],
  ['Filip', 7, 7],
])(
  'factorQr on NIST %s: %d digits of the coefficients, %d of their standard deviations',
  (name, digits, deviationDigits) => {
    const set = (nist.cases as unknown as LinearSet[]).find((c) => c.name === name)!;
    const columns = columnsOf(set);
    const { coefficients, residual } = solved(factored([...columns, set.data.y]));
    const { certified } = set;
    expect(leastDigits(coefficients, certified.parameters)).toBeGreaterThan(digits);

    const deviation = residual / Math.sqrt(set.data.y.length - columns.length);
    expect(agreeingDigits(deviation, certified.residualStandardDeviation)).toBeGreaterThan(deviationDigits);
    const factor = factored(columns);
    expect(factor.isDeficient).toBe(false);
    const deviations = columns.map(
      (_, k) => deviation * Math.sqrt(combinationVariance(factor, unit(k, columns.length))),
    );
    expect(leastDigits(deviations, certified.standardDeviations)).toBeGreaterThan(deviationDigits);
  },
);

test.each([
  ['Wampler1', 9],
  ['Wampler2', 12],
])('factorQr on NIST %s, an exact fit: %d digits of the coefficients', (name, digits) => {
  const set = (nist.cases as unknown as LinearSet[]).find((c) => c.name === name)!;
  const { coefficients } = solved(factored([...columnsOf(set), set.data.y]));
  expect(leastDigits(coefficients, set.certified.parameters)).toBeGreaterThan(digits);
});

const unit = (place: number, length: number): number[] =>
  Array.from({ length }, (_, i) => (i === place ? 1 : 0));

test('combinationVariance: the height of a straight line at x has variance 1/n + (x − x̄)²/S', () => {
  // N. R. Draper and H. Smith, Applied Regression Analysis, 3rd ed. (1998), 3.1
  const x = [2, 3, 5, 9, 11];
  const factor = factored([x.map(() => 1), x]);
  for (const at of [-4, 0, 6, 20])
    expect(combinationVariance(factor, [1, at])).toBeCloseTo(1 / 5 + (at - 6) ** 2 / 60, 13);
});

test('factorQr: a column that repeats another, or too few rows, is deficient', () => {
  expect(
    factored([
      [1, 1, 1],
      [1, 2, 3],
      [2, 3, 4],
    ]).isDeficient,
  ).toBe(true);
  expect(
    factored([
      [1, 1],
      [1, 2],
      [1, 4],
    ]).isDeficient,
  ).toBe(true);
  expect(
    factored([
      [1, 1, 1],
      [1, 2, 3],
      [1, 4, 9],
    ]).isDeficient,
  ).toBe(false);
  expect(
    factored([
      [1, 1],
      [0, 0],
    ]).isDeficient,
  ).toBe(true);
});

test('factorQr: a quarter of a million rows, and entries near the ends of the number range', () => {
  const rows = 2 ** 18;
  const design = new Float64Array(2 * rows).fill(1, 0, rows);
  for (let i = rows; i < 2 * rows; i += 2) design[i] = 1;
  const long = factorQr(design, rows, 2);
  expect(combinationVariance(long, [1, 0]) * rows).toBeCloseTo(2, 9);
  const huge = factored([
    [1e200, 1e200, 1e200],
    [0, 1e-200, 2e-200],
  ]);
  expect(combinationVariance(huge, [0, 1e-200])).toBeCloseTo(0.5, 13);
});
