/** What readings cannot tell of a mechanism is said, coefficient by coefficient. */
import { coefficientEstimate } from '../../../src/scheme/coefficientLimits';
import { courseOf } from '../../../src/scheme/course';
import { fitMechanism } from '../../../src/scheme/fitMechanism';
import { parseScheme } from '../../../src/scheme/parse';
import { relative } from '../../support/compare';
import { blockRun, consecutive, fitConsecutive, seen, times } from '../../support/mechanismRuns';
import { normal } from '../../support/random';

test('a later step that was not looked at', () => {
  const { coefficients } = fitConsecutive(seen(consecutive(0.12, 0.035, 0.01), [0]), [0.1, 0.1]);
  expect(coefficients[0].why).toBe('');
  expect(relative(coefficients[0].value, 0.12)).toBeLessThan(0.1);
  expect(coefficients[1].why).toBe('coefficient 2 (B -> C) cannot be told: the readings hardly depend on it');
  expect(coefficients[1].standardUncertainty).toBeNull();
});

test('two ways for one reactant to go, of which only it was followed: nothing but their sum', () => {
  const scheme = parseScheme('A -> B; A -> C');
  const observed = times.map((t) => [Math.exp(-0.1 * t), null, null]);
  const experiments = [blockRun('A -> B; A -> C', [1, 0, 0], times, observed)];
  const { coefficients } = fitMechanism({ scheme, start: [0.2, 0.02], experiments });
  expect(coefficients.map(({ why }) => why)).toEqual([
    'coefficient 1 (A -> B) cannot be told apart from coefficient 2 (A -> C): only a combination of them shows',
    'coefficient 2 (A -> C) cannot be told apart from coefficient 1 (A -> B): only a combination of them shows',
  ]);
  expect(relative(coefficients[0].value + coefficients[1].value, 0.1)).toBeLessThan(1e-8);
});

test('an equilibrium too fast to be seen, while the step behind it is told', () => {
  const scheme = parseScheme('A <-> B; B -> C');
  const scatter = normal(4);
  const observed = courseOf(scheme, [300, 200, 0.05], [1, 0, 0], times).map((row) =>
    [...row].map((value) => value + 0.01 * scatter()),
  );
  const experiments = [blockRun('A <-> B; B -> C', [1, 0, 0], times, observed)];
  const fit = fitMechanism({ scheme, start: [100, 100, 0.1], experiments });
  expect(fit.coefficients[0].why).toMatch(/^coefficient 1 \(A -> B\) cannot be told/);
  expect(fit.coefficients[1].why).toMatch(/^coefficient 2 \(B -> A\) cannot be told/);
  const { value, lower, upper } = coefficientEstimate(fit, 2);
  expect(Math.abs(value - 0.05)).toBeLessThan(3 * fit.coefficients[2].standardUncertainty!);
  expect(lower).toBeLessThan(0.05);
  expect(upper).toBeGreaterThan(0.05);
  expect(() => coefficientEstimate(fit, 0)).toThrow('cannot be told');
  expect(relative(fit.coefficients[0].value / fit.coefficients[1].value, 1.5)).toBeLessThan(0.1);
});

test('an equilibrium almost too fast: a value, a lower limit, and no upper one', () => {
  const scheme = parseScheme('A <-> B; B -> C');
  const scatter = normal(6);
  const observed = courseOf(scheme, [300, 200, 0.05], [1, 0, 0], times).map((row) =>
    [...row].map((value) => value + 0.01 * scatter()),
  );
  const experiments = [blockRun('A <-> B; B -> C', [1, 0, 0], times, observed)];
  const { lower, upper } = coefficientEstimate(fitMechanism({ scheme, start: [1, 1, 1], experiments }), 0);
  expect(lower).toBeLessThan(300);
  expect(upper).toBeNull();
});

test('as many readings as coefficients leave no uncertainty', () => {
  const experiments = [blockRun('A ->', [8], [0, 10], [[null], [4]])];
  const fit = fitMechanism({ scheme: parseScheme('A ->'), start: [1], experiments });
  expect(relative(fit.coefficients[0].value, Math.LN2 / 10)).toBeLessThan(1e-8);
  expect(coefficientEstimate(fit, 0)).toMatchObject({ standardUncertainty: null, degreesOfFreedom: 0 });
});
