/** The choice of a rate → the formula that says it, and its answer from the same function a cell would call. */
import { areaName } from '../functions/address';
import { callFunction } from '../functions/call';
import { functionNamed } from '../functions/catalogue';
import { CellError, isRange, type CellResult, type CellValue } from '../functions/cell';
import { namespace, type CellFunction } from '../functions/define';
import { columnOf, type Run, type Table } from './runs';
import type { RateChoice, RateKind } from './store';

export const functionFor: Readonly<Record<RateKind, string>> = {
  average: 'BETWEEN',
  tangent: 'TANGENT',
  column: 'ALONG',
};

/** The fields of each kind, in the order of the function's arguments after times and values. */
const fields: Readonly<Record<RateKind, readonly Exclude<keyof RateChoice, 'kind'>[]>> = {
  average: ['from', 'to', 'coefficient'],
  tangent: ['time', 'points', 'degree', 'coefficient'],
  column: ['points', 'degree', 'coefficient'],
};

interface Argument {
  readonly value: CellResult | undefined;
  readonly text: string;
}

const leftOut: Argument = { value: undefined, text: '' };

/** A decimal comma is read too. What is no number goes on as text, so that the function itself refuses it. */
export function typedArgument(typed: string): Argument {
  const trimmed = typed.trim().replace(/^[−–]/, '-');
  if (trimmed === '') return leftOut;
  const value = Number(trimmed.replace(/^([+-]?\d*),(\d+)$/, '$1.$2'));
  if (Number.isFinite(value)) return { value, text: String(value) };
  return { value: trimmed, text: `"${trimmed.replace(/"/g, '""')}"` };
}

function argumentsFor(table: Table, run: Run, rate: RateChoice, detail: boolean): Argument[] {
  const ranges = [run.timeColumn, run.readingColumn].map((column): Argument => {
    const { area, cells } = columnOf(table, column, run);
    return { value: cells, text: areaName(area) };
  });
  const typed = fields[rate.kind].map((field) => typedArgument(rate[field]));
  const all = [...ranges, ...typed, detail ? { value: true, text: 'TRUE' } : leftOut];
  while (all[all.length - 1].text === '') all.pop();
  return all;
}

/** As it is typed into a cell: `=PACE.TANGENT('Gas run'!A3:A20,'Gas run'!C3:C20,30)`. */
export function rateFormula(table: Table, run: Run, rate: RateChoice, detail: boolean): string {
  const texts = argumentsFor(table, run, rate, detail).map(({ text }) => text);
  return `=${namespace}.${functionFor[rate.kind]}(${texts.join(',')})`;
}

/** One rate as the pane shows it; `null` where the data leave no such number. */
export interface Rate {
  readonly value: number;
  readonly uncertainty: number | null;
  readonly lower: number | null;
  readonly upper: number | null;
  readonly degreesOfFreedom: number | null;
}

export type Answer =
  | { readonly kind: 'absent'; readonly functionName: string }
  /** `field` is the argument the words speak of, where they name one that can be typed. */
  | { readonly kind: 'refused'; readonly words: string; readonly field: string | null }
  | { readonly kind: 'one'; readonly rate: Rate }
  /** Row by row beside the readings; `null` where a row has no rate. */
  | { readonly kind: 'column'; readonly rates: readonly (Rate | null)[] };

export function answerFor(table: Table, run: Run, rate: RateChoice): Answer {
  const functionName = functionFor[rate.kind];
  const f = functionNamed(functionName);
  if (!f) return { kind: 'absent', functionName };
  const result = call(f, table, run, rate);
  if (result instanceof CellError) return refusal(result, rate.kind);
  const rows = isRange(result) ? result : [[result]];
  if (rate.kind === 'column') return { kind: 'column', rates: rows.map(readRate) };
  const one = readRate(rows[0]);
  if (one) return { kind: 'one', rate: one };
  const [cell] = rows[0];
  return refusal(
    cell instanceof CellError ? cell : new CellError('#N/A', 'there is no rate here'),
    rate.kind,
  );
}

const call = (f: CellFunction, table: Table, run: Run, rate: RateChoice): CellResult =>
  callFunction(
    f,
    argumentsFor(table, run, rate, true).map(({ value }) => value),
  );

function refusal(error: CellError, kind: RateKind): Answer {
  const words = error.message || `the readings hold the error ${error.code}`;
  const field = fields[kind].find((name) => words.startsWith(`${name} `)) ?? null;
  return { kind: 'refused', words, field };
}

const orNull = (cell: CellValue | undefined): number | null => (typeof cell === 'number' ? cell : null);

function readRate([value, uncertainty, lower, upper, degreesOfFreedom]: readonly CellValue[]): Rate | null {
  if (typeof value !== 'number') return null;
  return {
    value,
    uncertainty: orNull(uncertainty),
    lower: orNull(lower),
    upper: orNull(upper),
    degreesOfFreedom: orNull(degreesOfFreedom),
  };
}
