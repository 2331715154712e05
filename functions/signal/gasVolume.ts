import { gasAmount } from '../../src/signal/gasVolume';
import { convertUnit } from '../../src/units';
import { convertColumn } from '../column';
import { saturation } from '../commonParameters';
import { sayGasVolume } from '../builtIn/gas';
import { defineFunction } from '../define';
import { uncertaintyOf } from '../uncertaintyOf';
import { optional, readings, text } from '../parameters';
import { quantities, quantity, requireOneEach } from '../quantityParameters';

export default defineFunction({
  name: 'GASVOLUME',
  family: 'reading',
  summary: 'Amount of gas, mol, from its volume read at a temperature and an outside pressure.',
  equations: {
    lines: ['n = (p − ρgh − φp*)V/(RT)'],
    where: {
      n: 'amount of gas, mol',
      p: 'pressure of the room',
      ρ: 'density of water at the temperature',
      g: 'standard acceleration of free fall, 9.80665 m/s²',
      h: 'head, the height of the water in the tube above the trough',
      φ: 'wet, the share of saturation with water vapour',
      'p*': 'vapour pressure of water at the temperature',
      V: 'volume read',
      R: 'molar gas constant, 8.314463 J/(mol K)',
      T: 'temperature of the gas, K',
    },
  },
  method:
    'The gas counts as ideal. The vapour pressure follows the IAPWS equation for the saturation line, and is taken off in the share that wet says. The column of water in the tube carries part of the outside pressure.',
  uncertainty: uncertaintyOf.conversion,
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
  refusals: [
    {
      formula: '=PACE.GASVOLUME(20,"100.2 degC",101,TRUE)',
      mend: 'Check the temperature and the pressure: at these the water boils.',
    },
    {
      formula: '=PACE.GASVOLUME(20,"752 mmHg",101)',
      mend: 'Give the temperature with a unit of temperature. Were two arguments exchanged?',
    },
    {
      formula: '=PACE.GASVOLUME({20;30;40},{21;22},101)',
      mend: 'Give one temperature for all, or one for each volume. The pressure likewise.',
    },
    { formula: '=PACE.GASVOLUME(20,21,101,TRUE,"s")', mend: 'Give a unit of volume: mL, L, cm^3.' },
  ],
  seeAlso: ['REMAINING', 'TANGENT', 'DISSOLVED', 'GASPRESSURE'],
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
