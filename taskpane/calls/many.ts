/** All runs of a table: which columns or rows they are, and what PACE.SURVEY says of each. */
import { CellError, type CellValue } from '../../functions/cell';
import type { ManyChoice, OrderChoice } from '../choices';
import type { Heading } from '../headers';
import { headingOf, stretchAt, timeColumnFor, type Run, type Table } from '../runs';
import { columnArgument, leftOut, typedArgument, type Argument, type Pointing } from './argument';
import { askForRows, refusalOf } from './call';
import { endpointArgument } from './order';

export interface OneOfMany {
  /** The column of its readings; the first row of a run that stands above or below others. */
  readonly key: number;
  readonly heading: Heading;
  readonly run: Run;
}

/** Every run that has a name, or else every column of readings, over the rows of the chosen run. */
export function allRuns(table: Table, run: Run): readonly OneOfMany[] {
  return table.stretches.length > 0 ? runsBelowEachOther(table, run) : runsBesideEachOther(table, run);
}

/** Each with the same columns as the chosen one, which keeps the rows it was given. */
function runsBelowEachOther(table: Table, run: Run): readonly OneOfMany[] {
  const heading = headingOf(table, run.readingColumn);
  const chosen = stretchAt(table, run.firstRow);
  return table.stretches.map((stretch) => {
    const { name, firstRow, lastRow } = stretch;
    return {
      key: firstRow,
      heading: { ...heading, text: name },
      run: stretch === chosen ? run : { ...run, firstRow, lastRow },
    };
  });
}

/** Each with its own times. */
function runsBesideEachOther(table: Table, run: Run): readonly OneOfMany[] {
  return table.columns.flatMap(({ column, heading }) => {
    if (heading.quantity === 'time' || column === run.timeColumn) return [];
    const timeColumn = column === run.readingColumn ? run.timeColumn : timeColumnFor(table, column);
    return timeColumn === column
      ? []
      : [{ key: column, heading, run: { ...run, readingColumn: column, timeColumn } }];
  });
}

/** Picked one by one, or else all that were read as the chosen run was. */
export function pickedRuns(
  table: Table,
  run: Run,
  { picked }: Pick<ManyChoice, 'picked'>,
): readonly OneOfMany[] {
  const all = allRuns(table, run);
  if (picked) return all.filter(({ key }) => picked.includes(key));
  const { quantity, unit } = headingOf(table, run.readingColumn);
  return all.filter(({ heading }) => heading.quantity === quantity && heading.unit === unit);
}

/** One PACE.SURVEY takes runs that share their times and stand side by side. */
export function isOneBlock(runs: readonly OneOfMany[]): boolean {
  const [{ run: first }] = runs;
  return runs.every(
    ({ run }, place) =>
      run.firstRow === first.firstRow &&
      run.timeColumn === first.timeColumn &&
      run.readingColumn === first.readingColumn + place,
  );
}

/** The arguments of PACE.SURVEY that come from the order step. */
export const surveyLaw = (order: OrderChoice, pointing: Pointing): readonly Argument[] => [
  order.order === 'free' ? leftOut : typedArgument(order.order),
  endpointArgument(order, pointing),
];

export interface Surveyed {
  readonly name: string;
  readonly order: number | null;
  readonly coefficient: number | null;
  readonly uncertainty: number | null;
  readonly halfLife: number | null;
  readonly flags: string;
}

/** One run, so that many can be surveyed one after another and stopped between. */
export function surveyOne(
  table: Table,
  { run, heading }: OneOfMany,
  order: OrderChoice,
  pointing: Pointing,
): Surveyed {
  const [headings, row] = askForRows('SURVEY', [
    columnArgument(table, run, run.timeColumn),
    columnArgument(table, run, run.readingColumn),
    ...surveyLaw(order, pointing),
  ]);
  const [first] = headings;
  const refused = first instanceof CellError ? refusalOf(first) : '';
  const at = (name: string): CellValue | undefined => row?.[headings.map(String).indexOf(name)];
  const numberAt = (name: string): number | null => {
    const cell = at(name);
    return typeof cell === 'number' ? cell : null;
  };
  return {
    name: heading.text,
    order: numberAt('order'),
    coefficient: numberAt('rate coefficient'),
    uncertainty: numberAt('standard uncertainty'),
    halfLife: numberAt('half life'),
    flags: refused || String(at('flags') ?? ''),
  };
}
