/** Names that stand for a formula with one of our functions: in the copy they stand for what it came to. */
import { valueText } from '../../functions/builtIn/text';
import { CellError, type CellRange } from '../../functions/cell';
import type { BookModel, CellModel, DefinedName } from '../engine/engine';
import { calculate } from '../engine/univer/headless';
import { applyEdits, type Edit } from '../xlsx/edits';
import { callsOurs, typedFormula } from '../xlsx/formulaText';
import { readXml } from '../xlsx/parts';
import { encodeXml, localName, plainText, scanXml, tagStart, xmlText } from '../xlsx/xml';
import type { Package } from '../xlsx/zip';

export interface FrozenName {
  readonly name: string;
  readonly refersTo: string;
  /** A value, or an array of them, as a formula has it. */
  readonly value: string;
}

/** Columns to the right, beyond what any sheet of readings uses. */
const aside = 9000;

/** What each such name comes to, worked out in a cell of the sheet it belongs to. */
export async function frozenNames(book: BookModel): Promise<FrozenName[]> {
  const names = book.names.filter(({ refersTo }) => callsOurs(refersTo));
  if (names.length === 0) return [];
  const place = ({ sheet }: DefinedName, n: number): CellModel & { readonly sheet: string } => ({
    sheet: sheet ?? book.sheets[0].name,
    row: 0,
    column: aside + 100 * n,
    value: null,
    formula: names[n].name,
  });
  const cells = names.map(place);
  const calculated = await calculate({
    ...book,
    sheets: book.sheets.map((sheet) => ({
      ...sheet,
      cells: [...sheet.cells, ...cells.filter((cell) => cell.sheet === sheet.name)],
    })),
  });
  return names.map(({ name, refersTo }, n) => {
    const { sheet, row, column } = cells[n];
    const { rows, columns } = calculated.formula(sheet, row, column)?.spill ?? { rows: 1, columns: 1 };
    const values = Array.from({ length: rows }, (_, r) =>
      Array.from({ length: columns }, (__, c) => calculated.shown(sheet, row + r, column + c)),
    );
    return { name, refersTo, value: constantText(values) };
  });
}

function constantText(values: CellRange): string {
  const bare = (cell: CellRange[number][number]): string =>
    valueText(cell instanceof CellError ? new CellError(cell.code) : cell).replace(/^\((-.*)\)$/, '$1');
  if (values.length === 1 && values[0].length === 1) return bare(values[0][0]);
  return `{${values.map((row) => row.map(bare).join(',')).join(';')}}`;
}

export function freezeNames(pack: Package, workbook: string, names: readonly FrozenName[]): void {
  if (names.length === 0) return;
  const xml = readXml(pack, workbook);
  const edits: Edit[] = [];
  let open = -1;
  let text = '';
  scanXml(xml, workbook, {
    open({ name }, end) {
      open = localName(name) === 'definedName' ? end : -1;
      text = '';
    },
    text: (more) => (text += more),
    close({ name }, end) {
      if (localName(name) !== 'definedName' || open < 0) return;
      const frozen = names.find(({ refersTo }) => refersTo === typedFormula(plainText(text)));
      if (frozen) edits.push({ start: open, end: tagStart(xml, end), text: xmlText(frozen.value) });
      open = -1;
    },
  });
  pack.write(workbook, encodeXml(applyEdits(xml, edits)));
}
