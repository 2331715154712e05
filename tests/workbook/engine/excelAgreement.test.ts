/**
 * One sheet, two workbooks: what the local one shows is what Excel would show, as its side is documented, cell for
 * cell and word for word. Ranges stand in cells, so that a blank is a blank and not a 0.
 */
import { areaName } from '../../../functions/address';
import { CellError, isRange, type CellResult, type CellValue } from '../../../functions/cell';
import { typedName } from '../../../functions/define';
import type { CalculatedBook, CellModel, SheetModel } from '../../../workbook/engine/engine';
import { calculate } from '../../../workbook/engine/univer/headless';
import { ExcelError, excelSide } from '../../support/excelHost';
import { functionCases, type FunctionCase } from '../../support/functionCases';

/** Right of all ranges. */
const formulaColumn = 60;

const nameOf = (place: number): string => `Case ${place + 1}`;

/** The ranges side by side from A1 on, and the call beside them. */
function sheetOf({ f, args }: FunctionCase, place: number): SheetModel {
  const cells: CellModel[] = [];
  let column = 0;
  const words = args.map((argument) => {
    if (argument === undefined || !isRange(argument)) return literal(argument);
    const area = { row: 0, column, rows: argument.length, columns: argument[0].length };
    argument.forEach((row, r) =>
      row.forEach((value, c) => cells.push({ row: r, column: area.column + c, value })),
    );
    column += area.columns + 1;
    return areaName(area);
  });
  const formula = `${typedName(f)}(${words.join(',')})`;
  cells.push({ row: 0, column: formulaColumn, value: null, formula });
  return { name: nameOf(place), cells };
}

function literal(argument: CellResult | undefined): string {
  if (argument === undefined || argument === null) return '';
  return typeof argument === 'string' ? `"${argument}"` : String(argument).toUpperCase();
}

let book: CalculatedBook;
beforeAll(async () => {
  book = await calculate({ sheets: functionCases.map(sheetOf), names: [] });
}, 240_000);

/** As Excel shows it; an error shows words beside two codes only. */
const asExcelShows = (cell: CellValue): unknown => {
  if (!(cell instanceof CellError)) return cell ?? '';
  const speaks = ['#VALUE!', '#N/A'].includes(cell.code) && cell.message !== '';
  return speaks ? new ExcelError(cell.code, cell.message) : new ExcelError(cell.code);
};

test.each(functionCases.map((one, place) => [one.title, one, place] as const))(
  '%s',
  async (_, one, place) => {
    const inExcel = await excelSide().call(one.f, one.args).shown;
    const here = inExcel.map((row, r) =>
      row.map((_cell, c) => asExcelShows(book.shown(nameOf(place), r, formulaColumn + c))),
    );
    expect(here).toEqual(inExcel);
    const { spill } = book.formula(nameOf(place), 0, formulaColumn)!;
    expect(spill).toEqual({ rows: inExcel.length, columns: inExcel[0].length });
  },
);
