import { concentrationFromConductivity, conductivityAt25 } from '../../src/signal/linear';
import { convertColumn } from '../column';
import { sayConductivity } from '../builtIn/linear';
import { defineFunction } from '../define';
import { uncertaintyOf } from '../uncertaintyOf';
import { number, optional, readings } from '../parameters';
import { quantities, requireOneEach } from '../quantityParameters';

export default defineFunction({
  name: 'CONDUCTIVITY',
  family: 'reading',
  summary: 'Concentration left, from a conductivity that moves from a start to an end value.',
  equations: {
    lines: ['c = c₀(κ − κ∞)/(κ₀ − κ∞)', 'κ₂₅ = κ_t/[1 + α(t − 25)]'],
    where: {
      c: 'concentration left',
      'c₀': 'concentration at the start',
      κ: 'conductivity read, at 25 °C where temperatures are given',
      'κ₀': 'start',
      'κ∞': 'end',
      'κ₂₅': 'conductivity at 25 °C',
      κ_t: 'conductivity at t',
      α: 'percent/100, the share of change per °C',
      t: 'temperature, °C',
    },
  },
  method:
    'In a dilute solution each ion adds its share, so the conductivity moves in proportion to conversion. With temperatures each reading is first brought to 25 °C; start and end are then meant at 25 °C. A change of 2 % per °C suits most salts (common practice); acids and alkalis need less.',
  uncertainty: uncertaintyOf.conversion,
  parameters: {
    readings: readings({ help: 'conductivity or conductance, one or many', unit: 'of start', atLeast: 0 }),
    start: number({ help: 'reading before the reaction', unit: 'of the readings', atLeast: 0 }),
    end: number({ help: 'reading when all has reacted', unit: 'of the readings', atLeast: 0 }),
    initial: number({ help: 'concentration at the start', unit: 'any concentration', above: 0 }),
    temperatures: optional(
      quantities({ help: 'of the solution', unit: 'degC', to: 'degC' }),
      undefined,
      'readings are taken as they are',
    ),
    percent: optional(number({ help: 'change per °C at 25 °C', unit: '%', above: 0, atMost: 10 }), 2),
  },
  result: { unit: 'of initial', shape: 'as given' },
  example: {
    formula: '=PACE.CONDUCTIVITY({2.5;1.7;0.9},2.5,0.9,0.01)',
    equals: [[0.01], [0.005], [0]],
  },
  refusals: [
    {
      formula: '=PACE.CONDUCTIVITY(1.7,2.5,2.5,0.01)',
      mend: 'Give the readings before and after the whole reaction; they must differ.',
    },
    {
      formula: '=PACE.CONDUCTIVITY({2.5;1.7;1},2.5,0.9,0.01,{25;26})',
      mend: 'Give one temperature for all, or one for each reading.',
    },
  ],
  seeAlso: ['CONVERSION', 'COEFFICIENT', 'ACIDITY'],
  reference: 'ISO 7888:1985',
  run({ readings, start, end, initial, temperatures, percent }) {
    const temperatureOf = temperatures && requireOneEach(temperatures, readings, 'temperatures');
    return convertColumn(readings, (reading, place) => {
      const at25 = temperatureOf ? conductivityAt25(reading, temperatureOf(place), percent) : reading;
      return concentrationFromConductivity(at25, start, end, initial);
    });
  },
  builtIn: sayConductivity,
});
