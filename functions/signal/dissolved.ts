import { dissolvedAmount, dissolvingGases } from '../../src/signal/henry';
import { convertColumn } from '../column';
import { sayDissolved } from '../builtIn/gas';
import { defineFunction } from '../define';
import { uncertaintyOf } from '../uncertaintyOf';
import { text } from '../parameters';
import { quantity, quantityReadings } from '../quantityParameters';

export default defineFunction({
  name: 'DISSOLVED',
  family: 'reading',
  summary: 'Amount of gas, mol, that water holds back at equilibrium.',
  equations: {
    lines: ['n = ρVp/(Mk_H)'],
    where: {
      n: 'amount of gas dissolved, mol',
      ρ: 'density of water',
      V: 'volume of the water',
      p: 'pressure of the gas itself, without water vapour',
      M: 'molar mass of water',
      k_H: 'Henry’s law constant of the gas, the limit of p/x with x its amount fraction in water',
    },
  },
  method:
    'Henry’s law constant follows the IAPWS guideline G7-04. The solution is dilute and at equilibrium. What reacts with water is not counted, such as CO₂ in alkaline water. A run that fizzes holds more than this.',
  uncertainty: uncertaintyOf.conversion,
  parameters: {
    pressure: quantityReadings({
      help: 'of the gas itself, without water vapour',
      unit: 'kPa',
      to: 'Pa',
      atLeast: 0,
    }),
    gas: text({ help: `formula, one of ${dissolvingGases.join(', ')}` }),
    volume: quantity({ help: 'of the water', unit: 'mL', to: 'm^3', above: 0 }),
    temperature: quantity({ help: 'of the water', unit: 'degC', to: 'K', atLeast: 0, atMost: 100 }),
  },
  result: { unit: 'mol', shape: 'as given' },
  // lim f/x = 165.644 589 MPa at 25 °C by the guideline, and 997.0476 kg/m³ (IAPWS-95)
  example: { formula: '=PACE.DISSOLVED(97,"CO2",100,25)', equals: 0.00324093, within: 2e-5 },
  refusals: [
    {
      formula: '=PACE.DISSOLVED(97,"NH3",100,25)',
      mend: 'Ammonia and other gases that react with water or dissolve freely do not follow this law; measure them in the water.',
    },
  ],
  seeAlso: ['GASVOLUME', 'GASPRESSURE', 'REMAINING'],
  reference: 'IAPWS G7-04; doi:10.1063/1.1564818; doi:10.1351/goldbook.H02783',
  run: ({ pressure, gas, volume, temperature }) =>
    convertColumn(pressure, (pascal) => dissolvedAmount(pascal, gas, volume, temperature)),
  builtIn: sayDissolved,
});
