/**
 * Names that one sheet has to itself. The engine (0.25.1) knows one meaning a name: where sheets use the
 * same for different things, each gets one of its own, in the list of names and in that sheet's formulas.
 */
import type { BookModel, DefinedName, SheetModel } from '../engine';

/** Words in quotes stay as they are; what `(` follows is a call, what `!` follows a sheet. */
const words = /"(?:[^"]|"")*"|'(?:[^']|'')*'!?|[A-Z_\\][\w.\\]*(?:\s*[(!])?/gi;

const folded = (name: string): string => name.toUpperCase();

/** The same workbook where every name means one thing; itself where that is so already. */
export function withUniqueNames(book: BookModel): BookModel {
  const all = book.names.map(({ name }) => folded(name));
  const isShared = ({ name }: DefinedName): boolean =>
    all.indexOf(folded(name)) !== all.lastIndexOf(folded(name));
  const local = book.names.filter((name) => name.sheet !== undefined && isShared(name));
  if (local.length === 0) return book;
  const unique = new Map(local.map((entry) => [entry, `${entry.name}_of_sheet_${placeOf(entry, book) + 1}`]));
  const inSheet = (sheet: string | undefined): Map<string, string> =>
    new Map(
      [...unique].filter(([entry]) => entry.sheet === sheet).map(([{ name }, own]) => [folded(name), own]),
    );
  return {
    sheets: book.sheets.map((sheet) => renamed(sheet, inSheet(sheet.name))),
    names: book.names.map((entry) => ({
      ...entry,
      name: unique.get(entry) ?? entry.name,
      refersTo: replaced(entry.refersTo, inSheet(entry.sheet)),
    })),
  };
}

const placeOf = ({ sheet }: DefinedName, { sheets }: BookModel): number =>
  sheets.findIndex(({ name }) => name === sheet);

const replaced = (formula: string, own: ReadonlyMap<string, string>): string =>
  formula.replace(words, (word) => own.get(folded(word)) ?? word);

const renamed = (sheet: SheetModel, own: ReadonlyMap<string, string>): SheetModel => ({
  ...sheet,
  cells: sheet.cells.map((cell) =>
    cell.formula === undefined ? cell : { ...cell, formula: replaced(cell.formula, own) },
  ),
});
