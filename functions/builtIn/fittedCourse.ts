/** A fitted mechanism in a copy: on the sheet "Workings", its course as it was found beside the readings of now. */
import type { Scheme } from '../../src/scheme/scheme';
import type { Column } from '../column';
import { startsOtherwise, stateOfFit } from './fitState';
import type { Given } from './given';
import { headingRow, type Table, type WorkingCell } from './workings';

export interface FittedCourse {
  readonly scheme: Scheme;
  /** One a reaction; nothing for one that the readings cannot tell. */
  readonly coefficients: readonly (number | null)[];
  readonly initial: Column;
  readonly times: Column;
  /** What was read of each species. */
  readonly observed: readonly Column[];
  /** The concentration of each species at each time; nothing where there is no time. */
  readonly course: readonly (ArrayLike<number> | null)[];
}

/** @throws as any {@link FitTable} */
export function tableOfCourse<V>(fittedOf: (values: V) => FittedCourse, given: Given): Table {
  const fitted = fittedOf(given.allToday<V>());
  const { scheme, coefficients, initial } = fitted;
  const far = given.fromWorkings();
  const start = far.readings('initial');
  const name = nameOf(scheme, far);
  const course = courseTable(`Course of ${name}`, fitted, far);
  return given.workings.table(`Mechanism ${name}`, (own) => {
    const firstStart = scheme.reactions.length + 4;
    const [startThen, startNow] = [0, 1].map((c) => own.range(firstStart, c, scheme.species.length));
    const changes = [[startThen, startNow], course.times].map(([then, now]) => unlike(then, now)).join('+');
    const state = stateOfFit(own.cell(1, 0), own.cell(1, 1), course.scale);
    return [
      headingRow('sum of squares then', 'sum of squares now', 'state'),
      [
        sumOfSquares(fitted),
        { formula: course.sumOfSquares },
        { formula: `IF(${changes}=0,${state},"${startsOtherwise}")` },
      ],
      headingRow('rate coefficient', 'of'),
      ...scheme.reactions.map(({ words }, n): WorkingCell[] => [coefficients[n] ?? 'cannot be told', words]),
      headingRow('start then', 'start now', 'of'),
      ...scheme.species.map((one, j): WorkingCell[] => [initial.numbers[j], numberIn(start.at(j)), one]),
    ];
  });
}

/** Other arguments may lead to another fit. */
function nameOf({ reactions }: Scheme, far: Given): string {
  const steps = reactions.map(({ words }) => words).join('; ');
  const [observed, times] = ['observed', 'times'].map((name) => far.readings(name).whole);
  const others = ['initial', 'coefficients'].map((name) => `${name} ${far.readings(name).whole}`);
  return [`${steps}: ${observed} over ${times}`, ...others].join(', ');
}

interface CourseTable {
  /** Then and now. */
  readonly times: readonly [string, string];
  readonly sumOfSquares: string;
  readonly scale: string;
}

/** Time by time: each reading of now, and beside it the course as it was found. */
function courseTable(title: string, fitted: FittedCourse, far: Given): CourseTable {
  const { scheme, times, observed, course } = fitted;
  const [time, readings] = [far.readings('times'), far.readings('observed')];
  const isTurned = time.columns > 1;
  const read = (i: number, j: number): string => (isTurned ? readings.element(j, i) : readings.element(i, j));
  const table = far.workings.table(title, () => [
    headingRow(
      'time then',
      'time now',
      ...scheme.species.flatMap((one) => [`${one}, read`, `${one}, fitted`]),
    ),
    ...course.map((heights, i): WorkingCell[] => [
      times.numbers[i],
      numberIn(time.at(i)),
      ...scheme.species.flatMap((_, j) => (heights ? [numberIn(read(i, j)), heights[j]] : [null, null])),
    ]),
  ]);
  const column = (n: number): string => table.range(1, n, course.length);
  const seen = observed.flatMap(({ numbers }, j) => (numbers.some((value) => value !== null) ? [j] : []));
  const each = (of: (read: string, fitted: string) => string): string =>
    seen.map((j) => of(column(2 * j + 2), column(2 * j + 3))).join('+');
  return {
    times: [column(0), column(1)],
    sumOfSquares: each((y, fit) => `SUM(IF(ISNUMBER(${y}),(${y}-${fit})^2,0))`),
    scale: `(${each((y) => `SUMSQ(${y})`)})`,
  };
}

/** From the course as it stands in the table: the search itself may follow it to other digits. */
const sumOfSquares = ({ observed, course }: FittedCourse): number =>
  observed
    .flatMap(({ numbers }, j) =>
      numbers.map((value, i) => (value === null ? 0 : (value - (course[i]?.[j] ?? value)) ** 2)),
    )
    .reduce((sum, square) => sum + square, 0);

const numberIn = (cell: string): WorkingCell => ({ formula: `IF(ISNUMBER(${cell}),${cell},"")` });

/** How many cells of two columns differ. */
const unlike = (then: string, now: string): string => `SUM(IF(${then}=${now},0,1))`;
