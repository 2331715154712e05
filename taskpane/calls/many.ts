/** All runs of a table: which columns they are, and what PACE.SURVEY says of each. */
import { CellError, type CellValue } from '../../functions/cell';
import type { ManyChoice, OrderChoice } from '../choices';
import type { Heading } from '../headers';
import { headingOf, timeColumnFor, type Run, type Table } from '../runs';
import { columnArgument, leftOut, typedArgument, type Argument, type Pointing } from './argument';
import { askForRows, refusalOf } from './call';
import { endpointArgument } from './order';

export interface OneOfMany {
  readonly heading: Heading;
  readonly run: Run;
}

/** Every column of readings, each with its own times, over the rows of the chosen run. */
export function allRuns(table: Table, run: Run): readonly OneOfMany[] {
  return table.columns.flatMap(({ column, heading }) => {
    if (heading.quantity === 'time' || column === run.timeColumn) return [];
    const timeColumn = column === run.readingColumn ? run.timeColumn : timeColumnFor(table, column);
    return timeColumn === column ? [] : [{ heading, run: { ...run, readingColumn: column, timeColumn } }];
  });
}

/** Picked one by one, or else all that were read as the chosen run was. */
export function pickedRuns(table: Table, run: Run, { picked }: ManyChoice): readonly OneOfMany[] {
  const all = allRuns(table, run);
  if (picked) return all.filter((one) => picked.includes(one.run.readingColumn));
  const { quantity, unit } = headingOf(table, run.readingColumn);
  return all.filter(({ heading }) => heading.quantity === quantity && heading.unit === unit);
}

/** One PACE.SURVEY takes runs that share their times and stand side by side. */
export function isOneBlock(runs: readonly OneOfMany[]): boolean {
  return runs.every(
    ({ run }, place) =>
      run.timeColumn === runs[0].run.timeColumn && run.readingColumn === runs[0].run.readingColumn + place,
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
