/** A column exactly as it stands, gaps and all: what a check of the run needs to see. */
import { InvalidInput } from '../../src/errors';
import type { RawCell } from '../../src/series/check/rawRun';
import { CellError, type CellValue } from '../cell';
import { numberInText, placeInWords, requireLine } from '../column';
import { column, required, type Parameter } from '../parameters';

export interface RawColumn {
  readonly rows: number;
  readonly columns: number;
  readonly cells: readonly RawCell[];
}

/** As {@link column}, where neither an error cell nor doubtful text ends the matter. */
export function rawColumn(about: Parameters<typeof column>[0]): Parameter<RawColumn> {
  return {
    ...column(about),
    keepsErrors: true,
    read(cells, name) {
      const rows = required(cells, name);
      const shape = { rows: rows.length, columns: rows[0].length };
      requireLine({ ...shape, numbers: [], errors: new Map() }, name);
      return { ...shape, cells: rows.flat().map((cell, place) => rawCell(cell, placeInWords(place, shape))) };
    },
  };
}

function rawCell(cell: CellValue, place: string): RawCell {
  if (cell instanceof CellError) return { error: cell.code };
  if (typeof cell === 'boolean') return { text: String(cell).toUpperCase() };
  if (typeof cell !== 'string') return cell;
  return cell.trim() === '' ? null : { text: cell, ...readAs(cell, place) };
}

/** The number that every other function takes the text for. */
function readAs(text: string, place: string): { readAs?: number } {
  try {
    const number = numberInText(text, () => place);
    return number === null ? {} : { readAs: number };
  } catch (error) {
    if (error instanceof InvalidInput) return {}; // it could mean two numbers
    throw error;
  }
}
