import { fitRateLaw } from '../../src/order/fit';
import { heightAt } from '../../src/order/curve';
import { convertColumn } from '../column';
import { defineFunction } from '../define';
import { number, optional, readings } from '../parameters';
import { seriesOf, uncertaintiesOf } from '../run';
import { lawMethod, lawParameters, runParameters } from './lawParameters';

export default defineFunction({
  name: 'CURVE',
  family: 'order',
  summary: 'The fitted rate law as a curve, at the run’s own times or at others.',
  method: `${lawMethod} Beyond the last reading the curve predicts, and the further the less surely; before the first it is not followed.`,
  parameters: {
    ...runParameters,
    order: number({ help: 'n in −dc/dt = kcⁿ, need not be whole' }),
    attimes: optional(
      readings({ help: 'where the curve is wanted', unit: 'of the times' }),
      undefined,
      'the times',
    ),
    ...lawParameters,
  },
  result: { unit: 'of the readings', shape: 'as given' },
  example: { formula: '=PACE.CURVE({0;10;20;30},{8;4;2;1},1,{20;40})', equals: [[2], [0.5]] },
  reference: 'doi:10.1351/goldbook.O04322',
  run({ times, values, order, attimes, endpoint, uncertainties }) {
    const series = seriesOf(times, values);
    const weights = uncertaintiesOf(series, values, uncertainties);
    const fit = fitRateLaw(series, { order, endpoint, uncertainties: weights });
    return convertColumn(attimes ?? times, (time) => heightAt(fit, series, time));
  },
});
