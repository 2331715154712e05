/** The order step: what the functions of that family say of the chosen run. */
import { CellError, type CellRange, type CellValue } from '../../functions/cell';
import type { OrderAnswerKind, OrderChoice } from '../choices';
import { columnOf, headingOf, pointsOf, type Run, type Table } from '../runs';
import { argumentOf, columnArgument, leftOut, quoted, truth, type Argument, type Pointing } from './argument';
import { ask, askForRows, callText, refusalOf } from './call';
import { answeredEstimate, type Answered, type Estimate } from './estimate';

export interface OrderLine {
  readonly order: number | null;
  readonly isFree: boolean;
  /** Share of the evidence among the simple orders; `null` where they are not weighed. */
  readonly weight: number | null;
  readonly verdict: string;
}

export interface Point {
  readonly x: number;
  readonly y: number;
}

export interface OrderAnswer {
  /** The order that the rest belongs to: the one chosen, or the one fitted. */
  readonly order: Answered<Estimate>;
  readonly coefficient: Answered<Estimate>;
  readonly halfLife: Answered<Estimate>;
  /** Of the coefficient, as PACE.UNIT writes it; in words where a heading names no unit. */
  readonly unit: string;
  readonly curve: readonly Point[];
  readonly residuals: readonly Point[];
}

/** The arguments of every function of this family. */
interface Given {
  readonly times: Argument;
  readonly values: Argument;
  readonly endpoint: Argument;
}

/** Times, values and endpoint, as the run and the choice have them. */
export function givenBy(table: Table, run: Run, choice: OrderChoice, pointing: Pointing): Given {
  return {
    times: columnArgument(table, run, run.timeColumn),
    values: columnArgument(table, run, run.readingColumn),
    endpoint: endpointArgument(choice, pointing),
  };
}

export function endpointArgument({ endpointKind, endpoint }: OrderChoice, pointing: Pointing): Argument {
  if (endpointKind === 'free') return quoted('free');
  return endpointKind === 'zero' ? leftOut : argumentOf(endpoint, pointing);
}

/** The order typed, or the call that fits it. */
function orderArgument(order: string, { times, values, endpoint }: Given): Argument {
  if (order !== 'free') return { value: Number(order), text: order };
  const fitted = [times, values, endpoint];
  return { value: ask('ORDER', fitted), text: callText('ORDER', fitted) };
}

const calls: Readonly<
  Record<OrderAnswerKind, (given: Given, order: Argument, detail: Argument) => [string, readonly Argument[]]>
> = {
  coefficient: ({ times, values, endpoint }, order, detail) => [
    'COEFFICIENT',
    [times, values, order, endpoint, leftOut, detail],
  ],
  halfLife: ({ times, values, endpoint }, order, detail) => [
    'HALFLIFE',
    [times, values, order, endpoint, leftOut, detail],
  ],
  order: ({ times, values, endpoint }, _, detail) => ['ORDER', [times, values, endpoint, leftOut, detail]],
  curve: ({ times, values, endpoint }, order) => ['CURVE', [times, values, order, leftOut, endpoint]],
  orders: ({ times, values, endpoint }) => ['ORDERS', [times, values, endpoint]],
};

/** As it is typed into a cell; a fitted order stands in it as the call that fits it. */
export function orderFormula(given: Given, choice: OrderChoice, detail: boolean): string {
  const order =
    choice.order === 'free'
      ? { value: undefined, text: callText('ORDER', [given.times, given.values, given.endpoint]) }
      : orderArgument(choice.order, given);
  return `=${callText(...calls[choice.answer](given, order, detail ? truth(true) : leftOut))}`;
}

/** What such a formula answers in the sheet, with all of the standard row where it has one. */
export function orderRows(given: Given, choice: OrderChoice): CellRange {
  return askForRows(...calls[choice.answer](given, orderArgument(choice.order, given), truth(true)));
}

/** The verdict on every order, for which the endpoint matters and the chosen order does not. */
export function compareOrders({ times, values, endpoint }: Given): Answered<readonly OrderLine[]> {
  const rows = askForRows('ORDERS', [times, values, endpoint]);
  const [first] = rows[0];
  if (first instanceof CellError) return { refused: refusalOf(first) };
  const headings = rows[0].map(String);
  const at = (row: readonly CellValue[], heading: string): CellValue => row[headings.indexOf(heading)];
  const numberAt = (row: readonly CellValue[], heading: string): number | null => {
    const cell = at(row, heading);
    return typeof cell === 'number' ? cell : null;
  };
  const lines = rows.slice(1).map((row, place, all): OrderLine => ({
    order: numberAt(row, 'order'),
    isFree: place === all.length - 1,
    weight: numberAt(row, 'AICc weight'),
    verdict: wordsIn(at(row, 'verdict')) || wordsIn(at(row, 'order')),
  }));
  return { ok: lines };
}

/** An order that could not be fitted says why in its cells. */
const wordsIn = (cell: CellValue): string =>
  cell instanceof CellError ? refusalOf(cell) : typeof cell === 'string' ? cell : '';

export function orderAnswer(table: Table, run: Run, choice: OrderChoice, pointing: Pointing): OrderAnswer {
  const given = givenBy(table, run, choice, pointing);
  const order = orderArgument(choice.order, given);
  const estimate = (kind: OrderAnswerKind): Answered<Estimate> =>
    answeredEstimate(askForRows(...calls[kind](given, order, truth(true))));
  return {
    order: choice.order === 'free' ? estimate('order') : { ok: exactly(Number(choice.order)) },
    coefficient: estimate('coefficient'),
    halfLife: estimate('halfLife'),
    unit: typeof order.value === 'number' ? coefficientUnit(order.value, table, run) : '',
    ...fitted(table, run, given, order),
  };
}

const exactly = (value: number): Estimate => ({
  value,
  uncertainty: null,
  lower: null,
  upper: null,
  degreesOfFreedom: null,
});

const curvePoints = 60;

/** The fit at even steps, and what it leaves of each reading. */
function fitted(
  table: Table,
  run: Run,
  { times, values, endpoint }: Given,
  order: Argument,
): Pick<OrderAnswer, 'curve' | 'residuals'> {
  const points = pointsOf(table, run);
  const at = points.map(({ time }) => time);
  const [from, to] = [
    at.reduce((a, b) => Math.min(a, b), Infinity),
    at.reduce((a, b) => Math.max(a, b), -Infinity),
  ];
  const steps = Array.from({ length: curvePoints + 1 }, (_, i) => from + ((to - from) * i) / curvePoints);
  const heights = (wanted: readonly number[]): readonly CellValue[] =>
    askForRows('CURVE', [
      times,
      values,
      order,
      { value: wanted.map((time) => [time]), text: '' },
      endpoint,
    ]).map(([height]) => height);
  const numeric = (xs: readonly number[], ys: readonly CellValue[]): Point[] =>
    xs.flatMap((x, place) => {
      const y = ys[place];
      return typeof y === 'number' ? [{ x, y }] : [];
    });
  if (points.length < 2) return { curve: [], residuals: [] };
  const here = heights(at);
  const left = here.map((height, place) =>
    typeof height === 'number' ? points[place].value - height : null,
  );
  return { curve: numeric(steps, heights(steps)), residuals: numeric(at, left) };
}

/** As PACE.UNIT writes it; a reading without a unit has none in any power. */
export function coefficientUnit(order: number, table: Table, run: Run): string {
  const [reading, time] = [headingOf(table, run.readingColumn), headingOf(table, run.timeColumn)];
  if (time.unit === '') return 'time unit⁻¹ and reading unit, by the order';
  const perTime = unitText(1, 'mol/L', time.unit);
  if (reading.unit === '1' || order === 1) return perTime;
  return unitText(order, reading.unit, time.unit) || `${perTime}, with the reading unit to the power 1 − n`;
}

function unitText(order: number, concentration: string, time: string): string {
  if (concentration === '') return '';
  const answer = ask('UNIT', [{ value: order, text: '' }, quoted(concentration), quoted(time)]);
  return typeof answer === 'string' ? answer : '';
}

/** For a rising run the end is asked for: nothing says where it lies. */
export function rises(table: Table, run: Run): boolean {
  const values = columnOf(table, run.readingColumn, run)
    .flat()
    .filter((cell) => typeof cell === 'number');
  return values.length > 1 && values[values.length - 1] > values[0];
}
