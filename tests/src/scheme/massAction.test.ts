/** The analytic derivatives of mass action are those of the rates themselves, by differences. */
import { MassAction } from '../../../src/scheme/massAction';
import { parseScheme } from '../../../src/scheme/parse';

/** Whole and broken orders, a catalyst, an inflow, a reactant on both sides. */
const scheme = parseScheme('0.5 A + 1.5 B <-> C; 3 B + E -> C + E; -> A; C + 2 A -> 3 A; 2.5 C -> D');
const state = Float64Array.of(0.7, 1.3, 0.4, 0.9, 0.2);
const rates = Float64Array.of(0.3, 1.1, 0.7, 0.05, 2, 0.9);
const system = new MassAction(scheme, rates, 1e-14);
const size = scheme.species.length;

const h = 1e-4;

/** Derivative of f along a direction at the state, to about ten digits. */
function along(f: (state: Float64Array) => Float64Array, direction: ArrayLike<number>): Float64Array {
  const at = (share: number) => f(state.map((c, i) => c + share * h * direction[i]));
  const [up, down, farUp, farDown] = [at(1), at(-1), at(2), at(-2)];
  return up.map((_, i) => (8 * (up[i] - down[i]) - (farUp[i] - farDown[i])) / (12 * h));
}

function written(write: (out: Float64Array) => void, length = size): Float64Array {
  const out = new Float64Array(length);
  write(out);
  return out;
}

const expectClose = (got: Float64Array, wanted: Float64Array): void =>
  wanted.forEach((value, i) => expect(Math.abs(got[i] - value)).toBeLessThan(1e-9 * (1 + Math.abs(value))));

test('the derivative is net number times rate, summed: by hand', () => {
  const [a, b, c, , e] = ['A', 'B', 'C', 'D', 'E'].map((name) => state[scheme.species.indexOf(name)]);
  const v = [0.3 * a ** 0.5 * b ** 1.5, 1.1 * c, 0.7 * b ** 3 * e, 0.05, 2 * c * a ** 2, 0.9 * c ** 2.5];
  const byName: Record<string, number> = {
    A: -0.5 * v[0] + 0.5 * v[1] + v[3] + v[4],
    B: -1.5 * v[0] + 1.5 * v[1] - 3 * v[2],
    C: v[0] - v[1] + v[2] - v[4] - 2.5 * v[5],
    D: v[5],
    E: 0,
  };
  expectClose(
    written((out) => system.derivative(state, out)),
    Float64Array.from(scheme.species, (name) => byName[name]),
  );
});

test('jacobian', () => {
  const jacobian = written((out) => system.jacobian(state, out), size * size);
  for (let j = 0; j < size; j++) {
    const unit = Array.from({ length: size }, (_, i) => (i === j ? 1 : 0));
    const column = along((c) => written((out) => system.derivative(c, out)), unit);
    expectClose(
      Float64Array.from({ length: size }, (_, i) => jacobian[i * size + j]),
      column,
    );
  }
});

const sensitivity = Float64Array.of(0.3, -0.2, 0.5, 0.1, -0.4);
const direction = Float64Array.of(-0.6, 0.8, 0.2, 0.5, 0.3);

test.each([0, 1, 2, 3, 4, 5])('sensitivities of coefficient %d: slope and curvature', (parameter) => {
  const slopeAt = (c: Float64Array) =>
    written((out) => system.sensitivitySlope(c, sensitivity, parameter, out));
  const byState = along((c) => written((out) => system.derivative(c, out)), sensitivity);
  const byCoefficient = (shift: number) => {
    const moved = rates.map((k, i) => (i === parameter ? k * Math.exp(shift) : k));
    return written((out) => new MassAction(scheme, moved, 1e-14).derivative(state, out));
  };
  const [up, down, farUp, farDown] = [h, -h, 2 * h, -2 * h].map(byCoefficient);
  const total = byState.map(
    (slope, i) => slope + (8 * (up[i] - down[i]) - (farUp[i] - farDown[i])) / (12 * h),
  );
  expectClose(slopeAt(state), total);
  const curvature = written((out) =>
    system.addSensitivityCurvature(state, sensitivity, parameter, direction, out),
  );
  expectClose(curvature, along(slopeAt, direction));
});

test('a spent species, or one a little below 0, gives finite rates and slopes at every order', () => {
  for (const nothing of [0, -1e-18]) {
    const spent = new Float64Array(size).fill(nothing);
    const all = [
      ...written((out) => system.derivative(spent, out)),
      ...written((out) => system.jacobian(spent, out), size * size),
      ...written((out) => system.addSensitivityCurvature(spent, sensitivity, 0, direction, out)),
    ];
    expect(all.every(Number.isFinite)).toBe(true);
  }
});
