/** Numbers as a chemist writes them: value ± standard uncertainty, digits no finer than it warrants. */

const superscripts: Readonly<Record<string, string>> = {
  '-': '⁻',
  '0': '⁰',
  '1': '¹',
  '2': '²',
  '3': '³',
  '4': '⁴',
  '5': '⁵',
  '6': '⁶',
  '7': '⁷',
  '8': '⁸',
  '9': '⁹',
};

const raised = (exponent: number): string => [...String(exponent)].map((sign) => superscripts[sign]).join('');
const minus = (text: string): string => text.replace(/-/g, '−');
/** Of ten, in the first digit of a number; 0 for 0. */
export const exponentOf = (value: number): number =>
  value === 0 ? 0 : Number(value.toExponential(11).split('e')[1]);

/** Beyond these powers of ten a number is written with one. */
export const isPlain = (exponent: number): boolean => exponent >= -3 && exponent <= 4;

/** @example plainNumber(0.000123456) // '1.235 × 10⁻⁴' */
export function plainNumber(value: number, digits = 4): string {
  const exponent = exponentOf(Number(value.toPrecision(digits)));
  if (isPlain(exponent)) return minus(String(Number(value.toPrecision(digits))));
  return `${minus(String(Number((value / 10 ** exponent).toPrecision(digits))))} × 10${raised(exponent)}`;
}

/**
 * The numbers along an axis, counted in one power of ten where plain ones would not fit beside it.
 *
 * @example axisNumbers([0, 0.0002, 0.0004]) // { numbers: ['0', '2', '4'], times: '× 10⁻⁴' }
 */
export function axisNumbers(values: readonly number[]): { numbers: string[]; times: string } {
  const exponent = exponentOf(values.reduce((most, value) => Math.max(most, Math.abs(value)), 0));
  const power = isPlain(exponent) ? 0 : exponent;
  const numbers = values.map((value) => minus(String(Number((value / 10 ** power).toPrecision(4)))));
  return { numbers, times: power === 0 ? '' : `× 10${raised(power)}` };
}

/** What is left of an uncertainty by the rounding of the arithmetic, as in invented data without scatter. */
export const isRounding = (value: number, uncertainty: number): boolean =>
  uncertainty <= 1e-10 * Math.abs(value) || !Number.isFinite(uncertainty);

/**
 * The uncertainty to two digits, the value to the same decimal place.
 *
 * @param uncertainty a standard uncertainty; `null` where the data leave none; one of mere rounding is not shown
 * @example valueWithUncertainty(0.48123, 0.00231) // '0.4812 ± 0.0023'
 * @see JCGM 100:2008 (GUM), 7.2.6
 */
export function valueWithUncertainty(value: number, uncertainty: number | null): string {
  if (uncertainty === null || isRounding(value, uncertainty)) return plainNumber(value);
  const exponent = Math.max(exponentOf(value), exponentOf(uncertainty));
  const power = isPlain(exponent) ? 0 : exponent;
  const lastDigit = exponentOf(Number(uncertainty.toPrecision(2))) - 1;
  const decimals = Math.max(0, power - lastDigit);
  const written = (x: number): string => minus(atPlace(x, lastDigit, power).toFixed(Math.min(decimals, 100)));
  const both = `${written(value)} ± ${written(uncertainty)}`;
  return power === 0 ? both : `(${both}) × 10${raised(power)}`;
}

/** Rounded at a decimal place, then counted in a power of ten. */
function atPlace(value: number, place: number, power: number): number {
  if (place <= power) return value / 10 ** power;
  return (Math.round(value / 10 ** place) * 10 ** place) / 10 ** power;
}
