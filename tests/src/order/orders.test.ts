import reference from '../../reference/rate-law-fits.json';
import { InvalidInput, NotDetermined } from '../../../src/errors';
import { fitRateLaw } from '../../../src/order/fit';
import { akaikeWeights, compareOrders, correctedAic, simpleOrders } from '../../../src/order/orders';
import { pairReadings } from '../../../src/series/series';
import { relative } from '../../support/compare';
import { simulatedRun, type Simulation } from '../../support/simulatedRun';

test.each(reference.cases)('correctedAic of $id meets its reference to 1e-12', (c) => {
  const parameters = Object.keys(c.parameters).length;
  expect(relative(correctedAic(c.residualSS, c.t.length, parameters)!, c.AICcFromRSS)).toBeLessThan(1e-12);
});

test('correctedAic needs two readings more than parameters, the scatter counted as one', () => {
  expect(correctedAic(0.1, 5, 3)).toBeNull();
  expect(correctedAic(0.1, 6, 3)).not.toBeNull();
});

test('akaikeWeights of the four models of one run as the reference has them', () => {
  const run = ['K3h-order1', 'K3h-order3h', 'K3h-order2', 'K3h-order3h+Cinf'];
  const criteria = run.map((id) => reference.cases.find((c) => c.id === id)!.AICcFromRSS);
  const weights = akaikeWeights(criteria) as number[];
  // K. P. Burnham and D. R. Anderson, Model Selection and Multimodel Inference, 2nd ed. (2002), 2.9, by mpmath
  const expected = [1.8975196351591432e-16, 0.7940021366329281, 4.557097182109339e-15, 0.2059978633670672];
  weights.forEach((weight, i) => expect(relative(weight, expected[i])).toBeLessThan(1e-10));
});

test('akaikeWeights: an evidence ratio of e to two units, gaps left out, a common shift without effect', () => {
  const [best, gap, second] = akaikeWeights([-1e6, null, -1e6 + 2]);
  expect(gap).toBeNull();
  expect(best! / second!).toBeCloseTo(Math.E, 9);
  expect(best! + second!).toBeCloseTo(1, 14);
  expect(akaikeWeights([null, null])).toEqual([null, null]);
});

const compared = (simulation: Simulation, endpoint?: 'free') => {
  const { times, values } = simulatedRun(simulation);
  return compareOrders(pairReadings(times, values), { endpoint });
};

test.each(simpleOrders)('compareOrders on a clean run of order %d finds it, free and fixed', (order) => {
  const { rows, free, freeOrder } = compared({ order, halfLives: 4, readings: 15, noise: 0, seed: 1 });
  expect(freeOrder!.value).toBeCloseTo(order, 9);
  expect(free.verdict).toMatch(new RegExp(`holds order ${order}$`));
  for (const row of rows) {
    expect(row.verdict.startsWith('fits best')).toBe(row.order === order);
    if (row.order === order) expect(row.fit!.rateCoefficient).toBeCloseTo(1, 10);
    if (row.order === order) expect(row.weight).toBeCloseTo(1, 9);
  }
});

test('compareOrders gives an order that cannot be fitted its reason, and fits the others', () => {
  // a tail that only a high order can have: by the low ones all would be gone before the second reading
  const { rows } = compareOrders(
    pairReadings([0, 1, 2, 3, 4, 5, 6], [1, 0.003, 0.0032, 0.0031, 0.003, 0.0029, 0.003]),
    {},
  );
  expect(rows[5].fit).not.toBeNull();
  const refused = rows.filter(({ fit }) => fit === null);
  expect(refused.length).toBeGreaterThan(0);
  for (const { why, verdict, weight, runsProbability } of refused) {
    expect(why).toBe('rate coefficient cannot be told: all of the change lies between the first readings');
    expect(verdict).toBe(`not fitted: ${why}`);
    expect([weight, runsProbability]).toEqual([null, null]);
  }
});

test.each<[string, () => unknown, InvalidInput | NotDetermined]>([
  [
    'a straight line with a free endpoint',
    () => compareOrders(pairReadings([0, 1, 2, 3, 4, 5], [9, 8, 7, 6, 5, 4]), { endpoint: 'free' }),
    new NotDetermined(
      'rate coefficient cannot be told: the column hardly changes, or bends too little for its half life to be seen',
    ),
  ],
  [
    'a rising column without an end',
    () => fitRateLaw(pairReadings([0, 1, 2], [1, 2, 3]), { order: 1 }),
    new InvalidInput('a rising column needs its end: give endpoint a number or "free"'),
  ],
  [
    'an end on the wrong side',
    () => fitRateLaw(pairReadings([0, 1, 2], [3, 2, 1]), { order: 1, endpoint: 5 }),
    new InvalidInput(
      'endpoint must lie ahead of the readings: they fall, and 5 is not below their mean of 2',
    ),
  ],
  [
    'too few times',
    () => fitRateLaw(pairReadings([0, 1], [3, 2]), { order: 1, endpoint: 'free' }),
    new NotDetermined('a fit of 3 parameters needs 3 different times: got 2'),
  ],
  [
    'no change',
    () => fitRateLaw(pairReadings([0, 1, 2], [0, 0, 0]), { order: 1 }),
    new NotDetermined(
      'rate coefficient cannot be told: the column hardly changes, or bends too little for its half life to be seen',
    ),
  ],
  [
    'a change before the second reading',
    () => fitRateLaw(pairReadings([0, 1, 2, 3], [9, 0, 0, 0]), { order: 1 }),
    new NotDetermined('rate coefficient cannot be told: all of the change lies between the first readings'),
  ],
  [
    'an uncertainty of 0',
    () =>
      fitRateLaw(pairReadings([0, 1, 2], [4, 2, 1]), { order: 1, uncertainties: Float64Array.of(1, 0, 1) }),
    new InvalidInput('uncertainties must be above 0: row 2 (0)'),
  ],
  [
    'a fixed start with a fixed end',
    () =>
      fitRateLaw(pairReadings([0, 1, 2], [4, 2, 1]), { order: 1, start: { time: 0, value: 4 }, endpoint: 0 }),
    new InvalidInput('start can be fixed only when the endpoint is "free"'),
  ],
  [
    'a start within the run',
    () =>
      fitRateLaw(pairReadings([0, 1, 2, 3], [4, 2, 1, 1]), {
        order: 1,
        start: { time: 1, value: 4 },
        endpoint: 'free',
      }),
    new InvalidInput('start must not be later than the first reading: 1 is after 0'),
  ],
  [
    'no order',
    () => fitRateLaw(pairReadings([0, 1, 2], [4, 2, 1]), { order: NaN }),
    new InvalidInput('order must be a finite number: got NaN'),
  ],
  [
    'an endless end',
    () => fitRateLaw(pairReadings([0, 1, 2], [4, 2, 1]), { order: 1, endpoint: Infinity }),
    new InvalidInput('endpoint must be a finite number: got Infinity'),
  ],
])('a fit refuses %s in words', (_, call, error) => {
  expect(call).toThrow(error.constructor as new () => Error);
  expect(call).toThrow(error);
});
