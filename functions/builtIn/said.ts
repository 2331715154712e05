/** How a call of one of our functions is said in built-in ones: what is known of it, and what comes of it. */
import type { Area } from '../address';
import type { CellRange } from '../cell';
import type { Given } from './given';
import type { Table } from './workings';

/** One argument of a call, as it stands in a formula. */
export interface Argument {
  /** `$F$1`, `B2:B11`, `F1+273`; in brackets where an operator beside it would tear it apart. */
  readonly text: string;
  /** Of an expression: as any other sheet has to spell it; nothing where it depends on the cell it stands in. */
  readonly fromAfar?: string;
  /** Of a plain reference; its sheet only where the reference names one. */
  readonly area?: Area;
  /** What stands there on the day of the copy; unknown of an expression. */
  readonly cells?: CellRange;
}

/** By the names of the parameters; nothing where an argument was left out. */
export type Arguments = Readonly<Record<string, Argument | undefined>>;

/** @throws NotSaid where this call has no counterpart */
export type BuiltIn = (given: Given) => Said;

/**
 * What a call fits, as a table on the sheet "Workings": its numbers as they were found, and whether they still fit.
 *
 * @throws NotSaid where the call cannot be told; InvalidInput, NotDetermined and CellError of the fit itself
 */
export type FitTable = (given: Given) => Table;

/** The result in built-in functions, cell by cell or as one array; at least one of the two. */
export interface Said {
  /** The formula of one cell of the result, counted from its first. */
  readonly cell?: (row: number, column: number) => string;
  /** An expression for the whole result, for use inside another formula. */
  readonly whole?: () => string;
  /** What in it stays as it was on the day of the copy, such as a fit; nothing where it all follows its inputs. */
  readonly ofTheDay?: OfTheDay;
}

export interface OfTheDay {
  /** In words. */
  readonly what: string;
  /** The cells it was found from. */
  readonly from: readonly Area[];
}

/** The call cannot be said in built-in functions; the message says why, with no full stop. */
export class NotSaid extends Error {
  override readonly name = 'NotSaid';
}

/** A result of one value. */
export const oneValue = (text: string): Said => ({ cell: () => text, whole: () => text });
