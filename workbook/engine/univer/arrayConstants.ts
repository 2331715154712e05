/**
 * `{40;"16,0"}` as it is meant: the engine (0.25.1) cuts at every comma and semicolon, inside words too.
 */
import {
  ArrayValueObject,
  StringValueObject,
  ValueObjectFactory,
  type BaseValueObject,
} from '@univerjs/engine-formula';

let mended = false;

/** Calling it again changes nothing. */
export function mendArrayConstants(): void {
  if (mended) return;
  mended = true;
  const create = ArrayValueObject.create;
  ArrayValueObject.create = (raw) => {
    if (typeof raw !== 'string' || !raw.startsWith('{')) return create.call(ArrayValueObject, raw);
    const rows = rowsOf(raw.slice(1, -1)).map((row) => row.map(constant));
    return create.call(ArrayValueObject, {
      calculateValueList: rows,
      rowCount: rows.length,
      columnCount: Math.max(...rows.map((row) => row.length)),
      unitId: '',
      sheetId: '',
      row: -1,
      column: -1,
    });
  };
}

/** Commas part the cells of a row, semicolons the rows; neither does inside quotes. */
function rowsOf(inside: string): string[][] {
  const rows = [['']];
  for (const [part] of inside.matchAll(/"(?:[^"]|"")*"|[^"]/gs)) {
    const row = rows[rows.length - 1];
    if (part === ';') rows.push(['']);
    else if (part === ',') row.push('');
    else row[row.length - 1] += part;
  }
  return rows;
}

function constant(text: string): BaseValueObject {
  const cell = text.trim();
  return /^".*"$/s.test(cell)
    ? StringValueObject.create(cell.slice(1, -1).replace(/""/g, '"'))
    : ValueObjectFactory.create(cell);
}
