import { fitRateLaw } from '../../src/order/fit';
import { orderEstimate } from '../../src/order/profile';
import { detail } from '../commonParameters';
import { defineFunction } from '../define';
import { standardRow } from '../results';
import { seriesOf, uncertaintiesOf } from '../run';
import { lawMethod, lawParameters, runParameters } from './lawParameters';

export default defineFunction({
  name: 'ORDER',
  family: 'order',
  summary: 'Overall order of reaction of a run, fitted as a free number.',
  method: `${lawMethod} The order is fitted with it. Limits are those of the profile likelihood; below two half lives they are wide, and rightly so.`,
  parameters: { ...runParameters, ...lawParameters, detail: detail() },
  result: { unit: '1', shape: 'one value' },
  // 1/c grows evenly with time: order 2
  example: {
    formula: '=PACE.ORDER({0;1;2;3;5;9},{1;0.5;0.333333333333333;0.25;0.166666666666667;0.1})',
    equals: 2,
  },
  reference: 'doi:10.1351/goldbook.O04322; Bates and Watts, Nonlinear Regression Analysis (1988), 6.1',
  run({ times, values, endpoint, uncertainties, detail }) {
    const series = seriesOf(times, values);
    const fit = fitRateLaw(series, {
      order: 'free',
      endpoint,
      uncertainties: uncertaintiesOf(series, values, uncertainties),
    });
    return detail ? [standardRow(orderEstimate(fit))] : fit.order;
  },
});
