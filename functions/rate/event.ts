import { eventRate } from '../../src/rate/event';
import { convertColumn } from '../column';
import { sayEvent } from '../builtIn/linear';
import { defineFunction } from '../define';
import { stoichiometricNumber } from '../commonParameters';
import { number, optional, readings } from '../parameters';

export default defineFunction({
  name: 'EVENT',
  family: 'rate',
  summary: 'Rate from a timed event, such as a colour change: change / time.',
  method:
    'r = (1/ν) Δc / t, the mean rate until the event. Without a change it is 1/t, which compares runs whose event is the same; that it stands for the initial rate is common practice where little has reacted by then.',
  parameters: {
    times: readings({ help: 'time until the event, one or many', unit: 'time', above: 0 }),
    change: optional(
      number({ help: 'signed change of the species by the event', unit: 'of concentration' }),
      undefined,
      '1, so that the answer is 1/time',
    ),
    coefficient: stoichiometricNumber(),
  },
  result: { unit: 'change per time', shape: 'as given' },
  example: { formula: '=PACE.EVENT({40;25})', equals: [[0.025], [0.04]] },
  reference: 'doi:10.1351/goldbook.R05156',
  run: ({ times, change, coefficient }) =>
    convertColumn(times, (time) => eventRate(time, change, coefficient)),
  builtIn: sayEvent,
});
