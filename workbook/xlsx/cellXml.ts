/** A cell's value as a file holds it. */
import { cellName } from '../../functions/address';
import { CellError, type CellValue, type ErrorCode } from '../../functions/cell';
import { childOf, type ScannedCell } from './sheetScan';
import { plainText, xmlAttribute, xmlText } from './xml';

/** The errors that the format itself knows (ISO/IEC 29500-1, 18.18.11). */
export const filedErrors: ReadonlySet<string> = new Set([
  '#NULL!',
  '#DIV/0!',
  '#VALUE!',
  '#REF!',
  '#NAME?',
  '#NUM!',
  '#N/A',
]);

/** Younger errors (#SPILL!, #CALC!) stand as #VALUE! in the cell, as Excel itself writes them. */
const filedError = (code: ErrorCode): string => (filedErrors.has(code) ? code : '#VALUE!');

interface Written {
  /** The cell's `t`; left out for a number. */
  readonly type?: string;
  readonly text: string;
}

/** A formula's result; `null` is no value at all. */
function written(value: Exclude<CellValue, null>): Written {
  if (value instanceof CellError) return { type: 'e', text: filedError(value.code) };
  if (typeof value === 'boolean') return { type: 'b', text: value ? '1' : '0' };
  if (typeof value === 'string') return { type: 'str', text: xmlText(value) };
  return { text: String(value) };
}

export interface CellParts {
  /** `x:` where the part writes `<x:c>`. */
  readonly prefix: string;
  readonly row: number;
  readonly column: number;
  /** Style and whatever else the cell carries; `r` and `t` are seen to here. */
  readonly attributes?: Readonly<Record<string, string>>;
  /** The `<f>` element, if the cell has a formula. */
  readonly formula?: string;
  readonly value: CellValue;
  /** Elements that stand behind the value. */
  readonly rest?: string;
}

export function cellXml({
  prefix,
  row,
  column,
  attributes = {},
  formula = '',
  value,
  rest = '',
}: CellParts): string {
  const { type, text } = value === null ? { type: undefined, text: undefined } : written(value);
  const { r: _name, t: _type, ...others } = attributes;
  const tag = Object.entries({ r: cellName(row, column), ...others, t: type })
    .filter(([, content]) => content !== undefined)
    .map(([name, content]) => ` ${name}="${xmlAttribute(content!)}"`)
    .join('');
  const content = `${formula}${text === undefined ? '' : `<${prefix}v>${text}</${prefix}v>`}${rest}`;
  return content === '' ? `<${prefix}c${tag}/>` : `<${prefix}c${tag}>${content}</${prefix}c>`;
}

export function formulaXml(
  prefix: string,
  attributes: Readonly<Record<string, string>>,
  text: string,
): string {
  const tag = Object.entries(attributes).map(([name, content]) => ` ${name}="${xmlAttribute(content)}"`);
  return `<${prefix}f${tag.join('')}>${xmlText(text)}</${prefix}f>`;
}

/** What the file shows for the cell now. @param dayZero of a date that is spelled out, ms */
export function filedValue(
  cell: ScannedCell,
  sharedStrings: readonly string[],
  dayZero = daysFrom1900,
): CellValue {
  const text = childOf(cell, 'v')?.text;
  switch (cell.attributes.t) {
    case 'str':
      return plainText(text ?? '');
    case 's':
      return sharedStrings[Number(text)] ?? '';
    case 'inlineStr':
      return plainText(childOf(cell, 'is')?.text ?? '');
    case 'b':
      return text === '1' || text === 'true';
    case 'e':
      return new CellError((text ?? '#VALUE!') as ErrorCode);
    case 'd':
      return text === undefined ? null : serialDate(text, dayZero);
    default:
      return text === undefined || text.trim() === '' ? null : finite(Number(text));
  }
}

/** What is no number, or none that a cell can hold, is as good as nothing. */
const finite = (value: number): number | null => (Number.isFinite(value) ? value : null);

const day = 86_400_000; // ms

/** Dates are counted in days, from either of two (ISO/IEC 29500-1, 18.17.4.1). */
export const daysFrom1900 = Date.UTC(1899, 11, 30);
export const daysFrom1904 = Date.UTC(1904, 0, 1);

/** A date as the standard spells it, `2026-12-01T08:00:00`, in days as cells count them. */
function serialDate(text: string, dayZero: number): number | null {
  const time = Date.parse(/T.*(?:Z|[+-]\d\d:\d\d)$|^[^T]*$/.test(text) ? text : `${text}Z`);
  return finite((time - dayZero) / day);
}

/** Whether a cell that shows `filed` need not be touched to show `value`. */
export function showsAlready(filed: CellValue, value: CellValue): boolean {
  if (filed instanceof CellError) return value instanceof CellError && filed.code === filedError(value.code);
  return filed === value;
}
