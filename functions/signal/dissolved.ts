import { dissolvedAmount, dissolvingGases } from '../../src/signal/henry';
import { convertColumn } from '../column';
import { sayDissolved } from '../builtIn/gas';
import { defineFunction } from '../define';
import { text } from '../parameters';
import { quantity, quantityReadings } from '../quantityParameters';

export default defineFunction({
  name: 'DISSOLVED',
  family: 'reading',
  summary: 'Amount of gas, mol, that water holds back at equilibrium.',
  method:
    'n = H V p with Henry’s law constant by the IAPWS guideline G7-04 and the density of water, for a dilute solution at equilibrium. What reacts with water is not counted, such as CO₂ in alkaline water; a run that fizzes holds more than this.',
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
  reference: 'IAPWS G7-04; doi:10.1063/1.1564818; doi:10.1351/goldbook.H02783',
  run: ({ pressure, gas, volume, temperature }) =>
    convertColumn(pressure, (pascal) => dissolvedAmount(pascal, gas, volume, temperature)),
  builtIn: sayDissolved,
});
