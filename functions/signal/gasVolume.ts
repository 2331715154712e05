import { gasAmount } from '../../src/signal/gasVolume';
import { convertUnit } from '../../src/units';
import { convertColumn } from '../column';
import { saturation } from '../commonParameters';
import { sayGasVolume } from '../builtIn/gas';
import { defineFunction } from '../define';
import { optional, readings, text } from '../parameters';
import { quantities, quantity, requireOneEach } from '../quantityParameters';

export default defineFunction({
  name: 'GASVOLUME',
  family: 'reading',
  summary: 'Amount of gas, mol, from its volume read at a temperature and an outside pressure.',
  method:
    'n = (p − ρgh − φp*)V/(RT), as an ideal gas: φp* is the pressure of the water vapour, by the IAPWS equation for the saturation line, and ρgh that of the water by which the level in the tube stands above the trough.',
  parameters: {
    volumes: readings({
      help: 'volume of gas, one or many',
      unit: 'mL unless unit says otherwise',
      atLeast: 0,
    }),
    temperature: quantities({ help: 'of the gas', unit: 'degC', to: 'K', above: -273.15 }),
    pressure: quantities({ help: 'of the room', unit: 'kPa', to: 'Pa', above: 0 }),
    wet: saturation(),
    unit: optional(text({ help: 'unit of the volumes' }), 'mL'),
    head: optional(
      quantity({ help: 'height of the water in the tube above the trough', unit: 'mm', to: 'm' }),
      0,
    ),
  },
  result: { unit: 'mol', shape: 'as given' },
  // reference conditions of IUPAC: 0 °C and 100 kPa, where an ideal gas takes 22.710 954 641 485 57 L/mol (CODATA 2022)
  example: {
    formula: '=PACE.GASVOLUME({0;22.71095464148557},0,100)',
    equals: [[0], [0.001]],
  },
  reference: 'IAPWS SR1-86(1992); doi:10.1351/goldbook.I02935',
  caution:
    'Gas that is made in a closed vessel can burst it: keep the way to the burette open, work behind a shield, and keep hydrogen and oxygen away from flames. Local rules come first.',
  run({ volumes, temperature, pressure, wet, unit, head }) {
    const millilitres = convertUnit(1, unit, 'mL', 'volumes');
    const [temperatureOf, pressureOf] = [
      requireOneEach(temperature, volumes, 'temperature'),
      requireOneEach(pressure, volumes, 'pressure'),
    ];
    return convertColumn(volumes, (volume, place) =>
      gasAmount(volume * millilitres * 1e-6, {
        temperature: temperatureOf(place),
        pressure: pressureOf(place),
        saturation: wet,
        head,
      }),
    );
  },
  builtIn: sayGasVolume,
});
