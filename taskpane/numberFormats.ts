/**
 * Number formats of cells, in the codes that spreadsheets share: a value shows no finer than its uncertainty
 * warrants. What stands in the cell keeps all its digits.
 */
import type { CellRange, CellValue } from '../functions/cell';
import type { Estimate } from './calls/estimate';
import { exponentOf, isPlain, isRounding } from '../functions/format';

/** Row by row; `null` leaves a cell's format as it is. */
export type NumberFormats = readonly (readonly (string | null)[])[];

const decimal = (decimals: number): string =>
  decimals <= 0 ? '0' : `0.${'0'.repeat(Math.min(decimals, 30))}`;
const scientific = (decimals: number): string => `${decimal(decimals)}E+00`;

/** Digits of a value of which no uncertainty is known. */
const usualDigits = 4;

/**
 * The uncertainty has two digits, and the value ends at the same decimal place.
 *
 * @param uncertainty `null` where the data leave none
 * @example numberFormat(0.48123, 0.00231) // '0.0000'
 * @example numberFormat(1.4312e-5, 3.9e-7) // '0.000E+00'
 * @see JCGM 100:2008 (GUM), 7.2.6
 */
export function numberFormat(value: number, uncertainty: number | null): string {
  if (uncertainty === null || isRounding(value, uncertainty)) return columnFormat([value]);
  const last = lastPlace(uncertainty);
  const exponent = Math.max(exponentOf(value), exponentOf(uncertainty));
  // in plain figures nothing can be left out before the point
  if (isPlain(exponent) && last <= 0) return decimal(-last);
  return scientific(exponentOf(value) - last);
}

/** The power of ten of the second digit. */
const lastPlace = (uncertainty: number): number => exponentOf(Number(uncertainty.toPrecision(2))) - 1;

/**
 * One format for numbers that belong together, with as many digits as the largest of them needs.
 *
 * @example columnFormat([0, 8.8, 58.6]) // '0.00'
 */
export function columnFormat(values: readonly number[], digits = usualDigits): string {
  const largest = values.reduce((most, value) => Math.max(most, Math.abs(value)), 0);
  const exponent = exponentOf(Number(largest.toPrecision(digits)));
  return isPlain(exponent) ? decimal(digits - 1 - exponent) : scientific(digits - 1);
}

/** Of value, standard uncertainty, limits and degrees of freedom, in the order of the standard row. */
export function standardRowFormats({
  value,
  uncertainty,
  lower,
  upper,
  degreesOfFreedom,
}: Estimate): string[] {
  const limits = [lower, upper].map((limit) => formatBeside(value, uncertainty, limit));
  const freedom = degreesOfFreedom === null || Number.isInteger(degreesOfFreedom) ? '0' : '0.0';
  return [...estimateFormats(value, uncertainty), ...limits, freedom];
}

/** Of a value and its uncertainty. */
const estimateFormats = (value: number, uncertainty: number | null): [string, string] => [
  numberFormat(value, uncertainty),
  formatBeside(value, uncertainty, uncertainty),
];

/** Of what stands beside a value, so that both end at one decimal place. */
function formatBeside(value: number, uncertainty: number | null, other: number | null): string {
  const own = numberFormat(value, uncertainty);
  const isAlike = !own.includes('E') || other === null || uncertainty === null;
  return isAlike ? own : numberFormat(other, uncertainty);
}

/** The same for a column of estimates: all rows alike, by the largest value and the middle one of their uncertainties. */
export function columnsFormats(estimates: readonly (Estimate | null)[]): string[] {
  const known = estimates.filter((one) => one !== null);
  const uncertainties = known.flatMap(({ uncertainty }) => uncertainty ?? []).sort((a, b) => a - b);
  const value = known.reduce((most, one) => Math.max(most, Math.abs(one.value)), 0);
  const uncertainty = uncertainties[Math.floor(uncertainties.length / 2)] ?? null;
  const freedom = known.find(({ degreesOfFreedom }) => !Number.isInteger(degreesOfFreedom)) ?? known[0];
  return standardRowFormats({
    value,
    uncertainty,
    lower: null,
    upper: null,
    degreesOfFreedom: freedom?.degreesOfFreedom ?? null,
  });
}

/** Columns of a table that are shares or probabilities, whatever their size. */
const shares = /weight|R²|test p|conversion/;
/** So much apart, numbers of one column have no decimals in common. */
const widest = 1000;

/** Of a table below a row of headings: each column in one format. */
export function tableColumns(headings: readonly string[], lines: CellRange): (string | null)[] {
  const column = (place: number): number[] => lines.flatMap((line) => numberIn(line[place]) ?? []);
  return headings.map((name, place) => {
    const numbers = column(place);
    return name === 'run' || numbers.length === 0 ? null : formatOfColumn(name, numbers);
  });
}

/** Of a table with its headings, each line about a law of its own: coefficients by their own uncertainties. */
export function tableFormats([headings, ...lines]: CellRange): NumberFormats {
  const names = headings.map(String);
  const columns = tableColumns(names, lines);
  const [k, u] = [names.indexOf('rate coefficient'), names.indexOf('standard uncertainty')];
  return [
    headings.map(() => null),
    ...lines.map((line) => {
      const [value, uncertainty] = [numberIn(line[k]), numberIn(line[u])];
      if (value === null) return columns;
      const [own, beside] = estimateFormats(value, uncertainty);
      return columns.map((format, place) => (place === k ? own : place === u ? beside : format));
    }),
  ];
}

function formatOfColumn(name: string, numbers: readonly number[]): string {
  if (name === 'order') return decimal(2);
  if (shares.test(name)) return decimal(3);
  const sizes = numbers.map(Math.abs).filter((size) => size > 0);
  const isWide = Math.max(...sizes) > widest * Math.min(...sizes);
  const digits = name === 'standard uncertainty' ? 2 : usualDigits;
  return isWide ? scientific(digits - 1) : columnFormat(numbers, digits);
}

const numberIn = (cell: CellValue | undefined): number | null => (typeof cell === 'number' ? cell : null);

export const numbersIn = (rows: CellRange): number[] =>
  rows.flatMap((row) => row.filter((cell) => typeof cell === 'number'));

/** The same row of formats for every row. */
export const everyRow = (formats: readonly (string | null)[], rows: number): NumberFormats =>
  Array.from({ length: rows }, () => formats);

export const turned = (formats: NumberFormats): NumberFormats =>
  formats[0].map((_, column) => formats.map((row) => row[column]));
