/** Fitted rate laws in a copy: their numbers as they were found, on the sheet "Workings", and whether they still fit. */
import type { Uncertainties } from '../commonParameters';
import type { WatchedLaw, WatchedLaws } from '../watchedLaw';
import { eachReading } from './eachReading';
import { stateOfFit } from './fitState';
import type { Given } from './given';
import type { Said } from './said';
import { headingRow, type Table, type WorkingCell } from './workings';

/** Columns of the table. */
const [name, order, rate, start, endpoint, firstTime, then, now] = [0, 1, 2, 3, 4, 5, 6, 7];

interface LawTable {
  readonly table: Table;
  readonly found: readonly WatchedLaw[];
}

/**
 * The table of a call's fits.
 *
 * @throws NotSaid where the call cannot be told; InvalidInput, NotDetermined and CellError of the fit itself
 */
export function tableOfLaws<V>(fits: WatchedLaws<V>, given: Given): LawTable {
  const found = fits.of(given.allToday<V>());
  const far = given.fromWorkings();
  const of = ['order', 'endpoint', 'uncertainties'].flatMap((one) => {
    const argument = far.names.includes(one) ? far.argument(one) : undefined;
    return argument ? [`${one} ${argument.text}`] : [];
  });
  const [x, y] = ['times', fits.readings].map((one) => far.readings(one).whole);
  const table = given.workings.table([`${fits.what}: ${y} over ${x}`, ...of].join(', '), (own) => [
    headingRow(
      'fit',
      'order n',
      'κ, per time',
      'y₀',
      'y∞',
      'first time',
      'sum of squares then',
      'sum of squares now',
      'state',
    ),
    ...found.map((fit, n) => fitRow(fit, far, own, n + 1)),
  ]);
  return { table, found };
}

function fitRow(fit: WatchedLaw, far: Given, own: Table, row: number): WorkingCell[] {
  const { law, residualSumOfSquares } = fit;
  const y = readingsOf(fit, far);
  const cells: WorkingCell[] = [];
  cells[name] = fit.name || 'the law';
  cells[order] = law.order;
  cells[rate] = law.rate;
  cells[start] = law.start;
  cells[endpoint] = law.endpoint;
  cells[firstTime] = law.firstTime;
  cells[then] = residualSumOfSquares;
  cells[now] = { formula: sumOfSquares(fit, y, far, own, row) };
  const [before, after] = [own.cell(row, then), own.cell(row, now)];
  return [...cells, { formula: stateOfFit(before, after, `SUMSQ(${y})`) }];
}

function readingsOf({ line }: WatchedLaw, far: Given): string {
  if (line === undefined) return far.readings('values').whole;
  const times = far.readings('times');
  const block = far.readings('block');
  return times.columns > 1 ? block.row(line) : block.column(line);
}

function sumOfSquares(fit: WatchedLaw, y: string, far: Given, own: Table, row: number): string {
  const x = far.readings('times').whole;
  const residual = `${y}-(${heightText(fit, own, row, x)})`;
  const weights = far.names.includes('uncertainties') ? far.today<Uncertainties>('uncertainties') : undefined;
  const u = weights === undefined ? '' : weights === 'relative' ? y : far.readings('uncertainties').whole;
  const known = [x, y, ...(u === '' || u === y ? [] : [u])].map((one) => `ISNUMBER(${one})`).join('*');
  return `SUM(IF(${known},(${u === '' ? residual : `(${residual})/${u}`})^2,0))`;
}

/** y∞ + (y₀ − y∞)·φ(κt; n), by the numbers of its row. */
function heightText({ law }: Pick<WatchedLaw, 'law'>, own: Table, row: number, time: string): string {
  const at = (column: number): string => own.cell(row, column);
  const s = `${at(rate)}*(${time}-${at(firstTime)})`;
  return `${at(endpoint)}+(${at(start)}-${at(endpoint)})*${shareText(law.order, at(order), s)}`;
}

/** Near order 1 the power loses its digits, and a series keeps them. */
const nearFirstOrder = 1e-4;

function shareText(n: number, cell: string, s: string): string {
  if (n === 1) return `EXP(-${s})`;
  const u = `((${cell}-1)*${s})`;
  if (Math.abs(n - 1) < nearFirstOrder) return `EXP(-${s}*(1-${u}/2+${u}^2/3))`;
  // below order 1 the reactant is used up, and stays so
  return `IF(1+${u}>0,(1+${u})^(1/(1-${cell})),0)`;
}

/** The fitted law at its own times or at others: live in its numbers. */
export function sayCurve<V>(fits: WatchedLaws<V>, given: Given): Said {
  const { table, found } = tableOfLaws(fits, given);
  const times = given.readings(given.has('attimes') ? 'attimes' : 'times');
  const height = (time: string): string => heightText(found[0], table, 1, time);
  return {
    ...eachReading(times, [], (time) => `IF(${time}<${table.cell(1, firstTime)},NA(),${height(time)})`),
    ofTheDay: given.ofTheDay(
      'the law that was fitted, whose numbers stand on the sheet Workings',
      ...given.names.filter((one) => one !== 'attimes'),
    ),
  };
}
