import { applyEdits, insertion } from '../../../workbook/xlsx/edits';
import { packageOf, rowsOf, worksheet } from './package';
import { recalculated } from './patched';

test('an insertion comes before what is replaced at the same place, in whatever order they are given', () => {
  const edits = [{ start: 3, end: 6, text: 'NEW' }, insertion(3, '+')];
  expect(applyEdits('abcdefghi', edits)).toBe('abc+NEWghi');
  expect(applyEdits('abcdefghi', [...edits].reverse())).toBe('abc+NEWghi');
  expect(applyEdits('abc', [insertion(1, '1'), insertion(1, '2')])).toBe('a12bc');
});

test('overlapping edits are a fault, not a loss', () => {
  const edits = [
    { start: 0, end: 4, text: 'x' },
    { start: 3, end: 6, text: 'y' },
  ];
  expect(() => applyEdits('abcdefghi', edits)).toThrow('two changes overlap at character 3');
});

test('a spilled cell that is added right before a changed cell leaves one of each', async () => {
  const before =
    '<row r="1"><c r="A1"><f>PACE.EVENT({40;25})</f></c></row><row r="2"><c r="B2"><f>1+1</f></c></row>';
  const after = rowsOf(await recalculated(packageOf({ sheets: { Run: worksheet(before) } })));
  expect(after.match(/<c r="A2"/g)).toHaveLength(1);
  expect(after.match(/<c r="B2"/g)).toHaveLength(1);
  expect(after).toContain('<c r="A2"><v>0.04</v></c><c r="B2"><f>1+1</f><v>2</v></c>');
});
