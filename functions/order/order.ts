import { fitRateLaw, type RateLawFit } from '../../src/order/fit';
import { orderEstimate } from '../../src/order/profile';
import type { Series } from '../../src/series/series';
import { detail } from '../commonParameters';
import { tableOfLaws } from '../builtIn/law';
import { defineFunction, type Values } from '../define';
import { uncertaintyOf } from '../uncertaintyOf';
import { standardRow } from '../results';
import { seriesOf, uncertaintiesOf } from '../run';
import { watched, type WatchedLaws } from '../watchedLaw';
import { lawEquations, lawMethod, lawParameters, runParameters } from './lawParameters';

const parameters = { ...runParameters, ...lawParameters };

const freeLaw: WatchedLaws<Values<typeof parameters>> = {
  what: 'Rate law of free order',
  readings: 'values',
  of(given) {
    const { fit, series } = fitFreeOrder(given);
    return [watched(fit, series)];
  },
};

export default defineFunction({
  name: 'ORDER',
  family: 'order',
  summary: 'Overall order of reaction of a run, fitted as a free number.',
  equations: lawEquations,
  method: `${lawMethod} The order is fitted with it. Below two half lives its limits are wide, and rightly so.`,
  uncertainty: uncertaintyOf.profile,
  parameters: { ...parameters, detail: detail() },
  result: { unit: '1', shape: 'one value' },
  // 1/c grows evenly with time: order 2
  example: {
    formula: '=PACE.ORDER({0;1;2;3;5;9},{1;0.5;0.333333333333333;0.25;0.166666666666667;0.1})',
    equals: 2,
  },
  refusals: [
    {
      formula: '=PACE.ORDER({0;10;20;30},{0;4;6;7})',
      mend: 'Give the reading at infinite time as endpoint, or "free" to have it fitted.',
    },
    {
      formula: '=PACE.ORDER({0;10},{8;4},"free")',
      mend: 'Take more readings. Each number that is fitted needs one.',
    },
    {
      formula: '=PACE.ORDER({0;10;20;30},{8;8;8;8})',
      mend: 'Nothing happens in this column: check that it is the right one.',
    },
  ],
  seeAlso: ['ORDERS', 'HALVINGS', 'EXPONENTS'],
  reference: 'doi:10.1351/goldbook.O04322; Bates and Watts, Nonlinear Regression Analysis (1988), 6.1',
  isLong: { fromCells: 3000 },
  run({ detail, ...given }) {
    const { fit } = fitFreeOrder(given);
    return detail ? [standardRow(orderEstimate(fit))] : fit.order;
  },
  fits: (given) => tableOfLaws(freeLaw, given).table,
});

function fitFreeOrder({ times, values, endpoint, uncertainties }: Values<typeof parameters>): {
  readonly fit: RateLawFit;
  readonly series: Series;
} {
  const series = seriesOf(times, values);
  const weights = uncertaintiesOf(series, values, uncertainties);
  return { fit: fitRateLaw(series, { order: 'free', endpoint, uncertainties: weights }), series };
}
