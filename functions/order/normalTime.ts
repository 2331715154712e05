import { normalisedTimes } from '../../src/order/normalisedTime';
import { sayNormalTime } from '../builtIn/course';
import { defineFunction } from '../define';
import { column, number } from '../parameters';
import { besideTimes, seriesOf } from '../run';

export default defineFunction({
  name: 'NORMALTIME',
  family: 'order',
  summary: 'Normalised time of a run, ∫cᵝdt, on which runs of different concentration fall together.',
  equations: {
    lines: ['τ = ∫c^β dt', 'τ ≈ ∑ᵢ [(cᵢ + c_(i−1))/2]^β (tᵢ − t_(i−1))'],
    where: {
      τ: 'normalised time',
      c: 'concentration of the species',
      β: 'exponent, the order that is tried',
      t: 'time',
      cᵢ: 'concentration at a reading',
      'c_(i−1)': 'concentration at the reading before',
      tᵢ: 'time of a reading',
      't_(i−1)': 'time of the reading before',
    },
  },
  method:
    'The trapezoidal rule, counted from the first reading (variable time normalisation). Plot the products of runs that differ in c against it: they lie on one curve when β is the order in that species.',
  uncertainty:
    'None is given: it is a time scale for another plot. PACE.OVERLAYORDER finds the exponent with its uncertainty.',
  parameters: {
    times: column({ help: 'times of the run', unit: 'time' }),
    values: column({ help: 'concentration of the species whose order is asked for' }),
    exponent: number({ help: 'β, the order that is tried' }),
  },
  result: { unit: 'time · concentration^β', shape: 'column' },
  example: { formula: '=PACE.NORMALTIME({0;2;4},{3;2;2},1)', equals: [[0], [5], [9]] },
  refusals: [
    {
      formula: '=PACE.NORMALTIME({0;2;4},{3;2;-1},0.5)',
      mend: 'Concentrations below 0 have no such power: check the blank or the start.',
    },
  ],
  seeAlso: ['OVERLAYORDER', 'EXPONENTS'],
  reference: 'doi:10.1002/anie.201609757',
  run({ times, values, exponent }) {
    const series = seriesOf(times, values);
    return besideTimes(
      times,
      series,
      Array.from(normalisedTimes(series, exponent), (time) => [time]),
    );
  },
  builtIn: sayNormalTime,
});
