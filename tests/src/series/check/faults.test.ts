/** Invented columns, built to have exactly one fault each: exactly that finding comes. */
import { kindsBySeverity } from '../../../../src/series/check/finding';
import { findings } from '../../../../src/series/check/findings';
import type { RawCell } from '../../../../src/series/check/rawRun';
import { printed, replaced, tens, wobbling } from '../../../support/invented';
import { cells } from './faults/cells';
import { course } from './faults/course';
import { clean, read } from './faults/fault';
import { readings } from './faults/readings';
import { times as slips } from './faults/times';

const faults = [...cells, ...slips, ...readings, ...course];

test.each(faults)(
  'findings: $name gives "$kind" and nothing else',
  ({ kind, places, says, times = tens, values = clean }) => {
    const found = findings({ times, values });
    expect(found.map((finding) => finding.kind)).toEqual([kind]);
    expect(found[0].finding).toMatch(says);
    if (places) expect(found[0].places).toEqual(places);
  },
);

test.each(faults)('findings: $name is said in words a cell can show', ({ times = tens, values = clean }) => {
  for (const { finding, meaning, advice } of findings({ times, values })) {
    for (const words of [finding, meaning, advice]) {
      expect(words).toMatch(/^\S.{4,}[^.\s]$/);
      expect(words).not.toMatch(/NaN|Infinity|undefined|null/);
      expect(words.length).toBeLessThan(500);
    }
  }
});

test('findings: every kind of finding has its fault here', () => {
  expect(kindsBySeverity.filter((kind) => !faults.some((fault) => fault.kind === kind))).toEqual([]);
});

test('findings: several faults come each once, what spoils a result first standing first', () => {
  const values = replaced<RawCell>(
    clean,
    [3, { text: '0,567', readAs: 0.567 }],
    [8, printed(read(8) + 0.06)],
    [12, null],
    [16, { error: '#N/A' }],
  );
  const found = findings({ times: tens, values: values.map((cell, row) => (row === 12 ? null : cell)) });
  expect(found.map(({ kind }) => kind)).toEqual(['error', 'outlier', 'number read from text', 'gap']);
});

test('findings: an endpoint other than 0 is named, and 0 warned of, where a falling run ends on a level', () => {
  const [found] = findings({
    times: tens,
    values: wobbling((time) => 0.2 + 0.6 * 2 ** (-time / 18), tens, 0.4),
  });
  expect(found.meaning).toMatch(/an end of 0, taken when none is given, would spoil/);
  expect(found.advice).toMatch(/^give 0\.2\d*, or "free", as the endpoint/);
});

test('findings: columns of different length are refused', () => {
  expect(() => findings({ times: [0, 1], values: [3] })).toThrow(
    'times and values must be of one length: got 2 times and 1 values',
  );
});
