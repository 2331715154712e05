/** The reading step: the run's readings → a column of amounts or concentrations. */
import { CellError, isRange, type CellRange } from '../../functions/cell';
import type { CellFunction } from '../../functions/define';
import type { ReadingChoice } from '../choices';
import type { Heading } from '../headers';
import { headingOf, type Run, type Table } from '../runs';
import { fieldsOf, functionOf, readingsParameter, signalNamed } from '../signals';
import { argumentOf, inShapeOf, columnArgument, leftOut, type Argument, type Pointing } from './argument';
import { ask, formulaText, refusalOf } from './call';

function argumentsFor(
  f: CellFunction,
  table: Table,
  run: Run,
  { inputs }: ReadingChoice,
  pointing: Pointing,
): Argument[] {
  const own = readingsParameter(f);
  const asked = new Map(fieldsOf(f).map(({ name, parameter }) => [name, parameter]));
  return Object.keys(f.parameters).map((name) => {
    if (name === own) return columnArgument(table, run, run.readingColumn);
    const parameter = asked.get(name);
    return parameter ? argumentOf(inputs[name] ?? '', pointing, parameter.kind === 'text') : leftOut;
  });
}

export function readingFormula(
  f: CellFunction,
  table: Table,
  run: Run,
  choice: ReadingChoice,
  pointing: Pointing,
): string {
  return formulaText(f.name, argumentsFor(f, table, run, choice, pointing));
}

export type ReadingAnswer =
  | { readonly kind: 'as it is' }
  /** Parameters that must be filled and are not yet. */
  | { readonly kind: 'missing'; readonly names: readonly string[] }
  /** `field` is the parameter the words speak of, where they name one. */
  | { readonly kind: 'refused'; readonly words: string; readonly field: string | null }
  /** A cell a reading, below each other however the table lies. */
  | { readonly kind: 'column'; readonly cells: CellRange };

export function readingAnswer(
  table: Table,
  run: Run,
  choice: ReadingChoice,
  pointing: Pointing,
): ReadingAnswer {
  const f = functionOf(choice.what);
  if (!f) return { kind: 'as it is' };
  const fields = fieldsOf(f);
  const missing = fields.filter(({ name, parameter }) => !parameter.optional && !choice.inputs[name]?.trim());
  if (missing.length > 0) return { kind: 'missing', names: missing.map(({ name }) => name) };
  const result = ask(f.name, argumentsFor(f, table, run, choice, pointing));
  if (!(result instanceof CellError))
    return { kind: 'column', cells: isRange(result) ? inShapeOf(table, result) : [[result]] };
  const words = refusalOf(result);
  return {
    kind: 'refused',
    words,
    field: fields.find(({ name }) => words.startsWith(`${name} `))?.name ?? null,
  };
}

/** What the column will be called: `c / (mol/L)`. */
export function convertedHeading(f: CellFunction, table: Table, run: Run): Pick<Heading, 'text' | 'unit'> {
  const text = signalNamed(f.name)?.becomes ?? f.name.toLowerCase();
  const ofReadings = f.result.unit === `of ${readingsParameter(f)}`;
  const unit = ofReadings ? headingOf(table, run.readingColumn).unit : f.result.unit;
  return { text, unit: /^of |\bunless\b/.test(unit) ? '' : unit };
}
