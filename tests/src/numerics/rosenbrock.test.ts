/** The Rosenbrock step keeps the orders that its paper promises, on a nonlinear system with a known course. */
import { newBlocks, RosenbrockStep } from '../../../src/numerics/rosenbrockStep';
import { couplings, densities, gamma, positions } from '../../../src/numerics/rodas5p';
import { MassAction } from '../../../src/scheme/massAction';
import { parseScheme } from '../../../src/scheme/parse';

/** Autocatalysis A + B → 2 B with k = 1 from 0.8 and 0.2: B = 0.2 eᵗ/(0.8 + 0.2 eᵗ). */
const system = new MassAction(parseScheme('A + B -> 2 B'), Float64Array.of(1), 1e-14);
const catalyst = (t: number): number => (0.2 * Math.exp(t)) / (0.8 + 0.2 * Math.exp(t));

/** ∂B/∂ln k at k = 1 is t dB/dt. */
const catalystSlope = (t: number): number => t * catalyst(t) * (1 - catalyst(t));

/** Errors at t = 1 after equal steps: of the end, of its sensitivity, of the middle of steps, of the estimate. */
function errorsAt(steps: number): { end: number; slope: number; between: number; estimate: number } {
  const method = new RosenbrockStep(system, [0]);
  const here = newBlocks(2, 2);
  here[0].set([0.8, 0.2]);
  const out = new Float64Array(2);
  const h = 1 / steps;
  let between = 0;
  for (let i = 0; i < steps; i++) {
    method.leave(here);
    expect(method.attempt(here, h)).toBe(true);
    method.between(here, 0.5, 0, out);
    between = Math.max(between, Math.abs(out[1] - catalyst((i + 0.5) * h)));
    here.forEach((block, b) => block.set(method.next[b]));
  }
  return {
    end: Math.abs(here[0][1] - catalyst(1)),
    slope: Math.abs(here[1][1] - catalystSlope(1)),
    between,
    estimate: Math.abs(method.error[0][1]),
  };
}

test.each([
  ['end', 5],
  ['slope', 5],
  ['between', 4],
  ['estimate', 5], // the error of one step of a method of order 4
] as const)('the error of the %s falls with order %d', (part, order) => {
  const observed = Math.log2(errorsAt(8)[part] / errorsAt(16)[part]);
  expect(observed).toBeGreaterThan(order - 0.4);
});

test('the ends of dense output are the ends of the step', () => {
  const method = new RosenbrockStep(system, []);
  const here = newBlocks(2, 1);
  here[0].set([0.8, 0.2]);
  method.leave(here);
  method.attempt(here, 0.3);
  const out = new Float64Array(2);
  method.between(here, 0, 0, out);
  expect([...out]).toEqual([0.8, 0.2]);
  method.between(here, 1, 0, out);
  expect([...out]).toEqual([...method.next[0]]);
});

test('it is L-stable: a fast decay is damped out in one long step, not carried on', () => {
  const decay = new MassAction(parseScheme('A ->'), Float64Array.of(1e9), 1e-14);
  const method = new RosenbrockStep(decay, []);
  const here = newBlocks(1, 1);
  here[0][0] = 1;
  method.leave(here);
  method.attempt(here, 1);
  expect(Math.abs(method.next[0][0])).toBeLessThan(1e-7);
});

test('what a mechanism conserves, a step conserves', () => {
  const scheme = parseScheme('A + B <-> C; C -> 2 D');
  const method = new RosenbrockStep(new MassAction(scheme, Float64Array.of(1e4, 3, 7), 1e-14), []);
  const here = newBlocks(4, 1);
  here[0].set([1, 0.5, 0.1, 0]);
  method.leave(here);
  method.attempt(here, 1e-4);
  const [a, b, c, d] = method.next[0];
  expect(Math.abs(a + c + d / 2 - 1.1)).toBeLessThan(1e-14);
  expect(Math.abs(a - b - 0.5)).toBeLessThan(1e-14);
});

test('the table of coefficients is whole', () => {
  expect(positions.map((row) => row.length)).toEqual([0, 1, 2, 3, 4, 5, 6, 7]);
  expect(couplings.map((row) => row.length)).toEqual([0, 1, 2, 3, 4, 5, 6, 7]);
  expect(densities.map((row) => row.length)).toEqual([8, 8, 8]);
  expect(positions[1][0] * gamma).toBeCloseTo(0.6358126895828704, 15); // α₂, where the second stage looks
});
