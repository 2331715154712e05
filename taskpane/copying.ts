/** The copy of a workbook for someone who installs nothing, as the pane speaks of it. Made elsewhere. */

/** Cells, each by its full name, and what holds for all of them. */
export interface CellsAndWhy {
  readonly why: string;
  readonly cells: readonly string[];
}

/** A copy, and what became of the formulas of ours in it. */
export interface HandedCopy {
  readonly bytes: Uint8Array;
  /** How many work on, in built-in functions. */
  readonly live: number;
  /** Those that no longer calculate, by reason. */
  readonly frozen: readonly CellsAndWhy[];
  /** Those that stand in no cell, so stay and need the add-in still: by what is lost, the cells that they are for. */
  readonly left: readonly CellsAndWhy[];
  /** Cells with a formula of ours that showed an error before, and still do. */
  readonly failing: readonly string[];
}

/** @throws in words what is wrong with the workbook's bytes; when it is stopped, `Stopped` */
export type CopyMaker = (bytes: Uint8Array, stop: AbortSignal) => Promise<HandedCopy>;

/** The person stopped it. */
export class Stopped extends Error {
  override readonly name = 'Stopped';
}
