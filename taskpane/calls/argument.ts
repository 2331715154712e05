/** What is typed into a field → an argument of a cell function: its value, and how a formula says it. */
import { areaName, parseArea } from '../../functions/address';
import type { CellRange, CellResult } from '../../functions/cell';
import { areaOf, columnOf, type Run, type Table } from '../runs';
import { turnedCells } from '../turned';

export interface Argument {
  readonly value: CellResult | undefined;
  /** Empty where the argument is left out. */
  readonly text: string;
}

export const leftOut: Argument = { value: undefined, text: '' };

/** Where fields can point: the sheet that plain names such as E3 belong to, and what stands in the cells. */
export interface Pointing {
  readonly sheet: string;
  readonly pointedAt: ReadonlyMap<string, CellRange>;
}

/** A decimal comma is read too. What is no number goes on as text, so that the function itself refuses it. */
export function typedArgument(typed: string): Argument {
  const trimmed = typed.trim().replace(/^[−–]/, '-');
  if (trimmed === '') return leftOut;
  const value = Number(trimmed.replace(/^([+-]?\d*),(\d+)$/, '$1.$2'));
  if (Number.isFinite(value)) return { value, text: String(value) };
  if (/^(true|false)$/i.test(trimmed)) return truth(/^true$/i.test(trimmed));
  return quoted(trimmed);
}

export const truth = (value: boolean): Argument => ({ value, text: String(value).toUpperCase() });
export const quoted = (words: string): Argument => ({ value: words, text: `"${words.replace(/"/g, '""')}"` });

/**
 * The full name of the cells that a field points at; `undefined` for a number or for words.
 *
 * @param isWord where words such as CO2 are expected, only `=B2`, `$B$2` or `Sheet!B2` point at cells
 */
export function pointedName(typed: string, sheet: string, isWord = false): string | undefined {
  const bare = typed.trim().replace(/^=/, '');
  if (isWord && !/^=|[!$]/.test(typed.trim())) return undefined;
  const area = parseArea(bare);
  return area && areaName({ ...area, sheet: area.sheet ?? sheet });
}

/** A number, words, or cells as good as either. */
export function argumentOf(typed: string, { sheet, pointedAt }: Pointing, isWord = false): Argument {
  const name = pointedName(typed, sheet, isWord);
  if (name === undefined) return typedArgument(typed);
  const cells = pointedAt.get(name) ?? [[null]];
  return { value: cells.length === 1 && cells[0].length === 1 ? cells[0][0] : cells, text: name };
}

/** In the shape in which the sheet holds it, so that a refusal names the same places. */
export function columnArgument(table: Table, run: Run, column: number): Argument {
  return {
    value: inShapeOf(table, columnOf(table, column, run)),
    text: areaName(areaOf(table, column, run)),
  };
}

/** What was read turned, as the sheet holds it; and an answer in its shape, as the table is read. */
export const inShapeOf = ({ isTurned }: Table, cells: CellRange): CellRange =>
  isTurned ? turnedCells(cells) : cells;
