/** All that the page asks of the grid on the screen. One implementation, over Univer; the page never imports that. */
import type { CellRange, CellValue } from '../../functions/cell';
import type { Area } from '../../functions/address';
import type { BookModel, CalculatedBook } from './engine';

/** An area whose sheet is known. */
export type GridArea = Area & { readonly sheet: string };

export interface GridPlace {
  readonly sheet: string;
  readonly row: number;
  readonly column: number;
}

/** What was typed into a cell: a formula with its `=`, or a value; `null` is an empty cell. */
export interface TypedCell {
  readonly value: CellValue;
  readonly formula?: string;
  readonly numberFormat?: string;
}

export type CellToSet = GridPlace & TypedCell;

/** Ends what it was given out for: listening, mostly. */
export type Stop = () => void;

export interface Grid {
  /** Shows a book in place of the one before; resolves when it is calculated. */
  open(book: BookModel): Promise<void>;
  /** Ends an edit that is under way, keeping it; resolves when all that follows from it is calculated. */
  settled(): Promise<void>;
  /** The book as it is typed now. */
  book(): BookModel;
  /** What its formulas come to now. */
  calculated(): CalculatedBook;
  /** Names of the sheets in their order. */
  sheets(): readonly string[];
  /** The smallest area that holds all that is filled, typed or spilled; `null` for an empty sheet. */
  used(sheet: string): GridArea | null;
  /** What the cells show. */
  values(area: GridArea): CellRange;
  /** What was typed there; a cell that only shows part of a spill has nothing typed. */
  typed(place: GridPlace): TypedCell;
  /** One step for the grid's own undo; resolves when all that follows from it is calculated. */
  set(cells: readonly CellToSet[]): Promise<void>;
  active(): GridPlace | null;
  /** In the active cell, as far as it is typed, with its `=`; `null` where there is none. */
  formula(): string | null;
  selected(): GridArea | null;
  select(area: GridArea): void;
  /** Outlines and numbers these areas, in place of those before. */
  mark(areas: readonly GridArea[]): void;
  /** Puts the keyboard into the grid. */
  focus(): void;
  setDark(isDark: boolean): void;
  onSelection(listener: () => void): Stop;
  /** What is being typed into a cell is another. */
  onTyping(listener: () => void): Stop;
  /** Something that a file would hold has changed by hand or by the pane, not by calculation. */
  onEdit(listener: () => void): Stop;
  /** Formulas have come to new values. */
  onCalculated(listener: () => void): Stop;
  dispose(): void;
}
