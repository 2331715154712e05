/** What is drawn is what the maths says, read back from the drawing or held against sums done here. */
import { SaxesParser } from 'saxes';
import { asText, type Shape } from '../../functions/drawing/shape';
import { coefficients, predicted } from '../../functions/help/pictures/arrheniusLine';
import { coefficientFor } from '../../functions/help/pictures/endpoint';
import { faults, findingIn } from '../../functions/help/pictures/faults';
import { halvings } from '../../functions/help/pictures/halfLives';
import { history, meanKinetic } from '../../functions/help/pictures/meanTemperature';
import { halfLife, verdictsAfter } from '../../functions/help/pictures/orderVerdict';
import { normalised, orderFound, runs } from '../../functions/help/pictures/overlay';
import { pictures } from '../../functions/help/pictures/pictures';
import { profile } from '../../functions/help/pictures/profileLimits';
import { believed, plannedTimes, uncertaintyAt } from '../../functions/help/pictures/samplingPlan';
import { rateByLaw, tangentAt } from '../../functions/help/pictures/tangentWindow';
import { courses, fittedSteps } from '../../functions/help/pictures/twoStepCourse';
import { amounts } from '../../functions/help/pictures/wetGas';
import { dyeFading, fizzByBurette } from '../../functions/demo/runs';
import { calculate } from '../support/literal';

const all = pictures();
const panels = all.flatMap(({ title, panels }) =>
  panels.map(({ heading, drawn }) => [title, heading, drawn] as const),
);

test.each(panels)('%s, %s: one small, well-formed drawing that says what it shows', (_, heading, drawn) => {
  const text = asText(drawn);
  const parser = new SaxesParser();
  parser.on('error', (error) => {
    throw error;
  });
  parser.write(text).close();
  expect(text.length).toBeLessThan(20_000);
  expect(text).not.toMatch(/NaN|Infinity|undefined|null|href|url\(/);
  expect(drawn.attributes).toMatchObject({ role: 'img' });
  expect(String(drawn.attributes['aria-label']).length).toBeGreaterThan(heading.length + 10);
});

test('captions are sentences without holes', () => {
  for (const { caption } of all) expect(caption).toMatch(/^[A-Z0-9].*[.]$/);
  for (const { caption } of all) expect(caption).not.toMatch(/NaN|Infinity|undefined/);
});

/** The two ends of a path with a class, in the units of the axes, which the ticks and their numbers tell. */
function endsOf(drawn: Shape, className: string): { x: number; y: number }[] {
  const shapes = drawn.children.filter((child): child is Shape => typeof child !== 'string');
  const numberAfter = (place: number): number =>
    Number(String(shapes[place + 1].children[0]).replace('−', '-'));
  const scale = (kind: string, side: string): ((pixel: number) => number) => {
    const marks = shapes.flatMap(({ attributes }, place) =>
      attributes.class === kind ? [[Number(attributes[side]), numberAfter(place)]] : [],
    );
    const [[p, a], [q, b]] = [marks[0], marks[marks.length - 1]];
    return (pixel) => a + ((b - a) * (pixel - p)) / (q - p);
  };
  const [x, y] = [scale('tick', 'x1'), scale('grid', 'y1')];
  const path = shapes.find(({ tag, attributes }) => tag === 'path' && attributes.class === className)!;
  const points = String(path.attributes.d).slice(1).split('L');
  return [points[0], points[points.length - 1]].map((point) => {
    const [across, up] = point.split(' ').map(Number);
    return { x: x(across), y: y(up) };
  });
}

test.each([
  [0, 4],
  [2, 13],
])(
  'tangent, panel %d: the line that is drawn has the slope that PACE.TANGENT gives for %d readings',
  (place, points) => {
    const { drawn } = all.find(({ name }) => name === 'tangent-window')!.panels[place];
    const [a, b] = endsOf(drawn, 'rate-line');
    const list = (column: number): string => `{${fizzByBurette.map((row) => row[column]).join(';')}}`;
    const rate = calculate(`=PACE.TANGENT(${list(0)},${list(1)},60,${points})`) as number;
    // a tenth of a pixel at each end
    expect((b.y - a.y) / (b.x - a.x) / rate).toBeCloseTo(1, 2);
    expect(tangentAt(points).value).toBe(rate);
  },
);

test('tangent: 13 readings are sure of a rate that the law of the run rules out', () => {
  expect(tangentAt(13).lower).toBeGreaterThan(rateByLaw());
  expect(tangentAt(5).lower).toBeLessThan(rateByLaw());
  expect(tangentAt(5).upper).toBeGreaterThan(rateByLaw());
});

test('endpoint: each k is where the squares about a course that ends there are least', () => {
  const run = fizzByBurette.filter(([t]) => t <= 120);
  const squares = (k: number, end: number): number => {
    const shape = run.map(([t]) => Math.exp(-k * t));
    const distance = run.map(([, v]) => v - end);
    const a =
      shape.reduce((sum, s, i) => sum + s * distance[i], 0) / shape.reduce((sum, s) => sum + s * s, 0);
    return distance.reduce((sum, d, i) => sum + (d - a * shape[i]) ** 2, 0);
  };
  for (const end of [54, 58, 64]) {
    const k = coefficientFor(end);
    for (const other of [k * 0.999, k * 1.001]) expect(squares(other, end)).toBeGreaterThan(squares(k, end));
  }
});

test('order: early readings leave it open, the whole run does not', () => {
  expect(13 / halfLife).toBeLessThan(1);
  expect(verdictsAfter(13)[1]).toMatch(/cannot be told/);
  expect(verdictsAfter(120)[1]).toBe('fits best');
});

test('wet gas: what dry is too high by is the share of the vapour', () => {
  // vapour pressure of water, kPa, from memory of printed tables: 2.488 at 21 °C, 2.645 at 22 °C; 7.384 at 40 °C
  const tooHigh = (t: number): number => amounts([t], false)[0] / amounts([t], true)[0] - 1;
  expect(tooHigh(21)).toBeCloseTo(2.488 / (100.6 - 2.488), 4);
  expect(tooHigh(22)).toBeCloseTo(2.645 / (100.6 - 2.645), 4);
  expect(tooHigh(40)).toBeCloseTo(7.384 / (100.6 - 7.384), 4);
});

test('half lives: the dye takes as long each time, by the slope of its logarithm', () => {
  const run = dyeFading.flatMap(([x, y]) => (typeof y === 'number' ? [{ x, y }] : []));
  const lives = halvings(run, 0.006);
  const [first, late] = [run[0], run.find(({ x }) => x === 60)!];
  const expected = (60 * Math.LN2) / Math.log((first.y - 0.006) / (late.y - 0.006));
  for (const life of lives.slice(0, 3)) expect(life / expected).toBeCloseTo(1, 1);
});

test('profile: both limits lie on the line of F, and the parabola meets it at even distances', () => {
  const { value, limits, symmetric, threshold, squaresAt, parabolaAt } = profile();
  // F at 95 % with 1 and 4 degrees of freedom is 7.709 (printed tables, from memory)
  expect(threshold).toBeCloseTo(1 + 7.709 / 4, 3);
  for (const limit of limits) expect(squaresAt(limit)).toBeCloseTo(threshold, 5);
  for (const limit of symmetric) expect(parabolaAt(limit)).toBeCloseTo(threshold, 9);
  expect(limits[1] - value).toBeGreaterThan(2 * (value - limits[0]));
});

test('overlay: against the normalised time of order 1 every run follows 1 − exp(−kτ)', () => {
  const made = runs();
  for (const run of made) {
    for (const { x, y } of normalised(run, 1)) expect(y).toBeCloseTo(0.1 * (1 - Math.exp(-0.4 * x)), 3);
  }
  expect(orderFound(made)).toBeCloseTo(1, 2);
  expect(Math.abs(normalised(made[0], 0.5)[12].y - 0.1 * (1 - Math.exp(-0.4 * 13.4)))).toBeGreaterThan(0.02);
});

test('Arrhenius: limits are nearest at the mean of 1/T, and part on both sides', () => {
  const ks = coefficients();
  const width = (t: number): number => predicted(ks, t).upper / predicted(ks, t).lower;
  const middle = 4 / [40, 50, 60, 70].reduce((sum, t) => sum + 1 / (t + 273.15), 0) - 273.15;
  for (const t of [5, 40, 52, 58, 70]) expect(width(t)).toBeGreaterThan(width(middle));
});

test('mean kinetic temperature: by its own sum', () => {
  const kelvin = history.map((t) => t + 273.15);
  for (const energy of [50, 83.144, 150]) {
    const theta = (energy * 1000) / 8.314462618;
    const mean = kelvin.reduce((sum, t) => sum + Math.exp(-theta / t), 0) / kelvin.length;
    expect(meanKinetic(energy)).toBeCloseTo(theta / -Math.log(mean) - 273.15, 8);
  }
});

test('two steps: the drawn courses are those of the sum of two exponentials', () => {
  const [k1, k2] = fittedSteps().map(({ value }) => value);
  const at = [0, 10, 28, 60, 130];
  const [dye, pale, clear] = courses([k1, k2], at);
  at.forEach((t, i) => {
    const [a, b] = [Math.exp(-k1 * t), (k1 / (k2 - k1)) * (Math.exp(-k1 * t) - Math.exp(-k2 * t))];
    expect(dye[i].y).toBeCloseTo(0.1 * a, 7);
    expect(pale[i].y).toBeCloseTo(0.1 * b, 7);
    expect(clear[i].y).toBeCloseTo(0.1 * (1 - a - b), 7);
  });
});

test('plan: no other pair of times makes k surer, by the information of readings at them', () => {
  const { k, initial, noise, samples } = believed;
  // readings c₀ exp(−kt) with c₀ and k unknown: the 2 × 2 information, inverted
  const expected = (times: readonly number[]): number => {
    let [a, b, d] = [0, 0, 0];
    for (const t of times) {
      const [byStart, byK] = [Math.exp(-k * t), -t * initial * Math.exp(-k * t)];
      a += byStart ** 2;
      b += byStart * byK;
      d += byK ** 2;
    }
    return noise * Math.sqrt(a / (a * d - b * b));
  };
  const { times, uncertainty } = plannedTimes();
  expect(expected(times) / uncertainty).toBeCloseTo(1, 6);
  for (let early = 1; early < samples; early++) {
    for (let late = 5; late < 60; late += 0.5) {
      const other = Array.from({ length: samples }, (_, i) => (i < early ? 0 : late));
      expect(expected(other)).toBeGreaterThan(uncertainty * (1 - 1e-6));
      expect(uncertaintyAt(other) / expected(other)).toBeCloseTo(1, 6);
    }
  }
});

test('faults: the sound run passes, and each fault is the first that PACE.CHECK names', () => {
  const words = [
    'nothing found',
    'far off the curve',
    'no reading for a long while',
    'rate rises at first',
    'no longer change',
    'jump once',
  ];
  faults.forEach((points, i) => {
    const found = findingIn(points);
    expect(found.words).toContain(words[i]);
    expect(found.places.length > 0).toBe(i > 0);
  });
});
