import { gasFormed } from '../../src/signal/gasPressure';
import { convertUnit, parseQuantity } from '../../src/units';
import { convertColumn, firstNumber } from '../column';
import { sayGasPressure } from '../builtIn/gas';
import { defineFunction } from '../define';
import { uncertaintyOf } from '../uncertaintyOf';
import { optional, readings, text } from '../parameters';
import { quantities, quantity, requireOneEach } from '../quantityParameters';

export default defineFunction({
  name: 'GASPRESSURE',
  family: 'reading',
  summary: 'Amount of gas formed in a closed space, mol, from its pressure.',
  equations: {
    lines: ['n = (V/R)(p/T − p₀/T₀)'],
    where: {
      n: 'amount of gas formed, mol',
      V: 'volume of the space above the liquid',
      R: 'molar gas constant, 8.314463 J/(mol K)',
      p: 'pressure read',
      T: 'temperature of the gas then, K',
      'p₀': 'pressure at the start',
      'T₀': 'temperature of the gas at the start, K',
    },
  },
  method:
    'The gas counts as ideal, and the space above the liquid as constant. What was there from the start, air and water vapour, cancels while the temperature stays; then pressures above that of the room will do. If the temperature changes, give absolute pressures.',
  uncertainty: uncertaintyOf.conversion,
  parameters: {
    pressures: readings({ help: 'one or many', unit: 'kPa unless unit says otherwise', atLeast: 0 }),
    volume: quantity({ help: 'of the gas, above the liquid', unit: 'mL', to: 'm^3', above: 0 }),
    temperature: quantities({ help: 'of the gas', unit: 'degC', to: 'K', above: -273.15 }),
    start: optional(
      text({
        help: 'pressure before the reaction, in the unit of the pressures or with its own',
        orNumber: true,
      }),
      undefined,
      'the first pressure',
    ),
    unit: optional(text({ help: 'unit of the pressures' }), 'kPa'),
  },
  result: { unit: 'mol', shape: 'as given' },
  // 22.710 954 641 485 57 L at 0 °C hold 1 mol at 100 kPa (CODATA 2022)
  example: {
    formula: '=PACE.GASPRESSURE({0;100},"22.71095464148557 L",0)',
    equals: [[0], [1]],
  },
  refusals: [
    {
      formula: '=PACE.GASPRESSURE({100;104},135,25,"1 L")',
      mend: 'Give the start in a unit of pressure, or as a bare number in the unit of the pressures.',
    },
    {
      formula: '=PACE.GASPRESSURE({100;104;107},135,{25;26})',
      mend: 'Give one temperature for all, or one for each pressure.',
    },
  ],
  seeAlso: ['REMAINING', 'TOTALPRESSURE', 'DISSOLVED', 'TANGENT'],
  reference: 'doi:10.1351/goldbook.I02935',
  caution:
    'Pressure in closed glass can burst it: stay below what the vessel is made for, with a shield and a relief valve. Local rules come first.',
  run({ pressures, volume, temperature, start, unit }) {
    const toPascal = convertUnit(1, unit, 'kPa', 'pressures') * 1000;
    const temperatureOf = requireOneEach(temperature, pressures, 'temperature');
    const first = firstNumber(pressures, 'pressures');
    const before =
      start === undefined
        ? first.value
        : typeof start === 'number'
          ? start
          : parseQuantity(start, unit, 'start');
    const from = { pressure: before * toPascal, temperature: temperatureOf(first.place) };
    return convertColumn(pressures, (pressure, place) =>
      gasFormed({ pressure: pressure * toPascal, temperature: temperatureOf(place) }, from, volume),
    );
  },
  builtIn: sayGasPressure,
});
