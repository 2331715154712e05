import { answeredEstimate } from '../calls/estimate';
import { coefficientUnit, givenBy, orderFormula, orderRows } from '../calls/order';
import type { CellRange } from '../../functions/cell';
import type { OrderChoice } from '../choices';
import { columnFormat, everyRow, numbersIn, tableFormats, type NumberFormats } from '../numberFormats';
import { headingOf, type Run, type Table } from '../runs';
import type { State } from '../store';
import {
  alongRun,
  chartOf,
  detailColumns,
  estimateFormats,
  headingsFor,
  oneFormula,
  type Insertion,
  type Size,
} from './insertion';
import { readsOf } from './rate';

/** Of the table that PACE.ORDERS answers: its headings, six simple orders and the free one. */
const orderTable: Size = { rows: 8, columns: 9 };

export function orderInsertion(
  table: Table,
  run: Run,
  { order, pointedAt }: Pick<State, 'order' | 'pointedAt'>,
  withDetail: boolean,
): Insertion {
  const hasDetail = !['curve', 'orders'].includes(order.answer);
  const detail = hasDetail && withDetail;
  const given = givenBy(table, run, order, { sheet: table.sheet, pointedAt });
  const size = sizeOf(order, run, detail);
  const name = orderName(order);
  const insertion: Insertion = {
    name,
    ...oneFormula(orderFormula(given, order, detail), size, () =>
      formatsFor(order, orderRows(given, order), size),
    ),
    headings: order.answer === 'orders' ? [] : headingsFor(name, unitFor(table, run, order), detail),
    reads: readsOf(table, run),
    hasDetail,
    ...(order.answer !== 'orders' && { chart: chartOf(table, run, order.answer === 'curve') }),
  };
  return order.answer === 'curve' ? alongRun(table, insertion) : insertion;
}

function formatsFor({ answer }: OrderChoice, rows: CellRange, { columns }: Size): NumberFormats {
  if (answer === 'orders') return tableFormats(rows);
  if (answer !== 'curve') return estimateFormats(answeredEstimate(rows), columns);
  return everyRow([columnFormat(numbersIn(rows))], rows.length);
}

function sizeOf({ answer }: OrderChoice, run: Run, detail: boolean): Size {
  if (answer === 'orders') return orderTable;
  if (answer === 'curve') return { rows: run.lastRow - run.firstRow + 1, columns: 1 };
  return { rows: 1, columns: detailColumns(detail) };
}

/** `rate coefficient, order 1`: for headings and messages. */
export function orderName({ order, answer }: Pick<OrderChoice, 'order' | 'answer'>): string {
  const ofOrder = order === 'free' ? 'fitted order' : `order ${order}`;
  return {
    coefficient: `rate coefficient, ${ofOrder}`,
    halfLife: `half life, ${ofOrder}`,
    order: 'order, fitted',
    curve: `fit, ${ofOrder}`,
    orders: 'orders compared',
  }[answer];
}

/** The unit of k at a fitted order is known only with the order. */
function unitFor(table: Table, run: Run, { order, answer }: OrderChoice): string {
  if (answer === 'halfLife') return headingOf(table, run.timeColumn).unit;
  if (answer === 'curve') return headingOf(table, run.readingColumn).unit;
  return answer === 'coefficient' && order !== 'free' ? coefficientUnit(Number(order), table, run) : '';
}
