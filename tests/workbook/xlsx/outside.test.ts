/** What a workbook takes from other workbooks and add-ins is not at hand: it keeps what the file last showed. */
import { recalculate } from '../../../workbook/commands/recalculate';
import { handOver } from '../../../workbook/handover/handOver';
import { reachesOutside } from '../../../workbook/xlsx/outside';
import { packageOf, rowsOf, textOf, worksheet } from './package';
import { dynamic, recalculated } from './patched';

test.each([
  ['[2]Data!A1*2', true],
  ["SUM('[2]My ''data'''!$A$1:B9)", true],
  ['[1]!rate', true],
  ['[1]!OTHER(A1)', true],
  ['[3]Data!#REF!', true],
  ['_xldudf_OTHER_RATE(A1)', true],
  ['"[2]Data!A1"&A1', false],
  ['Table1[2]+Table1[[#This Row],[3]]', false],
  ['PACE.EVENT(A1)', false],
])('%s reaches outside: %s', (formula, reaches) => expect(reachesOutside(formula)).toBe(reaches));

describe('recalculated', () => {
  const names =
    '<definedNames><definedName name="rate">[1]Data!$A$1</definedName><definedName name="twice">Rate*2</definedName></definedNames>';
  const kept = (formula: string): string => `<row r="1"><c r="A1"><f>${formula}</f><v>7</v></c>`;
  const after = async (rows: string): Promise<string> =>
    rowsOf(await recalculated(packageOf({ sheets: { Run: worksheet(rows) }, names })));

  test.each([
    '[1]Data!A1',
    'TWICE+1',
    '_xldudf_OTHER_RATE(2)',
    '[1]!OTHER(2)',
    '[1]!_xldudf_PACE_EVENT([2]Data!A1)',
  ])('%s keeps its value, and others go by it', async (formula) => {
    expect(await after(`${kept(formula)}<c r="B1"><f>A1*2</f></c></row>`)).toBe(
      `${kept(formula)}<c r="B1"><f>A1*2</f><v>14</v></c></row>`,
    );
  });

  test('what it spilled is there for others too', async () => {
    const spilled = `<row r="1"><c r="A1" cm="1">${dynamic('A1:A2', '[1]Data!A1:A2')}<v>7</v></c></row><row r="2"><c r="A2"><v>8</v></c>`;
    expect(await after(`${spilled}<c r="B2"><f>SUM(A1:A2)</f></c></row>`)).toBe(
      `${spilled}<c r="B2"><f>SUM(A1:A2)</f><v>15</v></c></row>`,
    );
  });

  test('without a value it is an error, and a count tells of the others', async () => {
    const { formulas, kept, errors } = await recalculate(
      packageOf({
        sheets: {
          Run: worksheet(
            '<row r="1"><c r="A1"><f>[1]Data!A1</f></c><c r="B1"><f>[1]Data!A1</f><v>7</v></c></row>',
          ),
        },
      }),
    );
    expect([formulas, kept, errors.length]).toEqual([1, 1, 1]);
  });
});

test('handed over, a call of ours is frozen to it, and the rest stays', async () => {
  const rows =
    '<row r="1"><c r="A1"><f>[1]!_xldudf_PACE_EVENT([2]Data!A1)</f><v>7</v></c><c r="B1"><f>[2]Data!A1</f><v>8</v></c></row>';
  const { bytes, formulas } = await handOver(packageOf({ sheets: { Run: worksheet(rows) } }), {
    version: '1.2.3',
    date: '2026-12-01',
  });
  expect(formulas.map(({ why }) => why)).toEqual(['it needs another workbook or add-in, or dates from 1904']);
  expect(rowsOf(bytes)).toBe(
    '<row r="1"><c r="A1"><v>7</v></c><c r="B1"><f>[2]Data!A1</f><v>8</v></c></row>',
  );
  const method = textOf(bytes, 'xl/worksheets/sheet2.xml');
  expect(method).toContain('=PACE.EVENT([2]Data!A1)');
  expect(method).toContain('not watched');
});
