/**
 * All that the pane asks of a workbook. Two implementations: Excel through Office.js, and the local
 * workbook. The pane never knows which.
 */
import type { CellRange, CellValue } from '../functions/cell';
import type { Area } from '../functions/address';

/** An area whose sheet is known. */
export type SheetArea = Area & { readonly sheet: string };

/** An area as it stands in the sheet now. */
export interface RangeReading {
  readonly area: SheetArea;
  readonly cells: CellRange;
}

/** One cell to fill. A spilling formula is written to its first cell; `spills` says how far it will reach. */
export interface CellToWrite {
  readonly area: SheetArea;
  readonly content: { readonly value: CellValue } | { readonly formula: string };
  readonly spills?: { readonly rows: number; readonly columns: number };
  /** Of every cell that it fills, row by row; left out, and where `null`, cells keep the formats they have. */
  readonly numberFormats?: readonly (readonly (string | null)[])[];
}

/** A scatter chart of columns, or rows, of one sheet. */
export interface ChartToDraw {
  readonly title: string;
  readonly axes: { readonly x: string; readonly y: string };
  /** Points, or a line through them. */
  readonly series: readonly {
    readonly name: string;
    readonly x: SheetArea;
    readonly y: SheetArea;
    readonly isLine: boolean;
  }[];
  /** The cell under its upper left corner. */
  readonly at: SheetArea;
}

/** What a write changed, enough to put it back. Opaque to the pane. */
export interface WriteReceipt {
  readonly description: string;
  readonly area: SheetArea;
  readonly snapshot: unknown;
}

/** A write touched cells that are not empty, and nobody said so. Nothing was written. */
export class CellsInUse extends Error {
  override readonly name = 'CellsInUse';
  constructor(readonly areas: readonly string[]) {
    super(`these cells are not empty: ${areas.join(', ')}`);
  }
}

/** Where the person is, filled or not. */
export interface ActiveCell {
  readonly at: SheetArea;
  /** As it is typed, with its `=`; `null` where none stands there. */
  readonly formula: string | null;
}

/** The workbook as a file, where the host gives it. */
export interface WorkbookFiles {
  /** What becomes of a file that is given: `opens as a new workbook`. */
  readonly gives: string;
  /** For the button that gives it: `Open the copy`. */
  readonly verb: string;
  /** The workbook as it stands now, as an .xlsx file; `missing` says in words what could not be put into it. */
  read(): Promise<{ readonly bytes: Uint8Array; readonly missing?: string }>;
  /** Gives the person another workbook. @returns what became of it, in words; `null` when they thought better of it */
  give(bytes: Uint8Array): Promise<string | null>;
}

/** A place in the workbook itself for a few words of ours, which a colleague who opens it finds, too. */
export interface WorkbookMemory {
  recall(name: string): string | null;
  keep(name: string, words: string): Promise<void>;
}

export interface WorkbookPort {
  /** For the notice line: `Excel`, `local workbook`. */
  readonly host: string;
  /** What the person must know of this host, where it lacks something. */
  readonly remark?: string;
  /** Left out where the host gives no files. */
  readonly files?: WorkbookFiles;
  /** Left out where the host has no such place. */
  readonly memory?: WorkbookMemory;
  /** Whether charts can be drawn over its cells. */
  readonly canChart: boolean;
  /** The selected cells, trimmed to the used part of the sheet; `null` when nothing sensible is selected. */
  selection(): Promise<RangeReading | null>;
  /** The block of filled cells around the active cell. */
  regionAroundActiveCell(): Promise<RangeReading | null>;
  /** Where the person is, filled or not; `null` when no sheet is shown. */
  activeCell(): Promise<SheetArea | null>;
  read(area: SheetArea): Promise<RangeReading>;
  /** @returns a function that stops listening */
  onSelectionChange(listener: () => void): () => void;
  /**
   * Tells the active cell, at once and whenever it or its formula is another, where the host says so also while that
   * is typed; `null` when no sheet is shown. @returns a function that stops
   */
  onActiveCell(listener: (cell: ActiveCell | null) => void): () => void;
  /** Numbers these areas in the sheet, from 1, in place of those before; left out where the host cannot. */
  mark?(areas: readonly SheetArea[]): void;
  /** Cells of the area that hold something. */
  occupied(area: SheetArea): Promise<readonly string[]>;
  /** Writes all or nothing. @throws CellsInUse unless `overwrite` */
  write(
    cells: readonly CellToWrite[],
    options: {
      readonly overwrite: boolean;
      readonly description: string;
      /** Only where it can be drawn. */
      readonly chart?: ChartToDraw;
    },
  ): Promise<WriteReceipt>;
  /** Puts back what a write changed. */
  undo(receipt: WriteReceipt): Promise<void>;
  /** Selects these cells, and shows them to the person. */
  reveal(area: SheetArea): Promise<void>;
}
