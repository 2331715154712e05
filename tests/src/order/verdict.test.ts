/**
 * What the verdict claims, on runs whose order is known because they were made with it: fixed seeds, so
 * that a claim that was right stays right.
 */
import { compareOrders, simpleOrders } from '../../../src/order/orders';
import { halfLivesFollowed, patternInWords } from '../../../src/order/verdict';
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

test('patternInWords warns of residuals in a pattern at p below 0.05, and else is silent', () => {
  expect(patternInWords(0.049)).toBe('; residuals run in a pattern');
  expect(patternInWords(0.05)).toBe('');
  expect(patternInWords(null)).toBe('');
});
