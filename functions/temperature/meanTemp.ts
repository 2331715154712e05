import { celsiusZero } from '../../src/constants';
import { InvalidInput } from '../../src/errors';
import { pairReadings, requireDistinctTimes } from '../../src/series/series';
import { holdingTimes, meanKineticTemperature } from '../../src/temperature/meanKinetic';
import type { Column } from '../column';
import { sayMeanTemp } from '../builtIn/temperature';
import { defineFunction } from '../define';
import { column, optional } from '../parameters';
import { quantity } from '../quantityParameters';
import { shelfLifeCaution } from './cautions';
import { requireAsMany } from './measuredParameters';
import { temperatures } from './temperatures';

/** J/mol. */
const usualEnergy = 83144;

export default defineFunction({
  name: 'MEANTEMP',
  family: 'temperature',
  summary: 'Mean kinetic temperature of a logged history, °C.',
  equations: {
    lines: ['exp(−E_a/(RT_m)) = (∑ᵢ wᵢ exp(−E_a/(RTᵢ)))/(∑ᵢ wᵢ)'],
    where: {
      T_m: 'mean kinetic temperature, K',
      E_a: 'energy, the activation energy',
      R: 'molar gas constant, 8.314463 J/(mol K)',
      Tᵢ: 'temperature of a reading, K',
      wᵢ: 'time that it stands for',
    },
  },
  method:
    'The one temperature that does as much as the history did; warm spells count for more than in the plain mean. With times each reading counts from halfway to the reading before until halfway to the next, so that intervals may differ and a gap is shared by its neighbours; readings of one time share theirs. Without times all count alike. 83.144 kJ/mol is the activation energy common in the stability guidelines.',
  uncertainty:
    'None is given. A shift of the whole log, as by a logger that shows half a degree too much, carries over almost unchanged.',
  parameters: {
    temperatures: temperatures({ help: 'readings of the logger' }),
    times: optional(
      column({ help: 'of the readings, in any unit', unit: 'time' }),
      undefined,
      'all readings count alike',
    ),
    energy: optional(
      quantity({ help: 'activation energy', unit: 'kJ/mol', to: 'J/mol', above: 0 }),
      usualEnergy,
      '83.144 kJ/mol',
    ),
  },
  result: { unit: 'degC', shape: 'one value' },
  // half the time at 20 °C and half at 30 °C, at thirty digits
  example: { formula: '=PACE.MEANTEMP({20;30})', equals: 26.25987771169222 },
  refusals: [
    { formula: '=PACE.MEANTEMP({293;303})', mend: 'Give °C, or write the unit in each cell: "293 K".' },
    { formula: '=PACE.MEANTEMP({20;30},{0;1;2})', mend: 'Give one time for each temperature.' },
  ],
  seeAlso: ['COEFFICIENTAT', 'ARRHENIUS', 'TIMETO'],
  reference: 'Haynes 1971, doi:10.1002/jps.2600600629; ICH Q1A(R2) (2003), glossary',
  caution: shelfLifeCaution,
  run({ temperatures, times, energy }) {
    const history = times ? heldHistory(temperatures, times) : { temperatures: readingsOf(temperatures) };
    return meanKineticTemperature(history.temperatures, energy, history.durations) - celsiusZero;
  },
  builtIn: sayMeanTemp,
});

interface History {
  readonly temperatures: Float64Array;
  readonly durations?: Float64Array;
}

function readingsOf({ numbers }: Column): Float64Array {
  const readings = numbers.filter((value) => value !== null);
  if (readings.length === 0) throw new InvalidInput('temperatures must hold numbers: none was found');
  return Float64Array.from(readings);
}

function heldHistory(temperatures: Column, times: Column): History {
  requireAsMany(times, temperatures, 'times');
  if (!times.numbers.some((time, i) => time !== null && temperatures.numbers[i] !== null)) {
    throw new InvalidInput('temperatures and times must hold numbers: no two make a pair');
  }
  const series = pairReadings(times.numbers, temperatures.numbers);
  if (series.times.length === 1) return { temperatures: series.values };
  requireDistinctTimes(series, 2, 'a history');
  return { temperatures: series.values, durations: holdingTimes(series.times) };
}
