/** Coefficients and their deviations on NIST's certified linear sets. */
import nist from '../../reference/nist-strd-linear.json';
import { fitLinear } from '../../../src/numerics/linearFit';
import { combinationVariance } from '../../../src/numerics/qr';
import { agreeingDigits } from '../../support/compare';

type LinearSet = (typeof nist.cases)[number];

function columnsOf({ degree, intercept, data }: LinearSet): Float64Array[] {
  const { y, ...regressors } = data as unknown as Readonly<Record<string, number[]>>;
  if (degree !== null) {
    return Array.from({ length: degree + 1 }, (_, power) =>
      Float64Array.from(regressors.x, (x) => x ** power),
    );
  }
  const ones = y.map(() => 1);
  return [...(intercept ? [ones] : []), ...Object.values(regressors)].map((column) =>
    Float64Array.from(column),
  );
}

/** Digits to reach where columns are so nearly alike that double precision allows no 13. */
const wanted: Readonly<Record<string, number>> = { Filip: 7, Wampler4: 11 };

test.each(nist.cases)('fitLinear on NIST $name', (set) => {
  const { certified, data } = set;
  const columns = columnsOf(set);
  const fit = fitLinear(columns, Float64Array.from(data.y));
  const digits = certified.parameters.map((b, j) => agreeingDigits(fit.coefficients[j], b));
  const deviation = Math.sqrt(fit.residualSumOfSquares / (data.y.length - columns.length));
  const deviations = certified.standardDeviations.map((s, j) => {
    const unit = columns.map((_, k) => (k === j ? 1 : 0));
    return s === 0 ? 16 : agreeingDigits(deviation * Math.sqrt(combinationVariance(fit.factor, unit)), s);
  });
  expect(Math.min(...digits)).toBeGreaterThan(wanted[set.name] ?? 13);
  expect(Math.min(...deviations)).toBeGreaterThan(set.name === 'Filip' ? 8 : 12);
});
