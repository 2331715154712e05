import { rateCoefficientEstimate } from '../../src/order/profile';
import { defineFunction } from '../define';
import { standardRow } from '../results';
import { fitKnownLaw, knownLawParameters, lawMethod } from './lawParameters';

export default defineFunction({
  name: 'COEFFICIENT',
  family: 'order',
  summary: 'Rate coefficient k of a run whose order is known.',
  method: `${lawMethod} k = κ|y₀ − y∞|¹⁻ⁿ belongs to the distance from the end. Limits are those of the profile likelihood.`,
  parameters: knownLawParameters,
  result: { unit: 'reading^(1−n) per time', shape: 'one value' },
  // halved every 10: k = ln 2/10
  example: { formula: '=PACE.COEFFICIENT({0;10;20;30},{8;4;2;1},1)', equals: 0.06931471805599453 },
  reference: 'doi:10.1351/goldbook.O04322; Bates and Watts, Nonlinear Regression Analysis (1988), 6.1',
  run(given) {
    const fit = fitKnownLaw(given);
    return given.detail ? [standardRow(rateCoefficientEstimate(fit))] : fit.rateCoefficient;
  },
});
