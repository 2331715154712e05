/** The example of a function as it would stand in a sheet: its data in cells, and the formula that points at them. */
import { areaName } from '../address';
import { isRange, type CellResult, type CellValue } from '../cell';
import { typedName, type CellFunction } from '../define';
import { exampleCell } from '../documented';
import { calculate, callIn, partsOf } from '../literal';
import { escaped, table } from './html';

/** Data begin below a row of headings. */
const firstRow = 1;

export interface ExampleSheet {
  /** One a column of data: the name of its argument, empty for a further column of it. */
  readonly headings: readonly string[];
  readonly rows: readonly (readonly CellValue[])[];
  readonly formula: string;
}

/** @returns nothing for a call without lists, which needs no cells */
export function exampleSheet(formula: string): ExampleSheet | undefined {
  const { f, args } = callIn(formula);
  const written = partsOf(formula.slice(formula.indexOf('(') + 1, -1), ',');
  const names = Object.keys(f.parameters);
  const headings: string[] = [];
  const columns: (readonly CellValue[])[] = [];
  const pointed = args.map((argument, place) => {
    if (!isRange(argument)) return written[place];
    const area = {
      row: firstRow,
      column: columns.length,
      rows: argument.length,
      columns: argument[0].length,
    };
    for (let column = 0; column < area.columns; column++) {
      headings.push(column === 0 ? names[place] : '');
      columns.push(argument.map((row) => row[column] ?? null));
    }
    return areaName(area);
  });
  if (columns.length === 0) return undefined;
  const height = Math.max(...columns.map((column) => column.length));
  const rows = Array.from({ length: height }, (_, row) => columns.map((column) => column[row] ?? null));
  return { headings, rows, formula: `=${typedName(f)}(${pointed.join(',')})` };
}

export function exampleSection({ example }: CellFunction): string {
  const sheet = exampleSheet(example.formula);
  const asTyped = `<pre>${escaped(example.formula)}</pre>`;
  const answer = `<p class="quiet">shows</p>\n${answerTable(calculate(example.formula))}`;
  if (!sheet) return `${asTyped}\n${answer}`;
  return [
    '<p>With these cells</p>',
    dataTable(sheet),
    '<p>the formula</p>',
    `<pre>${escaped(sheet.formula)}</pre>`,
    answer,
    '<p>The same for an empty sheet, with the data in the formula:</p>',
    asTyped,
  ].join('\n');
}

function dataTable({ headings, rows }: ExampleSheet): string {
  const letters = headings.map((_, column) => areaName({ row: 0, column, rows: 1, columns: 1 }).slice(0, -1));
  return table(
    ['', ...letters].map((letter) => (letter ? letter : '<span class="unseen">row</span>')),
    [headings, ...rows.map((row) => row.map((cell) => escaped(exampleCell(cell))))].map((row, r) => [
      String(r + 1),
      ...row,
    ]),
    'cells',
  );
}

function answerTable(result: CellResult): string {
  const rows = isRange(result) ? result : [[result]];
  const cells = rows.map(
    (row) => `<tr>${row.map((cell) => `<td>${escaped(exampleCell(cell))}</td>`).join('')}</tr>`,
  );
  return `<div class="wide"><table class="cells"><tbody>${cells.join('')}</tbody></table></div>`;
}
