import { fitEyring, gibbsEnergyAt } from '../../src/temperature/eyring';
import { detail } from '../commonParameters';
import { sayEyring } from '../builtIn/temperature';
import { defineFunction } from '../define';
import { uncertaintyOf } from '../uncertaintyOf';
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
  equations: {
    lines: ['k = k_B T/h · exp(ΔS‡/R) · exp(−ΔH‡/(RT))', 'ΔG‡ = ΔH‡ − TΔS‡'],
    where: {
      k: 'rate coefficient',
      k_B: 'Boltzmann constant, 1.380649 × 10⁻²³ J/K',
      T: 'temperature, K',
      h: 'Planck constant, 6.62607015 × 10⁻³⁴ J s',
      'ΔS‡': 'entropy of activation',
      R: 'molar gas constant, 8.314463 J/(mol K)',
      'ΔH‡': 'enthalpy of activation',
      'ΔG‡': 'Gibbs energy of activation',
    },
  },
  method: `ln(k/T) is a straight line against 1/T; the transmission coefficient is 1. ${weightsInWords} ΔS‡ and ΔG‡ need k in s⁻¹, or in L mol⁻¹ s⁻¹ with 1 mol/L as the standard concentration; ΔH‡ holds for any unit. ΔG‡ at 298.15 K is read off the line.`,
  uncertainty: uncertaintyOf.line,
  parameters: { ...measuredParameters, uncertainties: coefficientUncertainties, detail: detail() },
  result: { unit: 'kJ/mol, J/(mol K), kJ/mol', shape: 'table' },
  // at thirty digits from kB, h and R of the SI
  example: {
    formula: '=PACE.EYRING({25;35},{1;2})',
    equals: [[50.42878996278369, -75.78491190227083, 73.02406144644571]],
  },
  refusals: [
    {
      formula: '=PACE.EYRING({298.15;308.15},{1;2})',
      mend: 'Give °C, or write the unit in each cell: "298.15 K".',
    },
    { formula: '=PACE.EYRING({25;25},{1;1.1})', mend: 'Measure at another temperature as well.' },
    {
      formula: '=PACE.EYRING({25;35},{1;-2})',
      mend: 'A rate coefficient is above 0: give it without a sign.',
    },
  ],
  seeAlso: ['ARRHENIUS', 'COEFFICIENTAT'],
  reference:
    'doi:10.1351/goldbook.E02142; doi:10.1351/goldbook.E02150; doi:10.1351/goldbook.G02631; CODATA 2022',
  run(given) {
    const fit = fitEyring(measuredOf(given));
    const estimates = [fit.enthalpy, fit.entropy, gibbsEnergyAt(fit, roomTemperature)];
    return given.detail ? estimates.map(standardRow) : [estimates.map(({ value }) => value)];
  },
  builtIn: sayEyring,
});
