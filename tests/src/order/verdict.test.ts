/**
 * What the verdict claims, on runs whose order is known because they were made with it: fixed seeds, so
 * that a claim that was right stays right.
 */
import { compareOrders, simpleOrders } from '../../../src/order/orders';
import { fitRateLaw } from '../../../src/order/fit';
import { halfLivesFollowed, patternInWords, verdicts } from '../../../src/order/verdict';
import { pairReadings } from '../../../src/series/series';
import { simulatedRun, type Simulation } from '../../support/simulatedRun';

type Outcome = 'right' | 'wrong' | 'undecided';

function outcome(simulation: Simulation, endpoint?: 'free'): Outcome {
  const { times, values } = simulatedRun(simulation);
  const { rows } = compareOrders(pairReadings(times, values), { endpoint });
  const named = rows.filter(({ verdict }) => verdict.startsWith('fits best'));
  expect(named.length).toBeLessThan(2);
  if (named.length === 0) return 'undecided';
  return named[0].order === simulation.order ? 'right' : 'wrong';
}

/** Every combination of order, noise and count of readings. */
function batch(halfLives: number, endpoint?: 'free'): Record<Outcome, number> {
  const tally = { right: 0, wrong: 0, undecided: 0 };
  // with a free endpoint a straight line has no order to be told: 0 is left out
  for (const order of endpoint === 'free' ? simpleOrders.slice(1) : simpleOrders) {
    for (const noise of [0.003, 0.01]) {
      for (const readings of [12, 25]) {
        const seed = Math.round(1000 * halfLives + 10 * order + readings);
        tally[outcome({ order, halfLives, readings, noise, seed, endpoint: endpoint ? 0.2 : 0 }, endpoint)]++;
      }
    }
  }
  return tally;
}

test.each([1, 1.8])('below two half lives (%d) no order is named', (halfLives) => {
  expect(batch(halfLives)).toEqual({ right: 0, wrong: 0, undecided: 24 });
});

test.each([3, 4])(
  'followed for %d half lives the true order is named in 20 of 24 noisy runs or more, and never another',
  (halfLives) => {
    const { right, wrong } = batch(halfLives);
    expect(wrong).toBe(0);
    expect(right).toBeGreaterThanOrEqual(20);
  },
);

test.each([1, 4])(
  'with a free endpoint, %d half lives: never another order than the true one',
  (halfLives) => {
    expect(batch(halfLives, 'free').wrong).toBe(0);
  },
);

test('short runs of few readings say what they lack', () => {
  const { times, values } = simulatedRun({ order: 1, halfLives: 1, readings: 8, noise: 0.01, seed: 2 });
  const { rows, free } = compareOrders(pairReadings(times, values), {});
  const first = rows.find(({ order }) => order === 1)!;
  expect(first.verdict).toMatch(
    /^cannot be told from order .*: \d\.\d half lives followed, follow 3 or more/,
  );
  expect(free.verdict).toMatch(/only \d\.\d half lives followed$/);

  const few = compareOrders(pairReadings([0, 1, 2, 3], [8, 4.1, 2, 1]), {});
  expect(few.rows.map(({ verdict }) => verdict)).toEqual(
    simpleOrders.map(() => 'too few readings to weigh the orders'),
  );
});

test('an order between the simple ones is not called one of them', () => {
  // 1.25: c = (1 + t/4)⁻⁴, to 5 half lives
  const times = Array.from({ length: 30 }, (_, i) => (4 * (2 ** (5 / 4) - 1) * i) / 29);
  const { rows, free } = compareOrders(
    pairReadings(
      times,
      times.map((t, i) => (1 + t / 4) ** -4 + 0.002 * Math.sin(9 * i * i)),
    ),
    {},
  );
  expect(rows.some(({ verdict }) => verdict.startsWith('fits best'))).toBe(false);
  expect(free.verdict).toMatch(/holds none of the simple orders/);
  expect(free.order).toBeCloseTo(1.25, 1);
});

test('halfLivesFollowed counts halvings of what was there, to the last reading', () => {
  const { times, values } = simulatedRun({ order: 2, halfLives: 3, readings: 10, noise: 0, seed: 1 });
  const { rows } = compareOrders(pairReadings(times, values), {});
  expect(halfLivesFollowed(rows[4].fit!)).toBeCloseTo(3, 9);
});

describe('verdicts: an order is named only where weight, interval and conversion agree', () => {
  const { times, values } = simulatedRun({ order: 1, halfLives: 4, readings: 12, noise: 0.001, seed: 1 });
  const fits = [1, 2].map((order) => fitRateLaw(pairReadings(times, values), { order }));
  const interval = (lower: number | null, upper: number | null) => ({
    value: 1.1,
    standardUncertainty: 0.1,
    lower,
    upper,
    degreesOfFreedom: 9,
  });
  const say = (weights: (number | null)[], freeOrder: ReturnType<typeof interval> | null): string[] =>
    verdicts({ orders: [1, 2], fits, weights, freeOrder }).simple;

  test.each<[string, (number | null)[], ReturnType<typeof interval> | null, string, string]>([
    ['all agree', [0.99, 0.01], interval(0.8, 1.3), 'fits best', 'fits less well'],
    [
      'two have weight',
      [0.8, 0.2],
      interval(0.8, 1.3),
      'cannot be told from order 2',
      'cannot be told from order 1',
    ],
    [
      'the interval holds both',
      [0.99, 0.01],
      interval(0.4, 2.3),
      'cannot be told from order 2',
      'fits less well, but lies within what a free order allows',
    ],
    [
      'the interval is open above',
      [0.99, 0.01],
      interval(0.4, null),
      'cannot be told from order 2',
      'fits less well, but lies within what a free order allows',
    ],
    [
      'the interval holds neither',
      [0.99, 0.01],
      interval(1.05, 1.15),
      'best of these, but a free order of 1.1 fits better',
      'fits less well',
    ],
    [
      'no free order',
      [0.99, 0.01],
      null,
      'best of these, but not established: a free order cannot be told',
      'fits less well',
    ],
    [
      'no weights',
      [null, null],
      null,
      'too few readings to weigh the orders',
      'too few readings to weigh the orders',
    ],
  ])('%s', (_, weights, freeOrder, first, second) =>
    expect(say(weights, freeOrder)).toEqual([first, second]),
  );
});

test('verdicts count the half lives by the most cautious of the fits that have weight', () => {
  const followedFor = (halfLives: number) => {
    const { times, values } = simulatedRun({ order: 1, halfLives, readings: 12, noise: 0, seed: 1 });
    return fitRateLaw(pairReadings(times, values), { order: 1 });
  };
  const fits = [followedFor(4), followedFor(1.5), followedFor(0.5)];
  const { simple } = verdicts({ orders: [0, 1, 2], fits, weights: [0.6, 0.39, 0.01], freeOrder: null });
  expect(simple[0]).toBe('cannot be told from order 1: 1.5 half lives followed, follow 3 or more');
});

test('patternInWords warns of residuals in a pattern at p below 0.05, and else is silent', () => {
  expect(patternInWords(0.049)).toBe('; residuals run in a pattern');
  expect(patternInWords(0.05)).toBe('');
  expect(patternInWords(null)).toBe('');
});
