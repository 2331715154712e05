import { rateCoefficientUnit } from '../../src/order/unit';
import { sayUnit } from '../builtIn/unit';
import { defineFunction } from '../define';
import { number, optional, text } from '../parameters';

export default defineFunction({
  name: 'UNIT',
  family: 'order',
  summary: 'Unit of a rate coefficient, as text.',
  equations: {
    lines: ['−dc/dt = kcⁿ'],
    where: {
      c: 'concentration, or the reading in its place',
      t: 'time',
      k: 'rate coefficient, in (unit of c)^(1−n) per time',
      n: 'order',
    },
  },
  method: 'Powers that are not whole are written with ^.',
  uncertainty: 'None: a unit is text.',
  parameters: {
    order: number({ help: 'n, need not be whole' }),
    concentrationunit: optional(text({ help: 'unit of the readings' }), 'mol/L'),
    timeunit: optional(text({ help: 'unit of the times' }), 's'),
  },
  result: { unit: 'text', shape: 'one value' },
  example: { formula: '=PACE.UNIT(2)', equals: 'L mol⁻¹ s⁻¹' },
  refusals: [{ formula: '=PACE.UNIT(2,"mol/10 L")', mend: 'Write units with a stroke or powers: mol/L.' }],
  seeAlso: ['COEFFICIENT', 'EXPONENTS'],
  reference: 'doi:10.1351/goldbook.O04322',
  run: ({ order, concentrationunit, timeunit }) => rateCoefficientUnit(order, concentrationunit, timeunit),
  builtIn: sayUnit,
});
