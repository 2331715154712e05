/** Every example in a docstring of src is true, and every exported function has one. */
import { join, relative } from 'node:path';
import { checkExample, difference, exportedFunctions, sourcesBelow } from '../support/examples';

const root = join(__dirname, '..', '..');

/** Findings are sentences about whole runs: their tests are their examples. */
const spokenElsewhere = join('src', 'series', 'check');

const files = sourcesBelow(join(root, 'src'));
const functions = files.flatMap(exportedFunctions).map((f) => ({ ...f, place: relative(root, f.file) }));

type Exports = Readonly<Record<string, unknown>>;
const modules = new Map<string, Exports>();
let everything: Exports = {};

beforeAll(async () => {
  for (const file of files) modules.set(file, (await import(file)) as Exports);
  everything = Object.assign({}, ...modules.values()) as Exports;
});

test('every exported function has an example', () => {
  const silent = functions.filter(
    ({ place, examples }) => examples.length === 0 && !place.startsWith(spokenElsewhere),
  );
  expect(silent.map(({ place, name }) => `${place}: ${name}`)).toEqual([]);
});

const examples = functions.flatMap(({ file, place, name, examples: own }) =>
  own.map((example) => ({ file, place, name, ...example })),
);

test.each(examples)('$place: $call // $expected', ({ file, call, expected }) => {
  // other modules' functions are at hand; the module's own come first
  expect(checkExample(call, expected, { ...everything, ...modules.get(file) })).toBeUndefined();
});

test.each(examples)('$place: the example of $name calls it', ({ call, name }) =>
  expect(call).toContain(`${name}(`),
);

test('a false example is found out', () => {
  const scope = {
    half: (x: number) => x / 2,
    refuse: () => {
      throw new Error('too far: got 3');
    },
  };
  expect(checkExample('half(1)', '0.5', scope)).toBeUndefined();
  expect(checkExample('half(1)', '0.51', scope)).toBe('0.5 is not 0.51');
  expect(checkExample('half(2 / 3)', '0.33333', scope)).toBeUndefined();
  expect(checkExample('half(2 / 3)', '0.33334', scope)).toBe('0.3333333333333333 is not 0.33334');
  expect(checkExample('half(2 / 3)', '0.333', scope)).toBe('0.3333333333333333 is not 0.333'); // too few digits to be rounded
  expect(checkExample('[half(1), half(2)]', '[0.5, 2]', scope)).toBe('1: 1 is not 2');
  expect(checkExample('[half(1), half(2)]', '[0.5]', scope)).toBe('2 entries, not 1');
  expect(checkExample('({ a: half(1), b: null })', '{ b: null }', scope)).toBeUndefined();
  expect(checkExample("String(half(1)) + 'x'", "'0.5x'", scope)).toBeUndefined();
  expect(checkExample('String(half(1))', "'0.6'", scope)).toBe('0.5 is not 0.6');
  expect(checkExample('half(NaN)', '0', scope)).toBe('NaN is not 0');
  expect(checkExample('refuse()', 'throws too far: got 3', scope)).toBeUndefined();
  expect(checkExample('refuse()', 'throws too far', scope)).toBe('threw "too far: got 3"');
  expect(checkExample('half(1)', 'throws too far', scope)).toBe('0.5 came back, nothing was thrown');
  expect(difference(undefined, undefined)).toBeUndefined();
});
