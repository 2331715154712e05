import { coefficientUnit, givenBy, orderFormula } from '../calls/order';
import type { OrderChoice } from '../choices';
import { headingOf, type Run, type Table } from '../runs';
import type { State } from '../store';
import { alongRun, detailColumns, headingsFor, oneFormula, type Insertion, type Size } from './insertion';
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
  const formula = orderFormula(givenBy(table, run, order, { sheet: table.sheet, pointedAt }), order, detail);
  const name = orderName(order);
  const insertion: Insertion = {
    name,
    ...oneFormula(formula, sizeOf(order, run, detail)),
    headings: order.answer === 'orders' ? [] : headingsFor(name, unitFor(table, run, order), detail),
    reads: readsOf(table, run),
    hasDetail,
  };
  return order.answer === 'curve' ? alongRun(table, insertion) : insertion;
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
