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
  equations: {
    lines: ['r = Δc/(νt)'],
    where: {
      r: 'mean rate of reaction until the event',
      Δc: 'change; 1 where it is left out',
      ν: 'coefficient, the stoichiometric number of the species',
      t: 'time until the event',
    },
  },
  method:
    'The mean rate until the event. Without a change it is 1/t, which compares runs whose event is the same. That it stands for the initial rate is common practice where little has reacted by then.',
  uncertainty: 'None is given. Time the same event several times: the scatter of the answers tells.',
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
  refusals: [
    {
      formula: '=PACE.EVENT({40;25},0)',
      mend: 'Give the change of concentration by the event, or leave it out.',
    },
  ],
  seeAlso: ['EXPONENTS', 'START'],
  reference: 'doi:10.1351/goldbook.R05156',
  run: ({ times, change, coefficient }) =>
    convertColumn(times, (time) => eventRate(time, change, coefficient)),
  builtIn: sayEvent,
});
