/** A1 references: the one place that knows how `'Gas run'!B2:C14` is written. Rows and columns count from 0. */

export interface Area {
  readonly sheet?: string;
  readonly row: number;
  readonly column: number;
  readonly rows: number;
  readonly columns: number;
}

export function columnName(column: number): string {
  let name = '';
  for (let rest = column + 1; rest > 0; rest = Math.floor((rest - 1) / 26)) {
    name = String.fromCharCode(65 + ((rest - 1) % 26)) + name;
  }
  return name;
}

/** Of a column, `AB`, or of a cell in it, `AB12`. */
export function columnIndex(name: string): number {
  let index = 0;
  for (let at = 0; name.charCodeAt(at) >= firstLetter; at++) index = index * 26 + (name.charCodeAt(at) & 31);
  return index - 1;
}

/** The last five bits of a letter count from 1, small or capital. */
const firstLetter = 'A'.charCodeAt(0);

export const cellName = (row: number, column: number): string => `${columnName(column)}${row + 1}`;

/** A sheet name needs quotes unless it is a plain word that cannot be read as a cell. */
export const quotedSheet = (sheet: string): string =>
  /^[A-Za-z_][A-Za-z0-9_.]*$/.test(sheet) && !/^[A-Za-z]{1,3}\d+$/.test(sheet) && !/^R\d*C?\d*$/i.test(sheet)
    ? sheet
    : `'${sheet.replace(/'/g, "''")}'`;

export function areaName({ sheet, row, column, rows, columns }: Area): string {
  const first = cellName(row, column);
  const last = cellName(row + rows - 1, column + columns - 1);
  const cells = first === last ? first : `${first}:${last}`;
  return sheet === undefined ? cells : `${quotedSheet(sheet)}!${cells}`;
}

const reference =
  /^(?:(?:'((?:[^']|'')+)'|([^'!]+))!)?\$?([A-Z]{1,3})\$?(\d+)(?::\$?([A-Z]{1,3})\$?(\d+))?$/i;

/** `'Gas run'!B2:C14` → its area; `undefined` for what is not a plain A1 reference. */
export function parseArea(text: string): Area | undefined {
  const match = reference.exec(text.trim());
  if (!match) return undefined;
  const [, quoted, plain, c1, r1, c2 = c1, r2 = r1] = match;
  const sheet = quoted?.replace(/''/g, "'") ?? plain;
  const columns = [columnIndex(c1), columnIndex(c2)].sort((a, b) => a - b);
  const rows = [Number(r1) - 1, Number(r2) - 1].sort((a, b) => a - b);
  return {
    ...(sheet === undefined ? {} : { sheet }),
    row: rows[0],
    column: columns[0],
    rows: rows[1] - rows[0] + 1,
    columns: columns[1] - columns[0] + 1,
  };
}
