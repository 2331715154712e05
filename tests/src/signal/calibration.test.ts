import calibration from '../../reference/calibration.json';
import { InvalidInput, NotDetermined } from '../../../src/errors';
import { calibrationLine, concentrationFromLine, type Standards } from '../../../src/signal/calibration';
import { relative } from '../../support/compare';

const standards = (
  x: readonly number[],
  y: readonly number[],
  uncertainties?: readonly number[],
): Standards => ({
  concentrations: Float64Array.from(x),
  readings: Float64Array.from(y),
  ...(uncertainties && { uncertainties: Float64Array.from(uncertainties) }),
});

describe.each(calibration.cases)('calibration $id', ({ x, y, throughOrigin, line, unknowns, published }) => {
  const fitted = calibrationLine(standards(x, y), throughOrigin);

  test('the line to 1e-9', () => {
    expect(relative(fitted.slope, line.slope)).toBeLessThan(1e-9);
    expect(Math.abs(fitted.intercept - line.intercept)).toBeLessThan(1e-9 * Math.max(...y));
    expect(relative(fitted.deviation!, line.sigma)).toBeLessThan(1e-9);
    expect(fitted.degreesOfFreedom).toBe(line.df);
  });

  test('unknowns, their standard uncertainties and limits to 1e-9', () => {
    for (const { y0, m, x0, u_x0, ci95 } of unknowns) {
      const found = concentrationFromLine(fitted, y0, m);
      expect(relative(found.value, x0)).toBeLessThan(1e-9);
      expect(relative(found.standardUncertainty!, u_x0)).toBeLessThan(1e-9);
      expect(relative(found.lower!, ci95[0])).toBeLessThan(1e-9);
      expect(relative(found.upper!, ci95[1])).toBeLessThan(1e-9);
    }
  });

  if (published) {
    test('the guide’s printed results', () => {
      expect(fitted.slope).toBeCloseTo(published.B1, 3);
      expect(fitted.intercept).toBeCloseTo(published.B0, 4);
      const unknown = concentrationFromLine(fitted, unknowns[0].y0, published.p);
      expect(unknown.value).toBeCloseTo(published.c0, 2);
      expect(unknown.standardUncertainty!).toBeCloseTo(published.u_c0, 3);
    });
  }
});

test('a standard with weight 2 counts like two standards', () => {
  const twice = calibrationLine(standards([1, 2, 2, 3, 4], [1.1, 1.9, 1.9, 3.05, 4.1]));
  const weighted = calibrationLine(standards([1, 2, 3, 4], [1.1, 1.9, 3.05, 4.1], [1, Math.SQRT1_2, 1, 1]));
  expect(weighted.slope).toBeCloseTo(twice.slope, 13);
  expect(weighted.intercept).toBeCloseTo(twice.intercept, 13);
});

test('uncertainties all multiplied by ten change nothing', () => {
  const u = [0.01, 0.02, 0.02, 0.05];
  const once = calibrationLine(standards([1, 2, 3, 4], [1.1, 1.9, 3.05, 4.2], u));
  const tenfold = calibrationLine(
    standards(
      [1, 2, 3, 4],
      [1.1, 1.9, 3.05, 4.2],
      u.map((v) => 10 * v),
    ),
  );
  const [a, b] = [once, tenfold].map((line) => concentrationFromLine(line, 2.4));
  expect(b.value).toBeCloseTo(a.value, 12);
  expect(b.standardUncertainty!).toBeCloseTo(a.standardUncertainty!, 12);
});

test('an unknown where standards scatter more is itself less certain', () => {
  const line = calibrationLine(
    standards([1, 2, 3, 4, 5], [1.02, 1.99, 3.03, 3.95, 5.1], [0.01, 0.02, 0.03, 0.04, 0.05]),
  );
  const [low, high] = [1.5, 4.5].map((reading) => concentrationFromLine(line, reading).standardUncertainty!);
  expect(high).toBeGreaterThan(2 * low);
});

test('two standards give a value and no uncertainty', () => {
  const found = concentrationFromLine(calibrationLine(standards([0, 2], [0.1, 0.5])), 0.3);
  expect(found.value).toBeCloseTo(1, 14);
  expect(found).toMatchObject({ standardUncertainty: null, lower: null, upper: null, degreesOfFreedom: 0 });
});

test('what a calibration refuses, in words', () => {
  const good = calibrationLine(standards([0, 2, 4], [0.1, 0.5, 0.9]));
  const flat = standards([0, 2, 4, 6], [0.5, 0.51, 0.49, 0.5]);
  expect(() => calibrationLine(flat)).toThrow(/^calibration line must rise or fall clearly: its slope is /);
  expect(() => calibrationLine(flat)).toThrow(NotDetermined);
  expect(() => calibrationLine(standards([2, 2], [1, 2]))).toThrow('needs two different standards: got 1');
  expect(() => calibrationLine(standards([0], [0]), true)).toThrow('needs a standard other than 0: got 0');
  expect(() => calibrationLine(standards([1, 2, 3], [1, 2, 3], [1, 0, 1]))).toThrow(
    'uncertainties must be above 0: that of standard 2 is 0',
  );
  expect(() => concentrationFromLine(good, 1.2)).toThrow(
    'reading must lie among those of the standards, 0.1 to 0.9: 1.2 needs a standard beyond it, or a dilution',
  );
  expect(() => concentrationFromLine(good, 0.3, 0)).toThrow(InvalidInput);
});
