import { holdingTimes, meanKineticTemperature } from '../../../src/temperature/meanKinetic';

const kelvin = (...celsius: number[]): Float64Array => Float64Array.from(celsius, (t) => t + 273.15);
const energy = 83144;

/**
 * By hand: Ea/R = 83144/8.314463 = 9999.92 K; exp(−9999.92/T) is 1.53235e-15 at 293.15 K and 4.72116e-15 at
 * 303.15 K, 3.12676e-15 in the mean, whose −ln is 33.3988; 9999.92/33.3988 = 299.41 K.
 */
test('meanKineticTemperature of 20 and 30 °C is 26.26 °C, worked by hand', () => {
  expect(meanKineticTemperature(kelvin(20, 30), energy) - 273.15).toBeCloseTo(26.26, 2);
});

test('it is the formula as printed, where exponentials do not underflow', () => {
  const temperatures = kelvin(18.4, 21.2, 25.7, 31.9, 24.4);
  const mean = temperatures.reduce((sum, t) => sum + Math.exp(-energy / (8.31446261815324 * t)), 0) / 5;
  const printed = energy / 8.31446261815324 / -Math.log(mean);
  expect(meanKineticTemperature(temperatures, energy)).toBeCloseTo(printed, 10);
});

test('a constant temperature is its own mean, exactly, for any energy', () => {
  for (const e of [1e-3, 83144, 1e9]) {
    expect(meanKineticTemperature(kelvin(25, 25, 25), e)).toBeCloseTo(298.15, 12);
  }
});

test('a high energy heeds the maximum alone; a low one gives the harmonic mean', () => {
  const temperatures = kelvin(5, 25, 40);
  const harmonic = 3 / temperatures.reduce((sum, t) => sum + 1 / t, 0);
  expect(meanKineticTemperature(temperatures, 1e10)).toBeCloseTo(313.15, 3);
  expect(meanKineticTemperature(temperatures, 1e-6)).toBeCloseTo(harmonic, 9);
});

test('it lies between the arithmetic mean and the maximum, and rises with the energy', () => {
  const temperatures = kelvin(15, 22, 24, 38);
  let before = 273.15 + (15 + 22 + 24 + 38) / 4;
  for (const e of [50e3, 83144, 120e3, 300e3]) {
    const mean = meanKineticTemperature(temperatures, e);
    expect(mean).toBeGreaterThan(before);
    expect(mean).toBeLessThan(311.15);
    before = mean;
  }
});

test('twice as long is as good as twice', () => {
  const long = meanKineticTemperature(kelvin(20, 30), energy, Float64Array.of(2, 1));
  expect(long).toBeCloseTo(meanKineticTemperature(kelvin(20, 20, 30), energy), 12);
});

test('differences of a millionth of a degree keep their digits', () => {
  const mean = meanKineticTemperature(Float64Array.of(298.15, 298.15 + 2e-6), energy);
  expect(mean - 298.15).toBeCloseTo(1e-6, 11);
});

test.each([
  [
    [0, 1, 2, 3],
    [0.5, 1, 1, 0.5],
  ],
  [
    [0, 1, 5, 6],
    [0.5, 2.5, 2.5, 0.5],
  ],
  [
    [0, 2, 2, 10],
    [1, 2.5, 2.5, 4],
  ],
  [
    [3, 3, 5],
    [0.5, 0.5, 1],
  ],
])('holdingTimes of %j', (times, expected) => {
  expect([...holdingTimes(Float64Array.from(times))]).toEqual(expected);
});

test('a denser log of the same history changes little: hourly and every ten minutes', () => {
  const at = (hour: number): number => 298.15 + 8 * Math.sin((2 * Math.PI * hour) / 24);
  const meanEvery = (step: number): number => {
    const times = Float64Array.from({ length: Math.round(24 / step) + 1 }, (_, i) => i * step);
    return meanKineticTemperature(times.map(at), energy, holdingTimes(times));
  };
  expect(meanEvery(1)).toBeCloseTo(meanEvery(1 / 6), 3);
  // readings crowded into the warm half do not move it as a plain average would
  const uneven = Float64Array.from({ length: 73 }, (_, i) => i / 6);
  const cool = Float64Array.from({ length: 12 }, (_, i) => 13 + i);
  const times = Float64Array.of(...uneven, ...cool);
  const temperatures = times.map(at);
  const held = meanKineticTemperature(temperatures, energy, holdingTimes(times));
  expect(held).toBeCloseTo(meanEvery(1 / 6), 1);
  expect(meanKineticTemperature(temperatures, energy)).toBeGreaterThan(held + 2);
});

test('what it refuses, in words', () => {
  expect(() => meanKineticTemperature(Float64Array.of(), energy)).toThrow('a history must last');
  expect(() => meanKineticTemperature(Float64Array.of(-1), energy)).toThrow(
    'temperature must be above 0: got -1',
  );
  expect(() => meanKineticTemperature(kelvin(20), 0)).toThrow('energy must be above 0: got 0');
  expect(() => meanKineticTemperature(kelvin(20), energy, Float64Array.of(1, 2))).toThrow(
    'durations must be as many as temperatures: got 2 for 1',
  );
  expect(() => meanKineticTemperature(kelvin(20, 21), energy, Float64Array.of(1, -2))).toThrow(
    'durations must be 0 or more: number 2 is -2',
  );
});
