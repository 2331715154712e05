import { heightAt } from '../../../src/order/curve';
import { fitRateLaw } from '../../../src/order/fit';
import { surveyRun } from '../../../src/order/survey';
import { pairReadings } from '../../../src/series/series';
import { simulatedRun } from '../../support/simulatedRun';

const seriesOf = (settings: Partial<Parameters<typeof simulatedRun>[0]>) => {
  const { times, values } = simulatedRun({
    order: 1,
    halfLives: 3,
    readings: 20,
    noise: 0.005,
    seed: 7,
    ...settings,
  });
  return pairReadings(times, values);
};

test('surveyRun of a good run raises no flag, and finds what the run was made with', () => {
  const { fit, initialRate, flags } = surveyRun(seriesOf({}), { order: 1 });
  expect(flags).toEqual([]);
  expect(Math.abs(fit!.rateCoefficient - 1)).toBeLessThan(4 * fit!.standardUncertainties.rateCoefficient!);
  expect(Math.abs(initialRate! - 1)).toBeLessThan(0.15);
});

test('surveyRun says what should be looked at', () => {
  expect(surveyRun(seriesOf({ halfLives: 0.8 }), { order: 1 }).flags).toContain(
    'only 0.8 half lives followed',
  );
  expect(surveyRun(seriesOf({ order: 2 }), { order: 0 }).flags).toContain('residuals run in a pattern');
  const { times, values } = simulatedRun({ order: 1, halfLives: 3, readings: 20, noise: 0.002, seed: 8 });
  values[11] += 0.1;
  const { flags } = surveyRun(pairReadings(times, values), { order: 1 });
  expect(flags.some((flag) => /^reading 12 lies \d+ standard deviations off$/.test(flag))).toBe(true);
});

test('surveyRun of a run that cannot be fitted says why and does not throw', () => {
  const { fit, flags } = surveyRun(pairReadings([0, 1, 2, 3], [1, 2, 3, 4]), { order: 1 });
  expect(fit).toBeNull();
  expect(flags).toEqual(['not fitted: a rising column needs its end: give endpoint a number or "free"']);
});

test('heightAt follows the law to the readings and beyond, and not before the first', () => {
  const series = pairReadings([10, 20, 30, 40], [8, 4, 2, 1]);
  const fit = fitRateLaw(series, { order: 1 });
  expect(heightAt(fit, series, 10)).toBeCloseTo(8, 10);
  expect(heightAt(fit, series, 25)).toBeCloseTo(2 * Math.SQRT2, 10);
  expect(heightAt(fit, series, 60)).toBeCloseTo(0.25, 10);
  expect(() => heightAt(fit, series, 9)).toThrow(
    'the law holds from the first reading on, at 10: 9 is earlier',
  );
});
