/** What a call was given, in words of a formula: numbers, quantities, flags and readings, with what must hold of each. */
import { convertQuantity, convertUnit, parseQuantity } from '../../src/units';
import { areaName } from '../address';
import { CellError, type CellValue } from '../cell';
import type { Parameters } from '../define';
import { isLeftOut, requireWithin, type Parameter } from '../parameters';
import { sure, type Phrase } from './phrase';
import { Readings } from './readings';
import { NotSaid, type Argument, type Arguments, type OfTheDay } from './said';
import { converted, isNumber, numberBefore, tidy, within } from './quantities';
import { numberText, quoted } from './text';
import type { Workings } from './workings';

/** A quantity for each reading; the same for all where `isOne`. */
export interface Quantities {
  at(row: number, column: number): string;
  readonly holds: readonly string[];
  readonly isOne: boolean;
}

export class Given {
  constructor(
    private readonly parameters: Parameters,
    private readonly given: Arguments,
    private readonly sheet?: Workings,
  ) {}

  /** @throws NotSaid where the copy has no such sheet */
  get workings(): Workings {
    if (!this.sheet) throw new NotSaid('there is no sheet for its workings');
    return this.sheet;
  }

  /** The same call, as a formula on the sheet "Workings" has to name its arguments. */
  fromWorkings(): Given {
    const { sheet } = this.workings;
    const named = this.names.map((name) => {
      const argument = this.laidOut(name);
      if (argument?.fromAfar !== undefined) return [name, { ...argument, text: argument.fromAfar }];
      if (!argument?.area) return [name, argument];
      const area = { sheet, ...argument.area };
      return [name, { ...argument, area, text: areaName(area) }];
    });
    return new Given(this.parameters, Object.fromEntries(named) as Arguments, this.sheet);
  }

  /** A number as the sheet "Workings" names it; what must hold of it is said where the formula stands. */
  numberFromWorkings(name: string): string {
    const argument = this.argument(name);
    if (argument && !argument.cells && argument.fromAfar === undefined)
      throw new NotSaid(`${name} is worked out within the formula`);
    return this.fromWorkings().number(name).text;
  }

  /** What stays as it was, and from which arguments it was found. */
  ofTheDay(what: string, ...names: readonly string[]): OfTheDay {
    return { what, from: names.flatMap((name) => this.given[name]?.area ?? []) };
  }

  /** What the function itself reads there on the day of the copy. @throws NotSaid where that is not known */
  today<T>(name: string): T {
    const argument = this.argument(name);
    if (argument && !argument.cells) throw new NotSaid(`${name} is worked out within the formula`);
    if (argument?.cells?.flat().some((cell) => cell instanceof CellError))
      throw new NotSaid(`${name} holds an error`);
    return this.parameters[name].read(argument?.cells, name) as T;
  }

  /** All that the function itself runs on, on the day of the copy. @throws NotSaid where that is not known */
  allToday<V>(): V {
    return Object.fromEntries(this.names.map((name) => [name, this.today(name)])) as V;
  }

  /** Of all parameters. */
  get names(): string[] {
    return Object.keys(this.parameters);
  }

  /** Nothing where the argument was left out. A cell that is blank today may be filled tomorrow. */
  argument(name: string): Argument | undefined {
    const argument = this.laidOut(name);
    if (!argument) return undefined;
    if (!argument.cells || !isLeftOut(argument.cells)) return argument;
    if (argument.area && this.parameters[name].optional)
      throw new NotSaid(`${name} is a blank cell, which a formula would read as 0`);
    return argument.area ? argument : undefined;
  }

  /** Columns that are written out in the formula stand on the sheet "Workings": not all programs work with such arrays. */
  private laidOut(name: string): Argument | undefined {
    const argument = this.given[name];
    const { cells, area, text } = argument ?? {};
    if (!cells || area || !this.sheet || cells.flat().length < 2) return argument;
    if (!['column', 'quantities', 'uncertainties'].includes(this.parameters[name].kind)) return argument;
    const own = this.sheet
      .table(`Written in a formula: ${text}`, () => cells)
      .area(cells.length, cells[0].length);
    return { text: areaName(own), area: own, cells };
  }

  has(name: string): boolean {
    return this.argument(name) !== undefined;
  }

  /** @throws NotSaid where it is no number today */
  number(name: string): Phrase {
    const argument = this.argument(name);
    if (!argument) return sure(numberText(this.fallback(name) as number));
    const cell = this.single(argument, name);
    if (cell !== undefined && typeof cell !== 'number') throw new NotSaid(`${name} is not a number`);
    const { bounds = {} } = this.parameters[name];
    if (cell !== undefined && !argument.area) return sure(numberText(requireWithin(cell, bounds, name, '1')));
    return { text: argument.text, holds: [...isNumber(argument.text), ...within(argument.text, bounds)] };
  }

  /** A number on which the form of the formula depends: taken as it is on the day of the copy. */
  constant(name: string): { readonly value: number; readonly holds: readonly string[] } {
    const argument = this.argument(name);
    if (!argument) return { value: this.fallback(name) as number, holds: [] };
    const cell = this.single(argument, name);
    if (typeof cell !== 'number') throw new NotSaid(`${name} is not known to be a number`);
    requireWithin(cell, this.parameters[name].bounds ?? {}, name, '1');
    const same = [...isNumber(argument.text), `${argument.text}=${numberText(cell)}`];
    return { value: cell, holds: argument.area ? same : [] };
  }

  /** In the unit `to`: a bare number is one of the parameter's own unit, text carries its own. */
  quantity(name: string, to: string): Phrase {
    const argument = this.argument(name);
    if (!argument) return sure(numberText(this.fallback(name) as number));
    return this.quantityAt(argument, this.single(argument, name), argument.text, name, to);
  }

  /** One for all readings, or one for each of them. */
  quantities(name: string, to: string): Quantities {
    const argument = this.argument(name);
    if (!argument) throw new NotSaid(`${name} was left out`);
    const { cells } = argument;
    if (!cells || cells.flat().length === 1) {
      const { text, holds } = this.quantity(name, to);
      return { at: () => text, holds, isOne: true };
    }
    const { unit, bounds } = this.parameters[name];
    const given = new Readings(argument, name, bounds);
    if (cells.flat().some((cell) => typeof cell !== 'number'))
      throw new NotSaid(`${name} holds cells that are not numbers`);
    // an error among them is the answer itself
    const all = argument.area ? [`COUNT(${given.whole})+0*SUM(${given.whole})=${cells.flat().length}`] : [];
    return {
      at: (row, column) => converted(given.element(row, column), unit, to),
      holds: [...all, ...given.holds],
      isOne: false,
    };
  }

  /** A fraction, for which TRUE stands for 1; in a cell, as it is typed. */
  fraction(name: string): Phrase {
    const argument = this.argument(name);
    const cell = argument && this.single(argument, name);
    if (typeof cell === 'boolean' && !argument?.area) return sure(cell ? '1' : '0');
    if (!argument?.area || typeof cell === 'string') return this.number(name);
    const text = `(1*${argument.text})`;
    return { text, holds: [isNoText(argument.text), ...within(text, this.parameters[name].bounds ?? {})] };
  }

  /** One quantity in a unit that another argument names: a bare number is one of that unit. */
  quantityIn(name: string, unit: string): Phrase {
    const argument = this.argument(name);
    if (!argument) throw new NotSaid(`${name} was left out`);
    const own = { unit, bounds: this.parameters[name].bounds };
    return this.quantityAt(argument, this.single(argument, name), argument.text, name, unit, own);
  }

  /** Whether one number was given; of an expression that is taken for granted. */
  isNumber(name: string): boolean {
    const argument = this.argument(name);
    if (!argument) return false;
    const cell = this.single(argument, name);
    return cell === undefined || typeof cell === 'number';
  }

  /** Whether a certain word is written there, in the formula itself. */
  isWord(name: string, word: string): boolean {
    const argument = this.argument(name);
    const cell = argument?.cells?.[0]?.[0];
    return !argument?.area && typeof cell === 'string' && cell.trim().toLowerCase() === word;
  }

  /** Readings with a unit of their own where they are text. @throws NotSaid where some are */
  quantityReadings(name: string): Readings {
    const texts = this.argument(name)
      ?.cells?.flat()
      .some((cell) => typeof cell === 'string' && /\d/.test(cell));
    if (texts) throw new NotSaid(`${name} holds numbers with their unit as text`);
    return this.readings(name, true);
  }

  /** A column, whose kind says whether a cell may carry its unit. */
  column(name: string): Readings {
    return this.parameters[name].kind === 'quantities' ? this.quantityReadings(name) : this.readings(name);
  }

  /** A text in the parameter's own unit, in another. */
  inUnit(name: string, text: string, to: string): string {
    return converted(text, this.parameters[name].unit, to);
  }

  private quantityAt(
    { area }: Argument,
    cell: CellValue | undefined,
    text: string,
    name: string,
    to: string,
    { unit, bounds = {} }: Pick<Parameter, 'unit' | 'bounds'> = this.parameters[name],
  ): Phrase {
    if (typeof cell === 'string') {
      const [value, holds, own] = area ? numberBefore(text, cell, name) : [undefined, [], unit];
      if (value === undefined) {
        const inUnit = requireWithin(parseQuantity(cell, unit, name), bounds, name, unit);
        return sure(numberText(tidy(convertQuantity(inUnit, unit, to))));
      }
      convertUnit(1, own, unit, name);
      const inUnit = converted(value, own, unit);
      return { text: converted(value, own, to), holds: [...holds, ...within(inUnit, bounds)] };
    }
    if (cell !== undefined && typeof cell !== 'number') throw new NotSaid(`${name} is not a number`);
    if (cell !== undefined && !area) {
      return sure(numberText(tidy(convertQuantity(requireWithin(cell, bounds, name, unit), unit, to))));
    }
    return { text: converted(text, unit, to), holds: [...isNumber(text), ...within(text, bounds)] };
  }

  /** A word or unit that the formula is built on; where a cell holds it, it must stay as it is. */
  word(name: string): { readonly value: string; readonly holds: readonly string[] } {
    const argument = this.argument(name);
    if (!argument) return { value: String(this.fallback(name)), holds: [] };
    const cell = this.single(argument, name);
    if (typeof cell !== 'string') throw new NotSaid(`${name} is not text`);
    return { value: cell.trim(), holds: argument.area ? [`EXACT(${argument.text},${quoted(cell)})`] : [] };
  }

  /** TRUE or FALSE, on which the shape of a result depends: taken as it is on the day of the copy. */
  flag(name: string): { readonly value: boolean; readonly holds: readonly string[] } {
    const argument = this.argument(name);
    if (!argument) return { value: Boolean(this.fallback(name)), holds: [] };
    const cell = this.single(argument, name);
    if (cell !== true && cell !== false && cell !== 0 && cell !== 1)
      throw new NotSaid(`${name} is neither TRUE nor FALSE`);
    const value = Boolean(cell);
    const same = [isNoText(argument.text), `1*${argument.text}=${Number(value)}`];
    return { value, holds: argument.area ? same : [] };
  }

  readings(name: string, mayHaveUnits = false): Readings {
    const argument = this.argument(name);
    if (!argument) throw new NotSaid(`${name} was left out`);
    return new Readings(argument, name, this.parameters[name].bounds, mayHaveUnits);
  }

  private fallback(name: string): unknown {
    const { fallback } = this.parameters[name];
    if (fallback === undefined) throw new NotSaid(`${name} was left out`);
    return fallback;
  }

  /** The cell's value today; nothing where that is not known. */
  private single({ cells }: Argument, name: string): CellValue | undefined {
    if (!cells) return undefined;
    if (cells.length !== 1 || cells[0].length !== 1) throw new NotSaid(`${name} is more than one cell`);
    return cells[0][0];
  }
}

/** Of a cell that holds TRUE, FALSE or a number; an error there is the answer itself. */
const isNoText = (text: string): string => `NOT(ISTEXT(${text}))`;
