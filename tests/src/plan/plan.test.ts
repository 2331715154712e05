import { fitRateLaw } from '../../../src/order/fit';
import { planAgainst } from '../../../src/plan/rival';
import { planForCoefficient, varianceOfLogCoefficient, type PlannedRun } from '../../../src/plan/sampling';
import { pairReadings } from '../../../src/series/series';
import { mean, standardDeviation } from '../../support/compare';
import { normal, uniform } from '../../support/random';

const run = (settings: Partial<PlannedRun> = {}): PlannedRun => ({
  order: 1,
  rateCoefficient: 0.05,
  initial: 2,
  noise: 0.02,
  samples: 6,
  ...settings,
});

/** c(t) of order 1 or 2, as tables print it. */
const concentration = ({ order, rateCoefficient: k, initial }: PlannedRun, t: number): number =>
  order === 1 ? initial * Math.exp(-k * t) : initial / (1 + k * initial * t);

test('one reading of a first order with known start belongs at 1/k, where u(k)/k = e σ/c₀', () => {
  // Atkinson, Donev and Tobias (2007), 17.2: exponential decay, locally optimal at t = 1/θ
  const { times, standardUncertainty } = planForCoefficient(run({ samples: 1 }));
  expect(times[0]).toBeCloseTo(20, 6);
  expect(standardUncertainty).toBeCloseTo(0.05 * Math.E * 0.01, 12);
});

test('two readings of a first order with unknown start: 0, and where s = 1 + exp(−2s)', () => {
  // from d/ds (1 + exp 2s)/s² = 0, the variance of k by hand
  const { times } = planForCoefficient(run({ samples: 2 }));
  const s = 0.05 * times[1];
  expect(times[0]).toBe(0);
  expect(s).toBeCloseTo(1 + Math.exp(-2 * s), 6);
});

test.each([0, 0.5, 1, 1.5, 2, 3])('no plan drawn at random beats the one for order %d', (order) => {
  const plan = planForCoefficient(run({ order, rateCoefficient: 1, initial: 1 }));
  const own = varianceOfLogCoefficient(plan.times, order);
  const next = uniform(7);
  const longest = 2 * plan.times[plan.times.length - 1];
  for (let i = 0; i < 3000; i++) {
    const drawn = plan.times.map((time) => (next() < 0.5 ? time * (0.8 + 0.4 * next()) : longest * next()));
    expect(varianceOfLogCoefficient(drawn, order)).toBeGreaterThan(own * (1 - 1e-9));
  }
});

test.each([1, 2])(
  'the uncertainty to expect is the scatter of k over many made-up runs, order %d',
  (order) => {
    const planned = run({ order, samples: 8 });
    const { times, standardUncertainty } = planForCoefficient(planned);
    const deviate = normal(11);
    const found = Array.from({ length: 2000 }, () => {
      const values = times.map((t) => concentration(planned, t) + planned.noise * deviate());
      return fitRateLaw(pairReadings(times, values), { order }).rateCoefficient;
    });
    expect(mean(found) / 0.05).toBeCloseTo(1, 2);
    expect(Math.abs(standardDeviation(found) / standardUncertainty - 1)).toBeLessThan(0.05);
  },
);

test('a plan follows its units: twice k, half the times; half the noise, half the uncertainty', () => {
  const plain = planForCoefficient(run());
  const fast = planForCoefficient(run({ rateCoefficient: 0.1 }));
  plain.times.forEach((time, i) => expect(fast.times[i]).toBeCloseTo(time / 2, 9));
  const quiet = planForCoefficient(run({ noise: 0.01 }));
  expect(quiet.standardUncertainty).toBeCloseTo(plain.standardUncertainty / 2, 12);
});

test.each([0.2, 0.3])('planAgainst: the rival is ruled out as often as promised, noise %d', (noise) => {
  const planned = run({ noise, samples: 9 });
  const { times, power } = planAgainst(planned, 2);
  expect(power).toBeGreaterThan(0.2);
  expect(power).toBeLessThan(0.99);
  const residuals = (values: number[]): Float64Array =>
    fitRateLaw(pairReadings(times, values), { order: 2, endpoint: 0 }).residuals;
  // how the rival misses the true curve; the test asks how much of that is seen in the readings
  const missed = residuals(times.map((t) => concentration(planned, t)));
  const length = Math.hypot(...missed);
  const deviate = normal(13);
  let ruledOut = 0;
  for (let i = 0; i < 2000; i++) {
    const seen = residuals(times.map((t) => concentration(planned, t) + noise * deviate()));
    const z = seen.reduce((sum, r, j) => sum + (r * missed[j]) / length, 0) / noise;
    if (Math.abs(z) > 1.96) ruledOut++;
  }
  expect(Math.abs(ruledOut / 2000 - power)).toBeLessThan(0.04);
});

test('planAgainst: no plan drawn at random keeps the rival further away', () => {
  const planned = run({ samples: 6 });
  const { times, separation } = planAgainst(planned, 2);
  const next = uniform(17);
  const longest = Math.max(...times);
  for (let i = 0; i < 500; i++) {
    const drawn = [
      0,
      ...times.slice(1).map((t) => (next() < 0.5 ? t * (0.7 + 0.6 * next()) : longest * next())),
    ];
    const series = pairReadings(
      drawn,
      drawn.map((t) => concentration(planned, t)),
    );
    const { residualSumOfSquares } = fitRateLaw(series, { order: 2, endpoint: 0 });
    expect(Math.sqrt(residualSumOfSquares) / planned.noise).toBeLessThan(separation * 1.01);
  }
});

test('what a plan refuses, in words', () => {
  expect(() => planForCoefficient(run({ samples: 0 }))).toThrow(
    'samples must be a whole number from 1 to 200: got 0',
  );
  expect(() => planForCoefficient(run({ noise: 0 }))).toThrow('noise must be above 0: got 0');
  expect(() => planAgainst(run(), 1)).toThrow('goal must be another order than 1 to tell it from');
  expect(() => planAgainst(run({ samples: 2 }), 2)).toThrow(
    'to tell two orders apart takes 3 readings or more: got 2',
  );
});
