/** Calls of our own functions, worked out as a workbook would: areas, numbers, words and calls within calls. */
import { parseArea } from '../../functions/address';
import { callFunction } from '../../functions/call';
import { functionNamed } from '../../functions/catalogue';
import { isRange, type CellRange, type CellResult, type CellValue } from '../../functions/cell';
import type { SheetArea } from '../../taskpane/port';
import { partsOf } from '../../functions/literal';

/** @returns nothing for a formula that is no call of ours */
export function answerOf(
  formula: string,
  sheet: string,
  read: (area: SheetArea) => CellRange,
): CellRange | undefined {
  const answer = valueOf(formula.replace(/^=/, ''), sheet, read);
  return answer === undefined || isRange(answer) ? answer : [[answer]];
}

function valueOf(text: string, sheet: string, read: (area: SheetArea) => CellRange): CellResult | undefined {
  const call = /^PACE\.([A-Z]+)\(/.exec(text);
  if (call) {
    const f = functionNamed(call[1])!;
    return callFunction(
      f,
      partsOf(text.slice(text.indexOf('(') + 1, text.lastIndexOf(')')), ',').map((argument) =>
        valueOf(argument, sheet, read),
      ),
    );
  }
  if (text.startsWith('{'))
    return partsOf(text.slice(1, -1), ';').map((row) =>
      partsOf(row, ',').map((cell) => valueOf(cell, sheet, read) as CellValue),
    );
  if (text === '') return undefined;
  if (text.startsWith('"')) return text.slice(1, -1).replace(/""/g, '"');
  if (text === 'TRUE' || text === 'FALSE') return text === 'TRUE';
  if (Number.isFinite(Number(text))) return Number(text);
  const area = parseArea(text);
  return area && read({ sheet, ...area });
}
