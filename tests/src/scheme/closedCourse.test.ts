/** Closed forms against 34-digit values, against the integration of the same equations, and at their limits. */
import reference from '../../reference/courses.json';
import { closedCourseOf, closedFormOf } from '../../../src/scheme/closedCourse';
import { courseOf } from '../../../src/scheme/course';
import { parseScheme } from '../../../src/scheme/parse';
import { agreeingDigits } from '../../support/compare';

test.each(['consecutive', 'consecutive-equal', 'reversible', 'parallel'])(
  'closedCourseOf %s: 13 digits of its reference values',
  (id) => {
    const { scheme, coefficients, initial, times, states } = reference.cases.find((one) => one.id === id)!;
    const course = closedCourseOf(parseScheme(scheme!), coefficients!, initial, times)!;
    const digits = states.flatMap((row, i) => row.map((value, j) => agreeingDigits(course[i][j], value)));
    expect(digits.length).toBeGreaterThan(10);
    expect(Math.min(...digits)).toBeGreaterThan(13);
  },
);

test.each([
  ['A ->', [0.3], [2]],
  ['A -> 2 B + C', [0.3], [2, 0.1, 0]],
  ['A -> B; A -> C; A -> D', [0.3, 0, 1.7], [2, 0.1, 0, 0]],
  ['A <-> B', [0.3, 0.05], [0.2, 3]],
  ['A <-> B', [0, 0], [0.2, 3]],
  ['A -> B -> C', [0.3, 0.3000001], [2, 0.5, 0]],
  ['A -> 2 B; B -> C + D', [0.02, 40], [2, 0.5, 0, 0]],
  ['A -> 2 B; B -> C + D', [40, 0.02], [2, 0.5, 0, 0]],
  ['A -> C; B -> D', [0.4, 0.02], [2, 0.5, 0, 0]],
  ['2 A -> B', [0.7], [2, 0]],
  ['A + A -> B + C', [0.7], [2, 0.1, 0]],
  ['A + B -> C', [0.7], [2, 0.5, 0]],
  ['A + B -> 2 C', [0.7], [0.5, 2, 0]],
  ['A + B -> C', [0.7], [2, 2, 0]],
  ['A + B -> C', [0.7], [2, 2.0000001, 0]],
  ['A + B ->', [0.7], [0, 2]],
])('closedCourseOf %s at %p from %p is what the integration gives', (text, coefficients, initial) => {
  const scheme = parseScheme(text);
  const times = [0, 1e-6, 0.1, 1, 7, 60, 4000];
  const [closed, integrated] = [closedCourseOf, courseOf].map((of) =>
    of(scheme, coefficients, initial, times)!,
  );
  const largest = Math.max(...initial);
  closed.forEach((row, i) =>
    row.forEach((value, j) => expect(Math.abs(value - integrated[i][j])).toBeLessThan(2e-9 * largest)),
  );
});

test('2 A -> B: 1/a grows evenly, by 2kt', () => {
  const [[a]] = closedCourseOf(parseScheme('2 A -> B'), [0.7], [2, 0], [9])!;
  expect(1 / a).toBeCloseTo(1 / 2 + 2 * 0.7 * 9, 12);
});

test('A + B -> C: ln(b/a) grows evenly, by (b₀ − a₀)kt', () => {
  const [[a, b]] = closedCourseOf(parseScheme('A + B -> C'), [0.7], [0.5, 2, 0], [3])!;
  expect(Math.log(b / a)).toBeCloseTo(Math.log(2 / 0.5) + (2 - 0.5) * 0.7 * 3, 12);
});

test.each([
  'A -> 2 A',
  '3 A -> B',
  'A + C -> B + C',
  'A + 2 B -> C',
  'A -> B; B -> A + C',
  'A -> B -> C -> D',
  'A <-> B; B -> C',
  '2 A <-> B',
  '-> A',
  'A -> B; 2 B -> C',
])('%s has to be integrated', (text) => {
  expect(closedFormOf(parseScheme(text))).toBeUndefined();
});

test('closedCourseOf refuses what the integration refuses, in its words', () => {
  const scheme = parseScheme('A -> B');
  for (const [k, initial, times] of [
    [[-1], [1, 0], [0]],
    [[1], [1], [0]],
    [[1], [1, 0], [-1]],
  ]) {
    const words = (of: typeof closedCourseOf): string => {
      try {
        of(scheme, k, initial, times);
        return 'nothing was refused';
      } catch (error) {
        return (error as Error).message;
      }
    };
    expect(words(closedCourseOf)).toMatch(/^(coefficients|initial|times) must/);
    expect(words(closedCourseOf)).toBe(words(courseOf));
  }
});
