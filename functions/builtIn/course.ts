/** What is read off a run reading by reading, said in built-in functions. */
import { InvalidInput, NotDetermined } from '../../src/errors';
import { normalisedTimes } from '../../src/order/normalisedTime';
import type { CellValue } from '../cell';
import type { Given } from './given';
import { Means } from './means';
import { holdsOf } from './phrase';
import { SortedRun } from './sortedRun';
import { NotSaid, type Said } from './said';
import { where } from './text';
import { headingRow, workingFormula, type WorkingCell } from './workings';

/** Σ[(cᵢ + cᵢ₋₁)/2]ᵝ(tᵢ − tᵢ₋₁) up to each reading. */
export function sayNormalTime(given: Given): Said {
  const run = new SortedRun(given);
  const [exponent, b] = [given.number('exponent'), given.numberFromWorkings('exponent')];
  run.requireShort(true);
  const title = `Normalised time with the exponent ${b}: ${run.name}`;
  const table = given.workings.table(title, (own) => {
    const today = normalisedToday(given, run);
    return [
      headingRow('time', 'normalised time'),
      [workingFormula(run.time(0), run.today?.times[0]), 0],
      ...Array.from({ length: run.size - 1 }, (_, n): WorkingCell[] => {
        const step = `(${run.time(n + 1)}-${run.time(n)})`;
        const mean = `((${run.value(n)}+${run.value(n + 1)})/2)`;
        const sum = `${own.cell(n + 1, 1)}+IF(${b}=0,1,${mean}^${b})*${step}`;
        return [run.time(n + 1), sum].map((formula, column) =>
          workingFormula(`IF(ISNUMBER(${run.time(n + 1)}),${formula},"")`, today?.[column][n + 1]),
        );
      }),
    ];
  });
  const least = `MIN(${run.values})`;
  const allowed = `OR(AND(${exponent.text}>=0,${exponent.text}=INT(${exponent.text})),${least}>0,AND(${exponent.text}>0,${least}>=0))`;
  const holds = [...run.holds, `${run.different}>1`, ...holdsOf(exponent), allowed];
  const [times, values] = [given.readings('times'), given.readings('values')];
  return {
    cell(row, column) {
      const [time, value] = [times.element(row, column), values.element(row, column)];
      // readings of one time share theirs
      const own = `INDEX(${table.range(1, 1, run.size)},MATCH(${time},${run.times},0))`;
      return where(holds, `IF(ISNUMBER(${time})*ISNUMBER(${value}),IFERROR(${own},NA()),"")`);
    },
  };
}

/** Times and normalised times, empty below the last; nothing where they cannot be. */
function normalisedToday(given: Given, { today, size }: SortedRun): CellValue[][] | undefined {
  if (!today) return undefined;
  try {
    const normalised = normalisedTimes(today, given.today<number>('exponent'));
    return [today.times, normalised].map((known) => Array.from({ length: size }, (_, n) => known[n] ?? ''));
  } catch (error) {
    if (error instanceof InvalidInput || error instanceof NotDetermined) return undefined;
    throw error;
  }
}

/** The times that each halving of the distance from the end took. */
export function sayHalvings(given: Given): Said {
  const run = new SortedRun(given);
  const means = new Means(given, run);
  const [times, values] = means.columns;
  const { numbers, size } = run;
  if (size < 2) throw new NotSaid('fewer than two readings');
  const end = given.has('endpoint') ? given.number('endpoint') : undefined;
  const from = end?.text ?? '0';
  const first = `(${means.mean(0)}-${from})`;
  const holds = [
    ...holdsOf(...(end ? [end] : [])),
    `${run.different}>1`,
    // a rising column needs its end
    ...(end ? [] : [`OR(${run.direction}<0,MAX(${run.values})=MIN(${run.values}))`]),
    `${first}<>0`,
  ];
  const reached = (halving: number): string => {
    if (halving === 0) return run.time(0);
    const left = 0.5 ** halving;
    const placeOf = (share: number): string =>
      `MIN(IF(ISNUMBER(${values}),IF((${values}-${from})/${first}<=${share},${numbers},${size + 1}),${size + 1}))`;
    const place = placeOf(left);
    const share = (back: 0 | 1): string => `((INDEX(${values},${place}-${back})-${from})/${first})`;
    const time = (back: 0 | 1): string => `INDEX(${times},${place}-${back})`;
    const part = `IF(${share(0)}>0,LN(${share(1)}/${left})/LN(${share(1)}/${share(0)}),(${share(1)}-${left})/(${share(1)}-${share(0)}))`;
    const found = `${time(1)}+${part}*(${time(0)}-${time(1)})`;
    // a reading at or past the end ends the reckoning after the first level it meets
    const isOver = halving === 1 ? 'FALSE' : `AND(${place}=${placeOf(2 * left)},${share(0)}<=0)`;
    return `IF(${place}>${size},NA(),IF(${isOver},NA(),${found}))`;
  };
  return { cell: (row) => where(run.holds, where(holds, `${reached(row + 1)}-${reached(row)}`)) };
}
