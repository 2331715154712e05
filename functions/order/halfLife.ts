import { halfLifeEstimate } from '../../src/order/profile';
import { defineFunction } from '../define';
import { standardRow } from '../results';
import { fitKnownLaw, knownLawParameters, lawMethod } from './lawParameters';

export default defineFunction({
  name: 'HALFLIFE',
  family: 'order',
  summary: 'Half life of a run whose order is known, counted from its first reading.',
  method: `${lawMethod} t½ = (2ⁿ⁻¹ − 1)/((n − 1)κ), ln 2/κ at order 1. Limits are those of the profile likelihood.`,
  parameters: knownLawParameters,
  result: { unit: 'of the times', shape: 'one value' },
  example: { formula: '=PACE.HALFLIFE({0;10;20;30},{8;4;2;1},1)', equals: 10 },
  reference: 'doi:10.1351/goldbook.H02716; Bates and Watts, Nonlinear Regression Analysis (1988), 6.1',
  run(given) {
    const fit = fitKnownLaw(given);
    return given.detail ? [standardRow(halfLifeEstimate(fit))] : fit.halfLife;
  },
});
