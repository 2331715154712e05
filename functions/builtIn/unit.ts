/** The unit of a rate coefficient, said in built-in functions. */
import { rateCoefficientUnit } from '../../src/order/unit';
import type { Given } from './given';
import { isNumberText } from './phrase';
import { oneValue, type Said } from './said';
import { quoted, where } from './text';

/** What an order in a cell may be changed to. */
const orders = [0, 0.5, 1, 1.5, 2, 2.5, 3] as const;

export function sayUnit(given: Given): Said {
  const [concentration, time] = [given.word('concentrationunit'), given.word('timeunit')];
  const holds = [...concentration.holds, ...time.holds];
  const unit = (order: number): string => quoted(rateCoefficientUnit(order, concentration.value, time.value));
  const order = given.number('order');
  if (isNumberText(order.text)) return oneValue(where(holds, unit(given.constant('order').value)));
  const list = orders.map(unit).join(',');
  const place = `MATCH(${order.text},{${orders.join(',')}},0)`;
  return oneValue(where([...order.holds, ...holds, `ISNUMBER(${place})`], `INDEX({${list}},1,${place})`));
}
