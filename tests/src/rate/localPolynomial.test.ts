import reference from '../../reference/local-polynomial.json';
import { emptyLocalFit, fitLocalPolynomial } from '../../../src/rate/localPolynomial';
import { ratesAlong, tangentRate } from '../../../src/rate/tangent';
import { pairReadings } from '../../../src/series/series';

const runs = reference.data as Record<string, { t: number[]; y: number[] }>;
const largest = (numbers: readonly number[]): number => Math.max(...numbers.map(Math.abs));

/** The reference windows are k neighbours by index, centred on the point and shifted inside at the ends. */
const indexWindow = (i: number, k: number, n: number): number => Math.min(Math.max(i - (k >> 1), 0), n - k);

describe.each(reference.cases)('local polynomial $id', ({ id, dataset, degree, k, slope, se, df }) => {
  const t = Float64Array.from(runs[dataset].t);
  const y = Float64Array.from(runs[dataset].y);
  const isInitial = id.includes('initial');

  test.each(slope.map((_, i) => i))(
    'fitLocalPolynomial: slope and standard error at point %i to 1e-10',
    (i) => {
      const first = isInitial ? 0 : indexWindow(i, k, t.length);
      const fit = fitLocalPolynomial(t, y, first, k, degree, isInitial ? 0 : t[i], emptyLocalFit());
      const error = Math.sqrt((fit.residualSumOfSquares / fit.degreesOfFreedom) * fit.slopeVariance);
      expect(Math.abs(fit.slope - slope[i])).toBeLessThan(1e-10 * largest(slope));
      expect(Math.abs(error / se[i] - 1)).toBeLessThan(1e-10);
      expect(fit.degreesOfFreedom).toBe(df[i]);
    },
  );

  test('fitLocalPolynomial of one degree more meets it on the way', () => {
    slope.forEach((_, i) => {
      const first = isInitial ? 0 : indexWindow(i, k, t.length);
      if (new Set(t.subarray(first, first + k)).size < degree + 2) return; // replicates
      const below = emptyLocalFit();
      fitLocalPolynomial(t, y, first, k, degree + 1, isInitial ? 0 : t[i], emptyLocalFit(), below);
      const error = Math.sqrt((below.residualSumOfSquares / below.degreesOfFreedom) * below.slopeVariance);
      expect(Math.abs(below.slope - slope[i])).toBeLessThan(1e-10 * largest(slope));
      expect(Math.abs(error / se[i] - 1)).toBeLessThan(1e-10);
      expect(below.degreesOfFreedom).toBe(df[i]);
    });
  });
});

test('tangentRate and ratesAlong agree with the reference on an even grid, end windows one-sided', () => {
  const { t, y } = runs.L1;
  const series = pairReadings(t, y);
  const wanted = reference.cases.find(({ id }) => id === 'L1-A_k7_deg3')!;
  const along = ratesAlong(series, { points: 7, degree: 3 });
  t.forEach((time, i) => {
    const rate = tangentRate(series, time, { points: 7, degree: 3 });
    // the column falls, so that the rate of reaction is minus the slope
    expect(rate.value).toBeCloseTo(-wanted.slope[i], 12);
    expect(rate.standardUncertainty! / wanted.se[i]).toBeCloseTo(1, 10);
    expect(along[i]).toEqual(rate);
  });
});
