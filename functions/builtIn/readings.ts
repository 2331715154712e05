/** A range of readings in a formula: one by one, or as a whole. */
import { numberInText } from '../column';
import type { Bounds } from '../parameters';
import { NotSaid, type Argument, type Said } from './said';
import { cellOf, fixedArea, numberText, valueText, where } from './text';

export class Readings {
  readonly rows: number;
  readonly columns: number;

  /** @throws NotSaid for numbers written as text, which built-in functions pass over */
  constructor(
    private readonly argument: Argument,
    name: string,
    private readonly bounds: Bounds = {},
  ) {
    const { cells } = argument;
    this.rows = cells?.length ?? 1;
    this.columns = cells?.[0]?.length ?? 1;
    const asText = cells
      ?.flat()
      .some((cell) => typeof cell === 'string' && numberInText(cell, () => name) !== null);
    if (asText) throw new NotSaid(`${name} holds numbers written as text`);
  }

  /** The reading itself, which moves with a copied formula. */
  element(row: number, column: number): string {
    const { area, cells, text } = this.argument;
    if (area) return cellOf(area, row, column);
    if (cells) return valueText(cells[row][column]);
    throw new NotSaid(`${text} is worked out within the formula`);
  }

  /** All of them, where they stand. */
  get whole(): string {
    const { area, text } = this.argument;
    return area ? fixedArea(area) : text;
  }

  /** Whether single readings can be named. */
  get isPlaced(): boolean {
    return this.argument.area !== undefined || this.argument.cells !== undefined;
  }

  /** The conditions of the parameter's own bounds, for all readings at once: one outside makes the call an error. */
  get holds(): string[] {
    const { above, atLeast, below, atMost } = this.bounds;
    return [
      ...(above === undefined ? [] : this.none('<=', numberText(above))),
      ...(atLeast === undefined ? [] : this.none('<', numberText(atLeast))),
      ...(below === undefined ? [] : this.none('>=', numberText(below))),
      ...(atMost === undefined ? [] : this.none('>', numberText(atMost))),
    ];
  }

  /** That no number among the readings lies on the wrong side of a limit; text, gaps and errors do not count. */
  none(side: '<' | '<=' | '>' | '>=', limit: string): string[] {
    const { area, text } = this.argument;
    const isPlain = /^\(?-?[\d.]+\)?$/.test(limit);
    if (area) {
      const criterion = isPlain ? `"${side}${limit.replace(/[()]/g, '')}"` : `"${side}"&(${limit})`;
      return [`COUNTIF(${fixedArea(area)},${criterion})=0`];
    }
    return [`SUM(IF(ISNUMBER(${text}),IF(${text}${side}${limit},1,0),0))=0`];
  }
}

/**
 * A conversion, reading by reading, in the shape given: a gap stays empty and an error cell keeps its error.
 *
 * @param holds what must hold for all
 * @param convert the formula of one reading; without a place for all at once
 */
export function eachReading(
  readings: Readings,
  holds: readonly string[],
  convert: (reading: string, row?: number, column?: number) => string,
): Said {
  const one = (x: string, row?: number, column?: number): string =>
    where(
      [...readings.holds, ...holds],
      isNumber(x)
        ? convert(x, row, column)
        : `IF(ISNUMBER(${x}),${convert(x, row, column)},IF(ISERROR(${x}),${x},""))`,
    );
  const whole = (): string => one(readings.whole);
  if (!readings.isPlaced) return { whole };
  return { whole, cell: (row, column) => one(readings.element(row, column), row, column) };
}

const isNumber = (text: string): boolean => /^\(?-?[\d.]+(?:E[+-]?\d+)?\)?$/.test(text);
