/** Fitted mechanisms against a general-purpose solver, the project's own rate laws, closed forms and chance. */
import reference from '../../reference/mechanism-fits.json';
import { fitRateLaw } from '../../../src/order/fit';
import { halfLifeEstimate } from '../../../src/order/profile';
import { coefficientEstimate } from '../../../src/scheme/coefficientLimits';
import { followed } from '../../../src/scheme/experiment';
import { fitMechanism } from '../../../src/scheme/fitMechanism';
import { parseScheme } from '../../../src/scheme/parse';
import { pairReadings } from '../../../src/series/series';
import { relative, standardDeviation, mean } from '../../support/compare';
import { blockRun, consecutive, fitConsecutive, seen, times } from '../../support/mechanismRuns';
import { normal } from '../../support/random';

const named = (id: string) => reference.cases.find((c) => c.id === id)!;

test.each(['consecutive', 'reversible'])(
  'fitMechanism %s agrees with SciPy to 8 digits, its limits to 6',
  (id) => {
    const { scheme: text, initial, times, observed, start, ...wanted } = named(id);
    const scheme = parseScheme(text);
    const fit = fitMechanism({
      scheme,
      start,
      experiments: [blockRun(text, initial!, times!, observed!)],
    });
    expect(fit.degreesOfFreedom).toBe(wanted.degreesOfFreedom);
    expect(relative(fit.residualSumOfSquares, wanted.residualSumOfSquares)).toBeLessThan(1e-9);
    wanted.values.forEach((value, j) => {
      expect(relative(fit.coefficients[j].value, value)).toBeLessThan(1e-8);
      expect(
        relative(fit.coefficients[j].standardUncertainty!, wanted.standardUncertainties[j]),
      ).toBeLessThan(1e-6);
      wanted.values.forEach((_, i) =>
        expect(Math.abs(fit.correlations[i][j] - wanted.correlations[i][j])).toBeLessThan(1e-6),
      );
      const { lower, upper } = coefficientEstimate(fit, j);
      expect(relative(lower!, wanted.limits[j][0])).toBeLessThan(1e-6);
      expect(relative(upper!, wanted.limits[j][1])).toBeLessThan(1e-6);
    });
  },
);

test('fitMechanism over two runs with a factor in common agrees with SciPy to 8 digits', () => {
  const { scheme, weights, runs, start, ...wanted } = named('shared');
  const experiments = runs!.map(({ initial, times, readings }) => ({
    initial,
    times,
    signals: [{ weights: weights!, readings, factor: 'absorbance' }],
  }));
  const fit = fitMechanism({ scheme: parseScheme(scheme), start, experiments });
  const [k, factor] = wanted.values;
  const found = fit.factors.get('absorbance')!;
  expect(relative(fit.coefficients[0].value, k)).toBeLessThan(1e-8);
  expect(relative(found.value, factor)).toBeLessThan(1e-8);
  expect(relative(fit.coefficients[0].standardUncertainty!, wanted.standardUncertainties[0])).toBeLessThan(
    1e-6,
  );
  expect(relative(found.standardUncertainty!, wanted.standardUncertainties[1])).toBeLessThan(1e-6);
  const { lower, upper } = coefficientEstimate(fit, 0);
  expect(relative(lower!, wanted.limits[0][0])).toBeLessThan(1e-6);
  expect(relative(upper!, wanted.limits[0][1])).toBeLessThan(1e-6);
});

test.each([
  [1, 'A ->', (t: number) => Math.exp(-0.07 * t)],
  [2, '2 A -> A', (t: number) => 1 / (1 + 0.07 * t)],
])(
  'a single step of order %d with a free factor is the rate law of that order to 8 digits',
  (order, text, left) => {
    const times = [0, 1, 2, 4, 6, 8, 10, 15, 20, 30, 40, 60, 80];
    const scatter = normal(order);
    const readings = times.map((t) => 0.8 * left(t) + 0.01 * scatter());
    const law = fitRateLaw(pairReadings(times, readings), { order });
    const reduced = Math.exp(law.search.logRate);
    const fit = fitMechanism({
      scheme: parseScheme(text),
      start: [0.5],
      experiments: [{ initial: [1], times, signals: [{ weights: [1], readings, factor: 'start' }] }],
    });
    const [{ value, standardUncertainty }] = fit.coefficients;
    expect(relative(value, reduced)).toBeLessThan(1e-8);
    expect(relative(fit.factors.get('start')!.value, law.start)).toBeLessThan(1e-8);
    expect(relative(fit.residualSumOfSquares, law.residualSumOfSquares)).toBeLessThan(1e-7);
    expect(
      relative(standardUncertainty! / value, law.standardUncertainties.halfLife! / law.halfLife),
    ).toBeLessThan(1e-7);
    // k is as far from its limits as the half life, on the logarithmic scale, the other way round
    const [own, its] = [coefficientEstimate(fit, 0), halfLifeEstimate(law)];
    expect(relative((own.lower! * its.upper!) / (value * law.halfLife), 1)).toBeLessThan(1e-7);
    expect(relative((own.upper! * its.lower!) / (value * law.halfLife), 1)).toBeLessThan(1e-7);
  },
);

test.each([[[0.05, 0.1]], [[0.035, 0.12]], [[10, 10]], [[50, 1e-5]], [[1e-6, 1e-6]]])(
  'fitMechanism of exact readings finds k from start values %j',
  (start) => {
    const { coefficients, residualSumOfSquares } = fitConsecutive(consecutive(0.12, 0.035, 0), start);
    expect(relative(coefficients[0].value, 0.12)).toBeLessThan(1e-8);
    expect(relative(coefficients[1].value, 0.035)).toBeLessThan(1e-8);
    expect(residualSumOfSquares).toBeLessThan(1e-16);
  },
);

test('one column is enough where it shows both steps', () => {
  const { coefficients } = fitConsecutive(seen(consecutive(0.12, 0.035, 0), [1]), [0.2, 0.02]);
  expect(relative(coefficients[0].value, 0.12)).toBeLessThan(1e-7);
  expect(relative(coefficients[1].value, 0.035)).toBeLessThan(1e-7);
});

test('standard uncertainties are the scatter of many fits', () => {
  const fits = Array.from({ length: 60 }, (_, seed) =>
    fitConsecutive(consecutive(0.12, 0.035, 0.01, seed + 1), [0.1, 0.05]),
  );
  [0.12, 0.035].forEach((k, j) => {
    const values = fits.map(({ coefficients }) => coefficients[j].value);
    const claimed = mean(fits.map(({ coefficients }) => coefficients[j].standardUncertainty!));
    // 60 fits: a standard deviation is known to 9 %, a mean to u/√60
    expect(relative(standardDeviation(values), claimed)).toBeLessThan(0.3);
    expect(Math.abs(mean(values) - k)).toBeLessThan((4 * claimed) / Math.sqrt(60));
  });
}, 60_000);

test('a coefficient that is held stays, and has no uncertainty', () => {
  const observed = consecutive(0.12, 0.035, 0.01);
  const scheme = parseScheme('A -> B -> C');
  const experiments = [blockRun('A -> B -> C', [1, 0, 0], times, observed)];
  const fit = fitMechanism({ scheme, start: [0.12, 1], held: [0], experiments });
  expect(fit.coefficients[0]).toEqual({ value: 0.12, standardUncertainty: null, why: '' });
  expect(fit.degreesOfFreedom).toBe(29);
  const free = fitConsecutive(observed, [0.1, 0.1]);
  expect(fit.residualSumOfSquares).toBeGreaterThan(free.residualSumOfSquares);
});

test('what watches can end a fit', () => {
  const watch = (): void => {
    throw new RangeError('enough');
  };
  const scheme = parseScheme('A -> B; 2 B -> B + C; B + C -> A + C');
  const observed = [0.4, 40, 4000].map((t) => [Math.exp(-t), null, null]);
  const experiments = [
    {
      initial: [1, 0, 0],
      times: [0.4, 40, 4000],
      signals: [
        followed(
          scheme,
          'A',
          observed.map(([a]) => a),
        ),
      ],
    },
  ];
  expect(() => fitMechanism({ scheme, start: [0.04, 3e7, 1e4], experiments, watch })).toThrow('enough');
});

describe('it is refused in words', () => {
  const scheme = parseScheme('A -> B');
  const run = (observed: (number | null)[][]) => blockRun('A -> B', [1, 0], [0, 1], observed);
  const taken = run([
    [1, null],
    [0.5, null],
  ]);
  test.each([
    [[0], [taken], 'coefficients must be start values above 0: coefficient 1 (A -> B) (0)'],
    [
      [],
      [taken],
      'coefficients must be one for each direction of each step: none for coefficient 1 (A -> B)',
    ],
    [[1, 1], [taken], 'coefficients must be one for each direction of each step: got 2 for 1'],
    [
      [1],
      [
        run([
          [null, null],
          [null, null],
        ]),
      ],
      'observed must hold readings: none was found',
    ],
    [
      [1],
      [
        run([
          [1, null],
          [NaN, null],
        ]),
      ],
      'observed must be finite numbers: row 2 (NaN)',
    ],
    [[1], [run([[1, null]])], 'observed must be as many as times: got 1 for 2'],
    [
      [1],
      [{ ...taken, initial: [1] }],
      'initial must hold one concentration a species, in the order A, B: none for B',
    ],
  ])('start %j: %#', (start, experiments, words) =>
    expect(() => fitMechanism({ scheme, start, experiments })).toThrow(words),
  );

  test('fewer readings than coefficients', () =>
    expect(() =>
      fitMechanism({
        scheme: parseScheme('A <-> B'),
        start: [1, 1],
        experiments: [
          run([
            [null, null],
            [0.5, null],
          ]),
        ],
      }),
    ).toThrow('a fit of 2 numbers needs as many readings: got 1'));
});
