import { fitEyring, gibbsEnergyAt } from '../../src/temperature/eyring';
import { detail } from '../commonParameters';
import { sayEyring } from '../builtIn/temperature';
import { defineFunction } from '../define';
import { standardRow } from '../results';
import {
  coefficientUncertainties,
  measuredOf,
  measuredParameters,
  weightsInWords,
} from './measuredParameters';

/** 25 °C, in K, at which ΔG‡ is stated. */
const roomTemperature = 298.15;

export default defineFunction({
  name: 'EYRING',
  family: 'temperature',
  summary:
    'Enthalpy, entropy and Gibbs energy of activation, from rate coefficients at several temperatures.',
  method: `k = (kB T/h) exp(ΔS‡/R) exp(−ΔH‡/RT), ln(k/T) a straight line against 1/T, T in kelvin; transmission coefficient 1. ${weightsInWords} Limits are Student’s. ΔS‡ and ΔG‡ need k in s⁻¹, or in L mol⁻¹ s⁻¹ with 1 mol/L as the standard concentration; ΔH‡ holds for any unit. ΔG‡ at 298.15 K is read off the line.`,
  parameters: { ...measuredParameters, uncertainties: coefficientUncertainties, detail: detail() },
  result: { unit: 'kJ/mol, J/(mol K), kJ/mol', shape: 'table' },
  // at thirty digits from kB, h and R of the SI
  example: {
    formula: '=PACE.EYRING({25;35},{1;2})',
    equals: [[50.42878996278369, -75.78491190227083, 73.02406144644571]],
  },
  reference:
    'doi:10.1351/goldbook.E02142; doi:10.1351/goldbook.E02150; doi:10.1351/goldbook.G02631; CODATA 2022',
  run(given) {
    const fit = fitEyring(measuredOf(given));
    const estimates = [fit.enthalpy, fit.entropy, gibbsEnergyAt(fit, roomTemperature)];
    return given.detail ? estimates.map(standardRow) : [estimates.map(({ value }) => value)];
  },
  builtIn: sayEyring,
});
