import { InvalidInput } from '../../src/errors';
import { ionFromPH, type AcidityIon } from '../../src/signal/acidity';
import { highestIonicStrength } from '../../src/signal/activity';
import { convertColumn } from '../column';
import { sayAcidity } from '../builtIn/acidity';
import { defineFunction } from '../define';
import { uncertaintyOf } from '../uncertaintyOf';
import { optional, readings, text } from '../parameters';
import { quantity } from '../quantityParameters';

export default defineFunction({
  name: 'ACIDITY',
  family: 'reading',
  summary: 'Concentration of H⁺ or OH⁻, mol/L, from pH.',
  equations: {
    lines: ['c("H⁺") = 10^(−pH)/γ', 'c("OH⁻") = 10^(pH − pK_w)/γ', 'lg γ = −A[√I/(1 + √I) − 0.3I]'],
    where: {
      'c(H⁺)': 'concentration of H⁺, mol/L',
      'c(OH⁻)': 'concentration of OH⁻, mol/L',
      pH: 'reading of the electrode',
      γ: 'activity coefficient of the ion, by Davies',
      pK_w: '−lg of the ion product of water',
      A: 'slope of Debye and Hückel, 0.51 (L/mol)^½ at 25 °C',
      I: 'ionic strength, mol/L',
    },
  },
  method:
    'pK_w is that of the IAPWS release R11-24, so OH⁻ follows the temperature. Without an ionic strength, γ is 1: the answer is then the activity. A comes from the dielectric constant of water (IAPWS R8-97) at the temperature.',
  uncertainty: uncertaintyOf.conversion,
  parameters: {
    pH: readings({ help: 'one or many', unit: '1', atLeast: -2, atMost: 16 }),
    ionicstrength: optional(
      quantity({
        help: 'of the solution',
        unit: 'mol/L',
        to: 'mol/L',
        atLeast: 0,
        atMost: highestIonicStrength,
      }),
      undefined,
      'activity stands for concentration',
    ),
    temperature: optional(
      quantity({ help: 'of the solution', unit: 'degC', to: 'K', atLeast: 0, atMost: 100 }),
      298.15,
      '25 degC',
    ),
    species: optional(text({ help: '"H" or "OH"' }), 'H'),
  },
  result: { unit: 'mol/L', shape: 'as given' },
  example: { formula: '=PACE.ACIDITY({3;2.5})', equals: [[0.001], [0.0031622776601683794]] },
  refusals: [
    { formula: '=PACE.ACIDITY(7,,,"Na")', mend: 'Ask for "H" or "OH".' },
    {
      formula: '=PACE.ACIDITY(7,2)',
      mend: 'Above 0.5 mol/L no simple equation holds: leave the ionic strength out, or calibrate with standards of the same salt.',
    },
  ],
  seeAlso: ['COEFFICIENT', 'TANGENT', 'CONDUCTIVITY'],
  reference: 'doi:10.1351/goldbook.P04524; IAPWS R11-24; IAPWS R8-97',
  caution: 'Strong acids and alkalis burn: goggles and gloves, acid into water. Local rules come first.',
  run({ pH, ionicstrength, temperature, species }) {
    const ion = ionNamed(species);
    return convertColumn(pH, (value) => ionFromPH(value, ion, { ionicStrength: ionicstrength, temperature }));
  },
  builtIn: sayAcidity,
});

function ionNamed(species: string): AcidityIon {
  const name = species.toUpperCase().replace(/[+⁺\-−⁻]$/, '');
  if (name === 'H' || name === 'OH') return name;
  throw new InvalidInput(`species must be "H" or "OH": got "${species}"`);
}
