/** An argument as a formula spells it → what is known of it. */
import { isLiteral, isOperator, isWhitespace } from '@borgar/fx/xlsx';
import { CellError, type CellRange, type CellValue, type ErrorCode } from '../../functions/cell';
import { NotSaid, type Argument } from '../../functions/builtIn/said';
import { tokensOf } from './calls';
import type { World } from './world';

export function argumentOf(text: string, sheet: string, world: World): Argument {
  const literal = literalOf(text);
  if (literal) return { text: whole(text), cells: literal };
  const area = world.areaOf(text, sheet);
  if (area) return { text, area, cells: world.cellsIn(area, sheet) };
  if (tokensOf(text).some(({ type }) => type === 'range_beam'))
    throw new NotSaid('it takes a whole column or row');
  const fromAfar = world.fromAfar(text, sheet);
  return { text: whole(text), ...(fromAfar === undefined ? {} : { fromAfar: whole(fromAfar) }) };
}

/** In brackets unless it is one piece: a word, a number, one call. */
export function whole(text: string): string {
  const tokens = tokensOf(text).filter((token) => !isWhitespace(token));
  if (tokens.length === 1 && !text.startsWith('-')) return text;
  let depth = 0;
  const outside = tokens.filter((token) => {
    const before = depth;
    if (isOperator(token) && /^[({]$/.test(token.value)) depth += 1;
    if (isOperator(token) && /^[)}]$/.test(token.value)) depth -= 1;
    return before === 0 && depth === 0;
  });
  const isOneCall = outside.length <= 1 && outside.every(({ type }) => type === 'func');
  return isOneCall ? text : `(${text})`;
}

/** A value or an array of values written out. */
function literalOf(text: string): CellRange | undefined {
  const tokens = tokensOf(text).filter((token) => !isWhitespace(token));
  const [first, last] = [tokens[0], tokens.at(-1)];
  if (tokens.length === 1 && first && isLiteral(first)) return [[valueOf(first.type, first.value)]];
  if (tokens.length === 2 && first.value === '-' && last?.type === 'number') return [[-Number(last.value)]];
  if (first?.value !== '{' || last?.value !== '}') return undefined;
  return text
    .slice(1, -1)
    .split(/;(?=(?:[^"]*"[^"]*")*[^"]*$)/)
    .map((row) =>
      row.split(/,(?=(?:[^"]*"[^"]*")*[^"]*$)/).map((cell) => literalOf(cell.trim())?.[0][0] ?? null),
    );
}

function valueOf(type: string, text: string): CellValue {
  if (type === 'number') return Number(text);
  if (type === 'bool') return text.toUpperCase() === 'TRUE';
  if (type === 'error') return new CellError(text as ErrorCode);
  return text.slice(1, -1).replace(/""/g, '"');
}
