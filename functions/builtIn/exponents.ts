/** Partial orders from initial rates, said in built-in functions. */
import { commonOrders } from '../../src/order/exponents';
import { standardRowTexts } from './estimate';
import type { Given } from './given';
import { NotSaid, type Said } from './said';
import { numberText, where } from './text';

/** For more, whether each was varied by itself is beyond a formula. */
const mostReactants = 2;

export function sayExponents(given: Given): Said {
  const [rates, block] = [given.column('rates'), given.column('concentrations')];
  const detail = given.flag('detail');
  if (rates.columns > 1 || block.rows !== rates.rows) throw new NotSaid('runs do not lie in rows');
  if (block.columns > mostReactants) throw new NotSaid(`more than ${mostReactants} reactants`);
  const r = rates.whole;
  const columns = Array.from({ length: block.columns }, (_, n) => block.column(n));
  const known = [r, ...columns].map((column) => `ISNUMBER(${column})`).join('*');
  const each = (text: string): string => `IF(${known},${text},0)`;
  const [unknowns, count] = [columns.length + 1, `SUM(${known})`];
  const freedom = `(${count}-${unknowns})`;
  const logs = columns.map((column) => each(`LN(${column})`));
  const unit = (n: number): string =>
    `{${Array.from({ length: unknowns }, (_, m) => (m === n ? 1 : 0)).join(',')}}`;
  const design = [unit(0), ...logs.map((log, n) => `${log}*${unit(n + 1)}`)].join('+');
  const fit = `LINEST(${each(`LN(${r})`)},${known}*(${design}),FALSE,TRUE)`;
  const holds = [
    `${rates.doubt}+${block.doubt}=0`,
    `SUM(${each([r, ...columns].map((column) => `(${column}<=0)`).join('+'))})=0`,
    ...detail.holds,
  ];
  const enough = [
    `${freedom}>=0`,
    ...columns.map((column) => varied(column, known)),
    ...independent(logs, count, each),
  ];
  // LINEST counts runs with a gap among its degrees of freedom, and gives the last term first
  const share = `SQRT(${rates.rows - unknowns}/${freedom})`;
  const part = (row: 1 | 2, n: number): string =>
    `INDEX(${fit},${row},${unknowns - n})${row === 2 ? `*${share}` : ''}`;
  const order = (n: number): string[] => {
    const row = standardRowTexts({ value: part(1, n), uncertainty: part(2, n), degreesOfFreedom: freedom });
    return [...row, nearestOrder(row)];
  };
  const k = (): string[] => {
    const [value, u] = [`EXP(${part(1, 0)})`, part(2, 0)];
    const seen = (text: string): string => `IF(${freedom}>0,${text},NA())`;
    const limit = (sign: string): string => seen(`${value}*EXP(${sign}TINV(0.05,${freedom})*${u})`);
    return [value, seen(`${value}*${u}`), limit('-'), limit(''), freedom, '""'];
  };
  const rows = [...columns.map((_, n) => order(n + 1)), k()];
  const cells = detail.value ? rows : [rows.map(([value]) => value)];
  return {
    cell: (row, column) => where(holds, `IF(AND(${enough.join(',')}),${cells[row][column]},NA())`),
  };
}

const varied = (column: string, known: string): string =>
  `MAX(IF(${known},${column},""))>MIN(IF(${known},${column},""))`;

/** Two reactants changed together cannot be told apart: their logarithms lie on one line. */
function independent(logs: readonly string[], count: string, each: (text: string) => string): string[] {
  if (logs.length < 2) return [];
  const from = (log: string): string => each(`${log}-SUM(${log})/${count}`);
  const [a, b] = logs.map(from);
  return [`SUM(${a}*${b})^2<0.999999999999*SUM(${a}^2)*SUM(${b}^2)`];
}

/** The simple order nearest to the value, where the limits hold it. */
function nearestOrder([value, , lower, upper, freedom]: readonly string[]): string {
  const list = `{${commonOrders.map((order) => numberText(order).replace(/[()]/g, '')).join(',')}}`;
  const away = `ABS(${list}-${value})`;
  const nearest = `INDEX(${list},1,MATCH(MIN(${away}),${away},0))`;
  return `IF(${freedom}>0,IF(AND(${nearest}>=${lower},${nearest}<=${upper}),${nearest},""),"")`;
}
