import { rateCoefficientUnit } from '../../src/order/unit';
import { sayUnit } from '../builtIn/unit';
import { defineFunction } from '../define';
import { number, optional, text } from '../parameters';

export default defineFunction({
  name: 'UNIT',
  family: 'order',
  summary: 'Unit of a rate coefficient, as text.',
  method:
    'Of k in −dc/dt = kcⁿ: (concentration)^(1−n) per time. Powers that are not whole are written with ^.',
  parameters: {
    order: number({ help: 'n, need not be whole' }),
    concentrationunit: optional(text({ help: 'unit of the readings' }), 'mol/L'),
    timeunit: optional(text({ help: 'unit of the times' }), 's'),
  },
  result: { unit: 'text', shape: 'one value' },
  example: { formula: '=PACE.UNIT(2)', equals: 'L mol⁻¹ s⁻¹' },
  reference: 'doi:10.1351/goldbook.O04322',
  run: ({ order, concentrationunit, timeunit }) => rateCoefficientUnit(order, concentrationunit, timeunit),
  builtIn: sayUnit,
});
