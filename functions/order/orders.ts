import { compareOrders, type OrderRow, type OrderTable } from '../../src/order/orders';
import type { Series } from '../../src/series/series';
import { orNotAvailable } from '../results';
import type { CellValue } from '../cell';
import { tableOfLaws } from '../builtIn/law';
import { defineFunction, type Values } from '../define';
import { seriesOf, uncertaintiesOf } from '../run';
import { watched, type WatchedLaws } from '../watchedLaw';
import { lawLines, lawMethod, lawParameters, lawQuantities, runParameters } from './lawParameters';

const headings = [
  'order',
  'rate coefficient',
  'standard uncertainty',
  'half life',
  'R² of straight-line plot',
  'residual deviation',
  'AICc weight',
  'runs test p',
  'verdict',
] as const;

const parameters = { ...runParameters, ...lawParameters };

const allLaws: WatchedLaws<Values<typeof parameters>> = {
  what: 'Rate laws of simple orders and a free one',
  readings: 'values',
  of(given) {
    const { table, series } = compared(given);
    return [...table.rows, table.free].flatMap((row) =>
      row.fit ? [watched(row.fit, series, row === table.free ? 'free order' : `order ${row.order}`)] : [],
    );
  },
};

export default defineFunction({
  name: 'ORDERS',
  family: 'order',
  summary: 'Which order of reaction a run follows: the simple orders and a free one side by side.',
  equations: {
    lines: [...lawLines, 'AICc = N ln(S/N) + 2p + 2p(p + 1)/(N − p − 1)', 'w = exp(−Δ/2)/(∑ exp(−Δ/2))'],
    where: {
      ...lawQuantities,
      AICc: 'Akaike’s criterion, corrected for few readings',
      N: 'number of readings',
      S: 'sum of squared residuals',
      p: 'number of fitted parameters, the scatter counted',
      w: 'weight of one order; the sum is over all simple orders',
      Δ: 'its AICc above the least',
    },
  },
  method: `${lawMethod} Orders 0, ½, 1, 1½, 2 and 3 and a free order are fitted. The weight w is each simple order's share of the evidence by AICc (Hurvich and Tsai 1989). The runs test asks whether the residuals run in a pattern. The verdict rests on the weights, the free order's limits and how many half lives were followed. R² of the straight-line plot is shown, and never decides.`,
  uncertainty:
    'k has its standard uncertainty from the curvature of the fit. The free order’s limits behind the verdict are those of the profile likelihood: PACE.ORDER with detail TRUE shows them.',
  parameters,
  result: { unit: 'as the headings say', shape: 'table' },
  // halved every 10
  example: {
    formula: '=PACE.ORDERS({0;10;20;30;40;50},{32;16;8;4;2;1})',
    equals: [['order'], [0], [0.5], [1, 0.06931471805599453], [1.5], [2], [3], [1, 0.06931471805599453]],
  },
  refusals: [
    {
      formula: '=PACE.ORDERS({0;10;20;30},{0;4;6;7})',
      mend: 'Give the reading at infinite time as endpoint, or "free" to have it fitted.',
    },
  ],
  seeAlso: ['ORDER', 'COEFFICIENT', 'HALVINGS', 'CHECK'],
  reference: 'doi:10.1351/goldbook.O04322; doi:10.1093/biomet/76.2.297',
  isLong: { fromCells: 1500 },
  run(given) {
    const { rows, free } = compared(given).table;
    return [[...headings], ...rows.map((row) => cells(row)), cells(free, 'only simple orders are weighed')];
  },
  fits: (given) => tableOfLaws(allLaws, given).table,
});

function compared({ times, values, endpoint, uncertainties }: Values<typeof parameters>): {
  readonly table: OrderTable;
  readonly series: Series;
} {
  const series = seriesOf(times, values);
  const weights = uncertaintiesOf(series, values, uncertainties);
  return { table: compareOrders(series, { endpoint, uncertainties: weights }), series };
}

function cells(row: OrderRow, noWeight = 'too few readings to weigh the orders'): CellValue[] {
  const { fit, why } = row;
  const noScatter = why || 'as many parameters as readings leave no scatter to judge by';
  return [
    orNotAvailable(row.order, why),
    orNotAvailable(fit?.rateCoefficient, why),
    orNotAvailable(fit?.standardUncertainties.rateCoefficient, noScatter),
    orNotAvailable(fit?.halfLife, why),
    orNotAvailable(row.straightLineR2, why || 'fewer than three readings are clear of the end'),
    orNotAvailable(fit?.residualDeviation, noScatter),
    orNotAvailable(row.weight, why || noWeight),
    orNotAvailable(row.runsProbability, why || 'too few residuals for a runs test'),
    row.verdict,
  ];
}
