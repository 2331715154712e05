/** COURSE and FITCOURSE as cells see them: shapes, gaps, detail and words. */
import { CellError, isRange, type CellRange, type CellValue } from '../../functions/cell';
import { calculate, errorOf } from '../support/literal';

function rows(formula: string): CellRange {
  const result = calculate(formula);
  if (!isRange(result)) throw new Error(`${formula} is one cell: ${JSON.stringify(result)}`);
  return result;
}

const close = (cell: CellValue, value: number, digits = 8): void => {
  expect(typeof cell).toBe('number');
  expect(Math.abs((cell as number) / value - 1)).toBeLessThan(10 ** -digits);
};

describe('PACE.COURSE', () => {
  test('rows stand beside a column of times, columns beneath a row of times', () => {
    const down = rows('=PACE.COURSE("A -> B",0.1,{1;0},{0;10;20})');
    const across = rows('=PACE.COURSE("A -> B",0.1,{1;0},{0,10,20})');
    expect(down).toHaveLength(3);
    expect(across).toHaveLength(2);
    down.forEach((row, i) => row.forEach((cell, j) => expect(across[j][i]).toBe(cell)));
    close(down[1][0], Math.exp(-1));
    close(down[2][1], 1 - Math.exp(-2));
  });

  test('a gap among the times stays empty in its place', () => {
    const [first, gap, last] = rows('=PACE.COURSE("A -> B",0.1,{1;0},{0;;20})');
    expect(first).toEqual([1, 0]);
    expect(gap).toEqual(['', '']);
    close(last[0], Math.exp(-2));
  });

  test('one time is one row, and steps may stand a cell each', () => {
    const [row] = rows('=PACE.COURSE({"A -> B";"";"B <-> C"},{0.1;0.2;0.3},{1,0,0},1E9)');
    expect(row).toHaveLength(3);
    close(row[1], 0.6);
    close(row[2], 0.4);
    expect(row[0]).toBeCloseTo(0, 12);
  });

  test.each([
    [
      '=PACE.COURSE("A+B -> C",1,{1;1;0},1)',
      '#VALUE! scheme must join species by a plus with a space on each side: "A+B" at character 1 of "A+B -> C"',
    ],
    ['=PACE.COURSE(5,1,{1;0},1)', '#VALUE! scheme must be text: got 5'],
    ['=PACE.COURSE({"A -> B";#REF!},1,{1;0},1)', '#REF! '],
    [
      '=PACE.COURSE("A <-> B",{1;},{1;0},1)',
      '#VALUE! coefficients must have no gaps: row 2, for coefficient 2 (B -> A), holds no number',
    ],
    [
      '=PACE.COURSE("A <-> B",1,{1;0},1)',
      '#VALUE! coefficients must be one for each direction of each step: none for coefficient 2 (B -> A)',
    ],
    ['=PACE.COURSE("A -> B",1,{1;},1)', '#VALUE! initial must have no gaps: row 2, for B, holds no number'],
    [
      '=PACE.COURSE("A -> B",1,1,1)',
      '#VALUE! initial must hold one concentration a species, in the order A, B: none for B',
    ],
    [
      '=PACE.COURSE("A -> B",1,{1;0},{0;;-5})',
      '#VALUE! times must be 0 or later, since initial belongs to time 0: row 3 (-5)',
    ],
    [
      '=PACE.COURSE("A -> B",1,{1;0},{0,1;2,3})',
      '#VALUE! times must be one column or one row: got 2 rows of 2 cells',
    ],
  ])('%s says %s', (formula, words) => expect(errorOf(formula)).toBe(words));
});

describe('PACE.FITCOURSE', () => {
  test('columns with gaps and a species that was not observed', () => {
    // A = 8·2^(−t/10), B = 8 − A, C not looked at
    const [row] = rows('=PACE.FITCOURSE("A -> B",{1},{8;0},{0;10;;20;30},{8,0;,4;1,1;2,;1,7})');
    close(row[0], Math.LN2 / 10);
  });

  test('times in a row take their readings in rows', () => {
    const [row] = rows('=PACE.FITCOURSE("A -> B",{1},{8,0},{0,10,20,30},{8,4,2,1;,,,})');
    close(row[0], Math.LN2 / 10);
  });

  test('detail: a standard row a coefficient, and what it moves with', () => {
    const table = rows(
      '=PACE.FITCOURSE("A <-> B",{0.1;0.1},{1;0},{0;5;10;15},{1,;0.8649,;0.7549,;0.6662,},TRUE)',
    );
    expect(table).toHaveLength(2);
    for (const row of table) {
      expect(row).toHaveLength(6);
      const [value, uncertainty, lower, upper, freedom] = row as number[];
      expect(uncertainty).toBeGreaterThan(0);
      expect(lower).toBeLessThan(value);
      expect(upper).toBeGreaterThan(value);
      expect(freedom).toBe(2);
    }
    expect(table[0][5]).toMatch(/^moves with coefficient 2 \(B -> A\), r = 0\.9\d\d$/);
    expect(table[1][5]).toMatch(/^moves with coefficient 1 \(A -> B\), r = 0\.9\d\d$/);
  });

  test('a coefficient that the readings cannot tell is #N/A and says why; the others stand', () => {
    const formula = '=PACE.FITCOURSE("A -> B -> C",{1;1},{8;0;0},{0;10;20;30},{8.1,,;3.9,,;2.1,,;1,,}';
    const [row] = rows(`${formula})`);
    expect(row[0]).toBeCloseTo(0.0693, 2);
    expect(row[1]).toBeInstanceOf(CellError);
    expect(row[1]).toMatchObject({
      code: '#N/A',
      message: 'coefficient 2 (B -> C) cannot be told: the readings hardly depend on it',
    });
    const detailed = rows(`${formula},TRUE)`);
    expect(detailed[0].slice(0, 5).every((cell) => typeof cell === 'number')).toBe(true);
    expect(detailed[1].slice(0, 5).every((cell) => cell instanceof CellError)).toBe(true);
  });

  test.each([
    [
      '=PACE.FITCOURSE("A -> B",0,{1;0},{0;1},{1,;0.5,})',
      '#VALUE! coefficients must be start values above 0: coefficient 1 (A -> B) (0)',
    ],
    [
      '=PACE.FITCOURSE("A -> B",1,{1;0},{0;1},{1;0.5})',
      '#VALUE! observed must have a column for each of 2 species (A, B): got 1',
    ],
    [
      '=PACE.FITCOURSE("A -> B",1,{1;0},{0;1;2},{1,;0.5,})',
      '#VALUE! observed must have 3 rows, as many as times: got 2 rows of 2 cells',
    ],
    ['=PACE.FITCOURSE("A -> B",1,{1;0},{0;1},{,;,})', '#VALUE! observed must hold readings: none was found'],
    ['=PACE.FITCOURSE("A -> B",1,{1;0},{0;1},{1,;#DIV/0!,})', '#DIV/0! '],
    [
      '=PACE.FITCOURSE("A -> B",1,{1;0},{0;-1},{1,;0.5,})',
      '#VALUE! times must be 0 or later, since initial belongs to time 0: row 2 (-1)',
    ],
  ])('%s says %s', (formula, words) => expect(errorOf(formula)).toBe(words));
});
