import type { CellValue } from '../../functions/cell';
import { calculate, errorOf } from '../support/literal';

const rows = (formula: string): CellValue[][] => calculate(formula) as CellValue[][];

/** Rate coefficients of 2 HI → H₂ + I₂ from 281.85 to 507.85 °C: OpenStax Chemistry 2e, 12.5. */
const hydrogenIodide = '{281.85;301.85;371.85;426.85;507.85},{3.52E-7;1.22E-6;8.59E-5;1.16E-3;3.95E-2}';
const inKelvin = '{"555 K";"575 K";"645 K";"700 K";"781 K"},{3.52E-7;1.22E-6;8.59E-5;1.16E-3;3.95E-2}';

describe('PACE.ARRHENIUS', () => {
  test('kelvin as text, in kJ/mol; detail gives Ea and ln A with limits', () => {
    const [energy, factor] = rows(`=PACE.ARRHENIUS(${inKelvin},,TRUE)`);
    // worked out at fifty digits: tests/reference/temperature.json, HI-arrhenius-ols
    const expected = [185.30785531536, 2.177390722037, 178.378426256853, 192.237284373867, 3];
    expected.forEach((value, i) => expect(energy[i]).toBeCloseTo(value, 9));
    expect(factor[0]).toBeCloseTo(25.20382245771, 10);
    expect(factor[4]).toBe(3);
  });

  test('a column and a row, °C and text, with a gap: one answer', () => {
    const column = calculate('=PACE.ARRHENIUS({5;15;25;40},{1;3;8;33})');
    expect(calculate('=PACE.ARRHENIUS({5,15,25,40},{1,3,8,33})')).toBe(column);
    expect(calculate('=PACE.ARRHENIUS({"41 degF";"15";"25 °C";40},{1;3;8;33})')).toBeCloseTo(
      column as number,
      9,
    );
    expect(calculate('=PACE.ARRHENIUS({5;15;20;25;"lost";40},{1;3;;8;9;33})')).toBe(column);
  });

  test('uncertainties: "relative" is the rule without any; others weigh', () => {
    const plain = calculate('=PACE.ARRHENIUS({5;15;25;40},{1;3;8;33})') as number;
    expect(calculate('=PACE.ARRHENIUS({5;15;25;40},{1;3;8;33},"relative")')).toBeCloseTo(plain, 10);
    // a coefficient known a thousand times worse has no say: 25 and 40 °C remain with 5
    const without = calculate('=PACE.ARRHENIUS({5;25;40},{1;8;33})') as number;
    const weighed = calculate('=PACE.ARRHENIUS({5;15;25;40},{1;3;8;33},{0.01;30;0.08;0.33})');
    expect(weighed).toBeCloseTo(without, 3);
    expect(Math.abs(without - plain)).toBeGreaterThan(0.01);
  });

  test('two temperatures: a value, and #N/A for what they cannot tell', () => {
    const [[value, uncertainty, , , degrees]] = rows('=PACE.ARRHENIUS({25;35},{1;2},,TRUE)');
    expect([value, degrees]).toEqual([expect.closeTo(52.94886216572, 9), 0]);
    expect(uncertainty).toMatchObject({
      code: '#N/A',
      message: expect.stringMatching(/^no degrees of freedom/),
    });
  });

  test.each([
    [
      '{555;575;645},{1;2;3}',
      '#VALUE! temperatures must be in degC: all lie above 200, from 555 to 645, which look like kelvin; take off 273.15, or write a unit in each cell, "298.15 K" or "298.15 degC"',
    ],
    ['{25;-300},{1;2}', '#VALUE! temperatures must be above -273.15: row 2 (-300 degC)'],
    ['{25;"-5 K"},{1;2}', '#VALUE! temperatures must not be below absolute zero: got -5 K, in row 2'],
    [
      '{25;"7 bar"},{1;2}',
      '#VALUE! temperatures must be in a unit like degC: 7 bar measures something else, in row 2',
    ],
    ['{25;35},{1;-2}', '#VALUE! coefficients must be above 0: row 2 (-2)'],
    ['{25,35},{0,2}', '#VALUE! coefficients must be above 0: column 1 (0)'],
    ['{25;35},{1;2;3}', '#VALUE! coefficients must be as many as temperatures: got 3 for 2'],
    ['{25;35},{1;2},{1;2;3}', '#VALUE! uncertainties must be as many as temperatures: got 3 for 2'],
    ['{25;35},{1;2},{0.1;0}', '#VALUE! uncertainties must be above 0 for every reading: row 2 (0)'],
    ['{25;25},{1;2}', '#VALUE! temperatures must differ: all 2 are 298.15 K, 25 degC'],
    ['{25;"298.15 K";"77 degF"},{1;2;3}', '#VALUE! temperatures must differ: all 3 are 298.15 K, 25 degC'],
    ['25,1', '#N/A an activation energy needs coefficients at two temperatures: got 1'],
    [
      '{25;"x"},{"y";2}',
      '#VALUE! temperatures and coefficients must hold numbers: no temperature and coefficient make a pair',
    ],
    ['{25,35;45,55},{1;2;3;4}', '#VALUE! temperatures must be one column or one row: got 2 rows of 2 cells'],
    ['{25;#DIV/0!},{1;2}', '#DIV/0! '],
  ])('(%s) is refused: %s', (args, message) => expect(errorOf(`=PACE.ARRHENIUS(${args})`)).toBe(message));

  test('above 200 °C with a unit, or in a column that starts lower, is taken as it stands', () => {
    expect(calculate('=PACE.ARRHENIUS({"225 degC";"235 degC"},{1;2})')).toBeGreaterThan(0);
    expect(calculate('=PACE.ARRHENIUS({190;210},{1;2})')).toBeGreaterThan(0);
  });
});

describe('PACE.EYRING', () => {
  test('a row, or three standard rows', () => {
    const [row] = rows(`=PACE.EYRING(${inKelvin})`);
    const detail = rows(`=PACE.EYRING(${inKelvin},,TRUE)`);
    // tests/reference/temperature.json, HI-eyring-ols
    [179.894302009434, -50.242307082655, 194.874045866128].forEach((value, i) => {
      expect(row[i]).toBeCloseTo(value, 9);
      expect(detail[i][0]).toBe(row[i]);
    });
    [2.062797109165, 3.242600464644, 1.109685746942].forEach((u, i) =>
      expect(detail[i][1]).toBeCloseTo(u, 9),
    );
  });

  test('says what it needs', () => {
    expect(errorOf('=PACE.EYRING(25,1)')).toBe(
      '#N/A an enthalpy of activation needs coefficients at two temperatures: got 1',
    );
  });
});

describe('PACE.COEFFICIENTAT', () => {
  test('detail ends with what lies outside the temperatures measured', () => {
    const at = (temperature: string): CellValue[] =>
      rows(`=PACE.COEFFICIENTAT(${hydrogenIodide.replace('281.85', '"555 K"')},${temperature},,TRUE)`)[0];
    // ln k and its limits: tests/reference/temperature.json, HI-arrhenius-ols
    const [k, u, lower, upper, degrees, remark] = at('"651.2 K"');
    expect(Math.log(k as number)).toBeCloseTo(-9.021319075911, 8);
    expect((u as number) / (k as number)).toBeCloseTo(0.050925699709, 9);
    expect(Math.log(lower as number)).toBeCloseTo(-9.183387380795, 8);
    expect(Math.log(upper as number)).toBeCloseTo(-8.859250771027, 8);
    expect([degrees, remark]).toEqual([3, '']);
    expect(at('25')[5]).toBe('extrapolated');
    expect(Math.log(at('25')[0] as number)).toBeCloseTo(-49.548524235882, 8);
    expect(at('"555 K"')[5]).toBe('');
    expect(at('508')[5]).toBe('extrapolated');
  });

  test('a rate that doubles every 10 °C is four times as fast 20 °C on, about', () => {
    // OpenStax Chemistry 2e, 12.5: a factor of 4 from 25 to 45 °C; Arrhenius falls short of it as it warms
    const factor = calculate('=PACE.COEFFICIENTAT({25;35},{1;2},45)') as number;
    expect(factor).toBeLessThan(4);
    expect(factor).toBeGreaterThan(3.8);
  });

  test('kelvin among degrees Celsius is questioned; a hot but honest question is not', () => {
    expect(errorOf('=PACE.COEFFICIENTAT({20;40;60},{1;4;14},298.15)')).toBe(
      '#VALUE! temperature must be in degC: 298.15 looks like kelvin beside 20 to 60 degC; write 25, or the unit with it, "298.15 K" or "298.15 degC"',
    );
    expect(calculate('=PACE.COEFFICIENTAT({20;40;60},{1;4;14},"298.15 K")')).toBeCloseTo(
      calculate('=PACE.COEFFICIENTAT({20;40;60},{1;4;14},25)') as number,
      12,
    );
    expect(calculate('=PACE.COEFFICIENTAT({20;40;60},{1;4;14},"298.15 degC")')).toBeGreaterThan(1e3);
    expect(calculate('=PACE.COEFFICIENTAT({150;170;190},{1;4;14},210)')).toBeGreaterThan(14);
  });

  test('text that is no temperature is refused', () => {
    expect(errorOf('=PACE.COEFFICIENTAT({20;40},{1;4},"warm")')).toBe(
      '#VALUE! temperature must be a number or text with a unit: got the text "warm"',
    );
    expect(errorOf('=PACE.COEFFICIENTAT({20;40},{1;4},{25;30})')).toBe(
      '#VALUE! temperature must be one value: got 2 × 1 cells',
    );
    expect(errorOf('=PACE.COEFFICIENTAT({20;40},{1;400},-270)')).toMatch(
      /^#N\/A rate coefficient must be a number that can be held: ln k is -/,
    );
  });
});

describe('PACE.MEANTEMP', () => {
  test('a constant temperature is its own mean', () => {
    expect(calculate('=PACE.MEANTEMP({25;25;25})')).toBeCloseTo(25, 10);
    expect(calculate('=PACE.MEANTEMP({"298.15 K";25;"77 degF"},{0;1;7})')).toBeCloseTo(25, 10);
    expect(calculate('=PACE.MEANTEMP(25)')).toBeCloseTo(25, 10);
    expect(calculate('=PACE.MEANTEMP({25;""},{3;4})')).toBeCloseTo(25, 10);
  });

  test('unequal intervals count as long as they last, in whatever order', () => {
    // 20 °C until halfway to the reading of 30 °C: 2 of 3 in the one, 4 of 5 in the other
    const twoToOne = calculate('=PACE.MEANTEMP({20;20;30})') as number;
    const fourToOne = calculate('=PACE.MEANTEMP({20;20;20;20;30})') as number;
    expect(calculate('=PACE.MEANTEMP({30;20;20},{3;0;1})')).toBeCloseTo(twoToOne, 10);
    expect(calculate('=PACE.MEANTEMP({20;20;30},{0;3;5})')).toBeCloseTo(fourToOne, 10);
    expect(fourToOne).toBeLessThan(twoToOne - 1);
  });

  test('a gap is shared by its neighbours', () => {
    const whole = calculate('=PACE.MEANTEMP({20;26;26;31},{0;1;5;6})');
    expect(calculate('=PACE.MEANTEMP({20;26;"lost";;26;31},{0;1;2;3;5;6})')).toBe(whole);
    expect(calculate('=PACE.MEANTEMP({20;"lost";30})')).toBe(calculate('=PACE.MEANTEMP({20;30})'));
  });

  test('the energy carries its unit, and a higher one heeds the warm hours more', () => {
    const usual = calculate('=PACE.MEANTEMP({20;30})') as number;
    expect(calculate('=PACE.MEANTEMP({20;30},,83.144)')).toBe(usual);
    expect(calculate('=PACE.MEANTEMP({20;30},,"83144 J/mol")')).toBeCloseTo(usual, 10);
    expect(calculate('=PACE.MEANTEMP({20;30},,"19.871893 kcal/mol")')).toBeCloseTo(usual, 6);
    expect(calculate('=PACE.MEANTEMP({20;30},,120)')).toBeGreaterThan(usual);
  });

  test.each([
    ['{"a";"b"}', '#VALUE! temperatures must hold numbers: none was found'],
    ['{20;30},{"a";"b"}', '#VALUE! temperatures and times must hold numbers: no two make a pair'],
    ['{20;30},{1;2;3}', '#VALUE! times must be as many as temperatures: got 3 for 2'],
    ['{20;30},{1;1}', '#VALUE! times must differ: all 2 are 1'],
    ['{293;303}', expect.stringMatching(/^#VALUE! temperatures must be in degC: all lie above 200/)],
    ['{20;30},,0', '#VALUE! energy must be above 0: got 0 kJ/mol'],
  ])('(%s) is refused', (args, message) => expect(errorOf(`=PACE.MEANTEMP(${args})`)).toEqual(message));
});

describe('PACE.TIMETO', () => {
  test('half of a first-order reactant, as in print', () => {
    // a half life of 6.00 h, 21 600 s, belongs to 3.21e-5 per second: OpenStax Chemistry 2e, 12.4
    const time = calculate('=PACE.TIMETO(0.5,3.21E-5,1)') as number;
    expect(Number(time.toPrecision(6))).toBe(21593.4);
    expect(Number(time.toPrecision(3))).toBe(21600);
  });

  test.each([
    ['0.5,0.1,2', '#VALUE! initial is needed for every order but 1: the order is 2'],
    ['1,0.1,1', '#VALUE! fraction must be above 0 and below 1: got 1'],
    ['0.5,0,1', '#VALUE! coefficient must be above 0: got 0'],
    ['0.5,0.1,2,0', '#VALUE! initial must be above 0: got 0 mol/L'],
    ['0.5,0.1,400,0.001', '#N/A time must be a number that can be held: it is not for order 400'],
  ])('(%s) is refused: %s', (args, message) => expect(errorOf(`=PACE.TIMETO(${args})`)).toBe(message));
});
