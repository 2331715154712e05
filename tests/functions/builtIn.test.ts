/** Calls said in built-in functions: the text itself. That it comes to the same is tested where programs work it out. */
import { parseArea } from '../../functions/address';
import { Given } from '../../functions/builtIn/given';
import { NotSaid, type Argument, type Said } from '../../functions/builtIn/said';
import { fixedArea, numberText, where } from '../../functions/builtIn/text';
import { functionNamed } from '../../functions/catalogue';
import type { CellRange, CellValue } from '../../functions/cell';

const range = (text: string, ...column: CellValue[]): Argument => ({
  text,
  area: parseArea(text)!,
  cells: column.map((cell) => [cell]),
});
const literal = (text: string, value: CellValue): Argument => ({ text, cells: [[value]] as CellRange });

function say(name: string, args: Readonly<Record<string, Argument>>): Said {
  const f = functionNamed(name)!;
  return f.builtIn!(new Given(f.parameters, args));
}

test('numberText(value) writes small numbers out, and puts negative ones in brackets', () => {
  expect([3, 0.02, -8, 1e-7, -2.5e-7, 6.02214076e23].map(numberText)).toEqual([
    '3',
    '0.02',
    '(-8)',
    '0.0000001',
    '(-0.00000025)',
    '6.02214076E+23',
  ]);
  for (const value of [3.21e-5, 1e-15, 1.5e-14, 123456.789, 5e-300, 1e21])
    expect(Number(numberText(value))).toBe(value);
});

test('where(conditions, result) asks for each condition once, and for none where there is none', () => {
  expect(where([], 'A1')).toBe('A1');
  expect(where(['A1>0', 'A1>0'], '1/A1')).toBe('IF(A1>0,1/A1,#VALUE!)');
  expect(where(['A1>0', 'B1>0'], '1/A1')).toBe('IF(AND(A1>0,B1>0),1/A1,#VALUE!)');
});

test('fixedArea(area) names its sheet, and does not move', () => {
  expect(fixedArea(parseArea("'Gas run'!B2:B9")!)).toBe("'Gas run'!$B$2:$B$9");
  expect(fixedArea(parseArea('B2')!)).toBe('$B$2');
});

test('a conversion takes each reading by its own cell, and all of them within another formula', () => {
  const said = say('TITRE', {
    volumes: range('A2:A3', 12.4, 8.2),
    titrant: literal('"20 mmol/L"', '20 mmol/L'),
    aliquot: literal('10', 10),
  });
  const guard = 'COUNTIF($A$2:$A$3,"<0")=0';
  const gap = 'IF(ISNUMBER(VALUE(SUBSTITUTE(SUBSTITUTE(A3,".",""),",",""))),#VALUE!,"")';
  expect(said.cell!(1, 0)).toBe(`IF(${guard},IF(ISNUMBER(A3),0.02*A3/10,IF(ISERROR(A3),A3,${gap})),#VALUE!)`);
  expect(said.whole!()).toContain('0.02*$A$2:$A$3/10');
});

test('a quantity with its unit in a cell must keep the unit', () => {
  const { cell } = say('TITRE', {
    volumes: range('A2', 12.4),
    titrant: range('B1', '20 mmol/L'),
    aliquot: literal('10', 10),
  });
  expect(cell!(0, 0)).toContain('EXACT(RIGHT(B1,7)," mmol/L")');
  expect(cell!(0, 0)).toContain('/1000');
});

test.each<[string, string, Readonly<Record<string, Argument>>, RegExp]>([
  [
    'numbers written as text',
    'CONVERSION',
    { readings: range('A1:A2', 1, '2,5'), start: literal('1', 1), end: literal('0', 0) },
    /readings holds numbers written as text/,
  ],
  [
    'a start that is no number',
    'CONVERSION',
    { readings: range('A1', 1), start: range('B1', 'one'), end: literal('0', 0) },
    /start is not a number/,
  ],
  [
    'an average rate with its limits, where there is no room aside',
    'BETWEEN',
    {
      times: range('A1:A3', 0, 1, 2),
      values: range('B1:B3', 3, 2, 1),
      from: literal('0', 0),
      to: literal('1', 1),
      detail: literal('TRUE', true),
    },
    /there is no sheet for its workings/,
  ],
  [
    'columns that lie differently',
    'ARRHENIUS',
    { temperatures: range('A1:A3', 25, 35, 45), coefficients: range('B1:B2', 1, 2) },
    /temperatures and coefficients do not lie alike/,
  ],
])('%s: not said, with the reason', (_, name, args, words) => {
  expect(() => say(name, args)).toThrow(NotSaid);
  expect(() => say(name, args)).toThrow(words);
});
