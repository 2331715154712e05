import { fitting } from '../../../workbook/engine/fitting';

test('fitting(number, characters) is the number where there is room', () => {
  expect(fitting(0.25, 11)).toBe(0.25);
  expect(fitting(-12345678901, 12)).toBe(-12345678901);
});

test('fitting(number, characters) is the nearest one that can be written', () => {
  expect(fitting(1 / 3, 11)).toBe(0.333333333);
  expect(fitting(2 / 3, 6)).toBe(0.6667);
  expect(fitting(-1.23456789e-7, 9)).toBe(-1.235e-7);
});

test('fitting(number, characters) never leaves the number for another where nothing fits', () => {
  expect(fitting(1234567, 3)).toBe(1234567);
});
