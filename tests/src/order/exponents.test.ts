import initialRates from '../../reference/initial-rates.json';
import { NotDetermined } from '../../../src/errors';
import { nearestSimpleOrder, partialOrders } from '../../../src/order/exponents';
import { relative } from '../../support/compare';

const columns = (numbers: readonly number[][]): Float64Array[] =>
  numbers.map((column) => Float64Array.from(column));

test.each(initialRates.cases)('partialOrders of $what: orders, k, uncertainties and limits to 1e-11', (c) => {
  // a relative deviation of each rate, as an uncertainty
  const uncertainties =
    c.relativeDeviations && Float64Array.from(c.rates, (rate, i) => rate * c.relativeDeviations[i]);
  const found = partialOrders(
    Float64Array.from(c.rates),
    columns(c.concentrations),
    uncertainties ?? undefined,
  );
  const { expected } = c;
  found.orders.forEach((order, j) => {
    expect(relative(order.value, expected.orders[j])).toBeLessThan(1e-11);
    expect(relative(order.standardUncertainty!, expected.orderUncertainties[j])).toBeLessThan(1e-11);
    expect(relative(order.lower!, expected.orderLimits[j][0])).toBeLessThan(1e-10);
    expect(relative(order.upper!, expected.orderLimits[j][1])).toBeLessThan(1e-10);
    expect(order.degreesOfFreedom).toBe(expected.degreesOfFreedom);
  });
  const { rateCoefficient: k } = found;
  expect(relative(k.value, expected.rateCoefficient)).toBeLessThan(1e-11);
  expect(relative(k.standardUncertainty! / k.value, expected.logUncertainty)).toBeLessThan(1e-11);
  expect(relative(Math.log(k.lower!), expected.logLimits[0])).toBeLessThan(1e-10);
  expect(relative(Math.log(k.upper!), expected.logLimits[1])).toBeLessThan(1e-10);
  expect(relative(found.residualDeviation!, expected.deviation)).toBeLessThan(1e-11);
});

test.each(initialRates.published)(
  'partialOrders of a printed table, $what',
  ({ rates, concentrations, orders, rateCoefficient }) => {
    const found = partialOrders(Float64Array.from(rates), columns(concentrations));
    found.orders.forEach(({ value }, j) => expect(Math.abs(value - orders[j])).toBeLessThan(0.03));
    // printed to two digits, from one row of a table that does not close exactly
    expect(relative(found.rateCoefficient.value, rateCoefficient)).toBeLessThan(0.11);
  },
);

test('other units of concentration change k as its dimension says, and no order', () => {
  const { rates, concentrations } = initialRates.cases[0];
  const litres = partialOrders(Float64Array.from(rates), columns(concentrations));
  const thousandths = partialOrders(
    Float64Array.from(rates),
    columns(concentrations.map((c) => c.map((x) => x * 1000))),
  );
  const total = litres.orders.reduce((sum, { value }) => sum + value, 0);
  litres.orders.forEach(({ value }, j) => expect(thousandths.orders[j].value).toBeCloseTo(value, 11));
  expect(
    relative(thousandths.rateCoefficient.value, litres.rateCoefficient.value * 1000 ** -total),
  ).toBeLessThan(1e-10);
});

test('as many runs as unknowns give orders without uncertainty', () => {
  const found = partialOrders(
    Float64Array.of(0.003, 0.0045, 0.00675),
    columns([
      [0.1, 0.1, 0.15],
      [0.1, 0.15, 0.1],
    ]),
  );
  expect(found.orders[0].value).toBeCloseTo(2, 12);
  expect(found.orders[0].standardUncertainty).toBeNull();
  expect(nearestSimpleOrder(found.orders[0])).toBeNull();
});

test('nearestSimpleOrder is named only where the limits hold it', () => {
  const estimate = (value: number, lower: number, upper: number) => ({
    value,
    lower,
    upper,
    standardUncertainty: 0.1,
    degreesOfFreedom: 5,
  });
  expect(nearestSimpleOrder(estimate(0.97, 0.9, 1.1))).toBe(1);
  expect(nearestSimpleOrder(estimate(0.8, 0.75, 0.85))).toBeNull();
  expect(nearestSimpleOrder(estimate(-0.9, -1.2, -0.7))).toBe(-1);
});

test('what partialOrders refuses, in words', () => {
  const two = Float64Array.of(1, 2);
  const three = Float64Array.of(1, 2, 3);
  expect(() =>
    partialOrders(
      two,
      columns([
        [1, 2],
        [1, 2],
      ]),
    ),
  ).toThrow('3 unknowns need as many runs: got 2');
  expect(() =>
    partialOrders(
      three,
      columns([
        [1, 2, 3],
        [2, 4, 6],
      ]),
    ),
  ).toThrow('the orders cannot be told apart: two reactants, or more, were always changed together');
  expect(() =>
    partialOrders(
      three,
      columns([
        [1, 2, 3],
        [2, 2, 2],
      ]),
    ),
  ).toThrow('the order in reactant 2 needs runs in which it differs: all have 2');
  expect(() =>
    partialOrders(
      three,
      columns([
        [1, 2, 3],
        [2, 2, 2],
      ]),
    ),
  ).toThrow(NotDetermined);
  expect(() => partialOrders(Float64Array.of(1, 0, 3), columns([[1, 2, 3]]))).toThrow(
    'rates must be above 0: run 2 (0)',
  );
  expect(() => partialOrders(three, columns([[1, -2, 3]]))).toThrow(
    'concentrations of reactant 1 must be above 0: run 2 (-2)',
  );
});
