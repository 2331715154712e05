/** The choice of a rate → the formula that says it, and its answer from the same function a cell would call. */
import { CellError, isRange, type CellResult } from '../../functions/cell';
import type { RateChoice, RateKind } from '../choices';
import type { Run, Table } from '../runs';
import {
  argumentOf,
  inShapeOf,
  columnArgument,
  leftOut,
  truth,
  type Argument,
  type Pointing,
} from './argument';
import { ask, formulaText, refusalOf } from './call';
import { readEstimate, type Estimate } from './estimate';

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

function argumentsFor(
  table: Table,
  run: Run,
  rate: RateChoice,
  pointing: Pointing,
  detail: boolean,
): Argument[] {
  const typed = fields[rate.kind].map((field) => argumentOf(rate[field], pointing));
  return [
    columnArgument(table, run, run.timeColumn),
    columnArgument(table, run, run.readingColumn),
    ...typed,
    detail ? truth(true) : leftOut,
  ];
}

/** As it is typed into a cell: `=PACE.TANGENT('Gas run'!A3:A20,'Gas run'!C3:C20,30)`. */
export const rateFormula = (
  table: Table,
  run: Run,
  rate: RateChoice,
  pointing: Pointing,
  detail: boolean,
): string => formulaText(functionFor[rate.kind], argumentsFor(table, run, rate, pointing, detail));

/** The same choice with what stands in the cells pointed at, for drawing. */
export function resolved(rate: RateChoice, pointing: Pointing): RateChoice {
  const typed = fields[rate.kind].map((field) => {
    const { value } = argumentOf(rate[field], pointing);
    return [field, value === undefined || value === null ? '' : String(value)];
  });
  return { ...rate, ...Object.fromEntries(typed) };
}

export type RateAnswer =
  /** `field` is the argument the words speak of, where they name one that can be typed. */
  | { readonly kind: 'refused'; readonly words: string; readonly field: string | null }
  | { readonly kind: 'one'; readonly rate: Estimate }
  /** Row by row beside the readings; `null` where a row has no rate. */
  | { readonly kind: 'column'; readonly rates: readonly (Estimate | null)[] };

export function rateAnswer(table: Table, run: Run, rate: RateChoice, pointing: Pointing): RateAnswer {
  const result: CellResult = ask(functionFor[rate.kind], argumentsFor(table, run, rate, pointing, true));
  if (result instanceof CellError) return refusal(result, rate.kind);
  const rows = isRange(result) ? result : [[result]];
  if (rate.kind === 'column') return { kind: 'column', rates: inShapeOf(table, rows).map(readEstimate) };
  const one = readEstimate(rows[0]);
  if (one) return { kind: 'one', rate: one };
  const [cell] = rows[0];
  return refusal(
    cell instanceof CellError ? cell : new CellError('#N/A', 'there is no rate here'),
    rate.kind,
  );
}

function refusal(error: CellError, kind: RateKind): RateAnswer {
  const words = refusalOf(error);
  const field = fields[kind].find((name) => words.startsWith(`${name} `)) ?? null;
  return { kind: 'refused', words, field };
}
