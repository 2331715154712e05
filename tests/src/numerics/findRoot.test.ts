import { InvalidInput } from '../../../src/errors';
import { findRoot } from '../../../src/numerics/findRoot';
import { valleyNear } from '../../../src/numerics/valley';

// closed roots: OEIS A010503 (√½), A001113 (e), A030178 (Ω, x eˣ = 1), A000796 (π)
test.each<[string, (x: number) => number, number, number, number]>([
  ['2x² = 1', (x) => 2 * x * x - 1, 0, 3, 0.7071067811865476],
  ['ln x = 1', (x) => Math.log(x) - 1, 1, 20, 2.718281828459045],
  ['x eˣ = 1', (x) => x * Math.exp(x) - 1, -1, 5, 0.5671432904097838],
  ['sin x = 0', Math.sin, 2, 4, 3.141592653589793],
  ['(x − 1)³ = 0, flat', (x) => (x - 1) ** 3, -3, 7, 1],
  ['arctan far off', (x) => Math.atan(x - 1e6), -1e9, 1e8, 1e6],
  ['a jump', (x) => (x < 0.3 ? -1 : 1), 0, 1, 0.3],
  ['x⁻⁹ = 10²⁷, steep', (x) => x ** -9 - 1e27, 1e-6, 1, 1e-3],
])('findRoot of %s, either way round', (_, f, low, high, root) => {
  expect(Math.abs(findRoot(f, low, high, 1e-15) - root)).toBeLessThan(
    1e-14 * Math.max(1, root) + (root === 1 ? 1e-5 : 0),
  );
  expect(Math.abs(findRoot(f, high, low, 1e-15) - root)).toBeLessThan(
    1e-14 * Math.max(1, root) + (root === 1 ? 1e-5 : 0),
  );
});

test('findRoot keeps to its tolerance and takes few steps on a smooth function', () => {
  let calls = 0;
  const root = findRoot((x) => (calls++, Math.cos(x) - x), 0, 1, 1e-6);
  expect(Math.abs(root - 0.7390851332151607)).toBeLessThan(1e-6); // OEIS A003957
  expect(calls).toBeLessThan(10);
  // a jump leaves nothing but halving, which comes to rest as soon as it may
  for (const tolerance of [1e-3, 1e-6, 1e-9]) {
    const jump = findRoot((x) => (x < 0.3 ? -1 : 1), 0, 1, tolerance);
    expect(Math.abs(jump - 0.3)).toBeLessThan(tolerance);
  }
});

test('findRoot gives back an end that is a root, and refuses ends of one sign', () => {
  expect(findRoot((x) => x, 0, 4, 1e-12)).toBe(0);
  expect(findRoot((x) => x - 4, 0, 4, 1e-12)).toBe(4);
  const refused = (): number => findRoot((x) => x * x + 1, -1, 1, 1e-12);
  expect(refused).toThrow(InvalidInput);
  expect(refused).toThrow('a root needs a change of sign between its bounds');
});

test('valleyNear finds the lowest place near and far, and nothing where the slope never turns', () => {
  // x² − 2 ln x is lowest at 1, (x − 60)² at 60
  expect(valleyNear((x) => 2 * x - 2 / x, 0.9, 1e-15)).toBeCloseTo(1, 14);
  expect(valleyNear((x) => 2 * (x - 60), 1, 1e-15)).toBeCloseTo(60, 12);
  expect(valleyNear(() => 1, 0, 1e-15)).toBeUndefined();
  expect(valleyNear((x) => -x, 0, 1e-15)).toBeUndefined();
});
