/** Courses against 34-digit solutions of stiff mechanisms and against closed forms, and how they stop. */
import reference from '../../reference/courses.json';
import { courseOf, trajectoryOf } from '../../../src/scheme/course';
import { parseScheme } from '../../../src/scheme/parse';
import { agreeingDigits } from '../../support/compare';

const named = (id: string) => reference.cases.find((c) => c.id === id)!;

/** The fewest agreeing digits of all species at all times; `column` tells where each stands. */
function fewestDigits(got: readonly Float64Array[], wanted: number[][], column = (j: number) => j): number {
  return Math.min(
    ...wanted.flatMap((row, i) => row.map((value, j) => agreeingDigits(got[i][column(j)], value))),
  );
}

test('courseOf Robertson’s mechanism to t = 1e11: 7.5 digits of every species, the trace included', () => {
  const { initial, times, states } = named('rober');
  const scheme = parseScheme('A -> B; 2 B -> B + C; B + C -> A + C');
  const course = courseOf(scheme, [0.04, 3e7, 1e4], initial, times);
  expect(fewestDigits(course, states)).toBeGreaterThan(7.5);
  for (const row of course) expect(Math.abs(row[0] + row[1] + row[2] - 1)).toBeLessThan(1e-13);
});

test('courseOf the Oregonator through a whole cycle: 8.5 digits', () => {
  const { initial, times, states } = named('orego');
  // y₂ counted in units in which one X and one Y meet: Y = q² y₂
  const q = 77.27;
  const scheme = parseScheme(`X + Y ->; Y -> X; X -> 2 X; 2 X -> X; X -> X + Z; Z -> ${q / 0.161} Y`);
  const start = [initial[0], initial[1] * q * q, initial[2]];
  const wanted = states.map(([x, y, z]) => [x, y * q * q, z]);
  const course = courseOf(scheme, [1 / q, 1 / q, q, q * 8.375e-6, 0.161, 0.161], start, times);
  expect(fewestDigits(course, wanted)).toBeGreaterThan(8.5);
});

test('courseOf the high irradiance response, eight species: 9.5 digits', () => {
  const { times, states } = named('hires');
  const scheme = parseScheme(
    'A <-> B; B -> D; C -> A; C <-> D; D -> F; E -> C; E <-> F; F + H -> G; G -> E + H; G -> F + H; G -> H; -> A',
  );
  const letters = [...'ABCDEFGH'].map((letter) => scheme.species.indexOf(letter));
  const start = new Float64Array(8);
  start[letters[0]] = 1;
  start[letters[7]] = 0.0057;
  const rates = [1.71, 0.43, 8.32, 8.32, 1.71, 0.43, 0.69, 0.035, 1.71, 0.43, 280, 0.43, 0.69, 0.69, 7e-4];
  expect(fewestDigits(courseOf(scheme, rates, start, times), states, (j) => letters[j])).toBeGreaterThan(9.5);
});

/** The smog mechanism as text: a reaction a line, products from the signed sums of its right-hand side. */
function smogScheme(): string {
  const { reactants, rightHandSide } = named('pollu');
  return reactants!
    .map((left, r) => {
      const right = new Map<string, number>();
      const add = (name: string, number: number) => right.set(name, (right.get(name) ?? 0) + number);
      for (const species of left) add(`y${species}`, 1);
      for (const [name, signs] of Object.entries(rightHandSide!)) {
        for (const sign of signs.split(' ').map(Number)) {
          if (Math.abs(sign) === r + 1) add(name, Math.sign(sign));
        }
      }
      const products = [...right].filter(([, number]) => number > 0).map(([name, n]) => `${n} ${name}`);
      return `${left.map((species) => `y${species}`).join(' + ')} -> ${products.join(' + ')}`;
    })
    .join('\n');
}

test('courseOf a smog mechanism of 20 species and 25 reactions: 9.5 digits of all, one of them at 3e-18', () => {
  const { coefficients, initial, times, states } = named('pollu');
  const scheme = parseScheme(smogScheme());
  const place = initial.map((_, i) => scheme.species.indexOf(`y${i + 1}`));
  const start = Float64Array.from(scheme.species, (name) => initial[Number(name.slice(1)) - 1]);
  expect(scheme.species).toHaveLength(20);
  expect(
    fewestDigits(courseOf(scheme, coefficients!, start, times), states, (j) => place[j]),
  ).toBeGreaterThan(9.5);
});

test.each([
  ['consecutive', 9.5],
  ['consecutive-equal', 9.5],
  ['reversible', 9.5],
  ['autocatalysis', 8],
  ['parallel', 9.5],
  ['order-three-halves', 9.5],
])('courseOf %s meets its closed form to %d digits', (id, digits) => {
  const { scheme, coefficients, initial, times, states } = named(id);
  expect(fewestDigits(courseOf(parseScheme(scheme!), coefficients!, initial, times), states)).toBeGreaterThan(
    digits,
  );
});

test('courseOf order ½ reaches 0 in finite time and stays there', () => {
  const { scheme, coefficients, initial, times, states } = named('order-half');
  const course = courseOf(parseScheme(scheme!), coefficients!, initial, times);
  states.forEach(([wanted], i) => expect(Math.abs(course[i][0] - wanted)).toBeLessThan(1e-8 * initial[0]));
  expect(course.every(([a]) => a >= 0)).toBe(true);
});

test('times stand in any order and may repeat; the answer is the same', () => {
  const scheme = parseScheme('A + B <-> C');
  const course = courseOf(scheme, [2, 0.3], [1, 0.4, 0], [5, 0, 5, 1]);
  const sorted = courseOf(scheme, [2, 0.3], [1, 0.4, 0], [0, 1, 5]);
  expect(course).toEqual([sorted[2], sorted[0], sorted[2], sorted[1]]);
  expect([...course[1]]).toEqual([1, 0.4, 0]);
});

test('a thousand times between steps are as good as the steps themselves', () => {
  const times = Array.from({ length: 1001 }, (_, i) => i / 50);
  const course = courseOf(parseScheme('A -> B'), [1], [1, 0], times);
  times.forEach((t, i) => expect(agreeingDigits(course[i][0], Math.exp(-t))).toBeGreaterThan(8.5));
});

test('a coarser tolerance costs digits, a finer one gains some', () => {
  const { initial, times, states } = named('orego');
  const scheme = parseScheme(`X + Y ->; Y -> X; X -> 2 X; 2 X -> X; X -> X + Z; Z -> ${77.27 / 0.161} Y`);
  const q = 77.27;
  const digits = (tolerance: number): number => {
    const start = [initial[0], initial[1] * q * q, initial[2]];
    const course = courseOf(scheme, [1 / q, 1 / q, q, q * 8.375e-6, 0.161, 0.161], start, times, {
      tolerance,
    });
    return fewestDigits(
      course.map(([x, , z]) => Float64Array.of(x, z)),
      states.map(([x, , z]) => [x, z]),
    );
  };
  const [coarse, fine] = [digits(1e-5), digits(1e-10)];
  expect(coarse).toBeGreaterThan(3);
  expect(fine).toBeGreaterThan(coarse + 3);
});

test('a change of the unit of time or of concentration changes nothing else', () => {
  const scheme = parseScheme('A + B -> C; C -> D');
  const plain = courseOf(scheme, [2, 0.1], [1, 0.5, 0, 0], [3])[0];
  const minutes = courseOf(scheme, [2 * 60, 0.1 * 60], [1, 0.5, 0, 0], [3 / 60])[0];
  const milli = courseOf(scheme, [2 / 1000, 0.1], [1000, 500, 0, 0], [3])[0];
  plain.forEach((value, j) => {
    expect(agreeingDigits(minutes[j], value)).toBeGreaterThan(8.5);
    expect(agreeingDigits(milli[j] / 1000, value)).toBeGreaterThan(8.5);
  });
});

test('trajectoryOf: sensitivities are the closed form’s derivatives with ln k', () => {
  const [k1, k2] = [0.12, 0.035];
  const times = [5, 20, 60];
  const { sensitivities } = trajectoryOf(parseScheme('A -> B -> C'), [k1, k2], [1, 0, 0], times, {
    sensitivities: [0, 1],
  });
  times.forEach((t, i) => {
    const [first, second] = [Math.exp(-k1 * t), Math.exp(-k2 * t)];
    const d = k2 - k1;
    expect(agreeingDigits(sensitivities[i][0][0], -k1 * t * first)).toBeGreaterThan(7);
    // B = k₁/(k₂ − k₁) (e^(−k₁t) − e^(−k₂t))
    const byFirst = k1 * ((k2 / d ** 2) * (first - second) - (k1 / d) * t * first);
    const bySecond = k2 * ((-k1 / d ** 2) * (first - second) + (k1 / d) * t * second);
    expect(agreeingDigits(sensitivities[i][0][1], byFirst)).toBeGreaterThan(7);
    expect(agreeingDigits(sensitivities[i][1][1], bySecond)).toBeGreaterThan(7);
  });
});

test('trajectoryOf: sensitivities of a stiff mechanism are differences of courses', () => {
  const scheme = parseScheme('A -> B; 2 B -> B + C; B + C -> A + C');
  const rates = [0.04, 3e7, 1e4];
  const { sensitivities } = trajectoryOf(scheme, rates, [1, 0, 0], [400], { sensitivities: [0, 1, 2] });
  const h = 1e-3;
  rates.forEach((_, j) => {
    const at = (shift: number): Float64Array =>
      courseOf(
        scheme,
        rates.map((k, i) => (i === j ? k * Math.exp(shift) : k)),
        [1, 0, 0],
        [400],
        { tolerance: 1e-11 },
      )[0];
    const [up, down, farUp, farDown] = [at(h), at(-h), at(2 * h), at(-2 * h)];
    for (let i = 0; i < 3; i++) {
      const slope = (8 * (up[i] - down[i]) - (farUp[i] - farDown[i])) / (12 * h);
      expect(agreeingDigits(sensitivities[0][j][i], slope)).toBeGreaterThan(5.5);
    }
  });
});

describe('it stops with words', () => {
  const refused = (scheme: string, k: number[], initial: number[], times: number[]): string => {
    try {
      courseOf(parseScheme(scheme), k, initial, times);
    } catch (error) {
      return `${(error as Error).name}: ${(error as Error).message}`;
    }
    return 'nothing';
  };

  test.each([
    [
      '2 A -> 3 A',
      [1],
      [1],
      [1.5],
      /^InvalidInput: scheme must keep concentrations within bounds: A grows without end near time 1 /,
    ],
    [
      'A -> 2 A',
      [1],
      [1],
      [1e5],
      /^InvalidInput: scheme must keep concentrations within bounds: A grows without end near time 70\d/,
    ],
    [
      'X -> 2 X; X + Y -> 2 Y; Y ->',
      [1, 1, 1],
      [1, 0.5],
      [1e9],
      /^NotDetermined: course takes too much work: after \d+ steps it has come to time [\d.]+ of 1000000000$/,
    ],
    [
      'A <-> B',
      [1],
      [1, 0],
      [1],
      /^InvalidInput: coefficients must be one for each direction of each step: none for coefficient 2 \(B -> A\)$/,
    ],
    [
      'A -> B',
      [1, 2],
      [1, 0],
      [1],
      /^InvalidInput: coefficients must be one for each direction of each step: got 2 for 1$/,
    ],
    [
      'A -> B',
      [-1],
      [1, 0],
      [1],
      /^InvalidInput: coefficients must be 0 or more: coefficient 1 \(A -> B\) \(-1\)$/,
    ],
    [
      'A -> B',
      [1],
      [1],
      [1],
      /^InvalidInput: initial must hold one concentration a species, in the order A, B: none for B$/,
    ],
    [
      'A -> B',
      [1],
      [1, 0, 0],
      [1],
      /^InvalidInput: initial must hold one concentration a species, in the order A, B: got 3 for 2$/,
    ],
    ['A -> B', [1], [1, NaN], [1], /^InvalidInput: initial must be 0 or more: B \(NaN\)$/],
    [
      'A -> B',
      [1],
      [1, 0],
      [0, -2],
      /^InvalidInput: times must be 0 or later, since initial belongs to time 0: row 2 \(-2\)$/,
    ],
  ])('%s %j %j %j', (scheme, k, initial, times, words) =>
    expect(refused(scheme, k, initial, times)).toMatch(words),
  );

  test('what watches is told how far it is, and can end it', () => {
    const looks: number[] = [];
    const scheme = parseScheme('X -> 2 X; X + Y -> 2 Y; Y ->');
    const watch = (time: number): void => {
      looks.push(time);
      if (looks.length === 3) throw new RangeError('enough');
    };
    expect(() => courseOf(scheme, [1, 1, 1], [1, 0.5], [1e6], { watch })).toThrow('enough');
    expect(looks).toHaveLength(3);
    expect(looks[2]).toBeGreaterThan(looks[0]);
  });
});

test('nothing in, nothing out', () => {
  const scheme = parseScheme('A -> B');
  expect([...courseOf(scheme, [1], [0, 0], [5])[0]]).toEqual([0, 0]);
  expect([...courseOf(scheme, [0], [2, 0], [1e9])[0]]).toEqual([2, 0]);
  expect(courseOf(scheme, [1], [1, 0], [])).toEqual([]);
  expect(courseOf(parseScheme('-> A'), [3], [0], [2])[0][0]).toBeCloseTo(6, 12);
});
