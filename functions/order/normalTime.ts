import { normalisedTimes } from '../../src/order/normalisedTime';
import { sayNormalTime } from '../builtIn/course';
import { defineFunction } from '../define';
import { column, number } from '../parameters';
import { besideTimes, seriesOf } from '../run';

export default defineFunction({
  name: 'NORMALTIME',
  family: 'order',
  summary: 'Normalised time of a run, ∫cᵝdt, on which runs of different concentration fall together.',
  method:
    'Σ[(cᵢ + cᵢ₋₁)/2]ᵝ(tᵢ − tᵢ₋₁), counted from the first reading (variable time normalisation). Products of runs that differ in c lie on one curve against it when β is the order in that species.',
  parameters: {
    times: column({ help: 'times of the run', unit: 'time' }),
    values: column({ help: 'concentration of the species whose order is asked for' }),
    exponent: number({ help: 'β, the order that is tried' }),
  },
  result: { unit: 'time · concentration^β', shape: 'column' },
  example: { formula: '=PACE.NORMALTIME({0;2;4},{3;2;2},1)', equals: [[0], [5], [9]] },
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
