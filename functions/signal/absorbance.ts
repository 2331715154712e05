import { InvalidInput } from '../../src/errors';
import { concentrationFromAbsorbance } from '../../src/signal/absorbance';
import { convertColumn } from '../column';
import { sayAbsorbance } from '../builtIn/linear';
import { defineFunction } from '../define';
import { uncertaintyOf } from '../uncertaintyOf';
import { number, optional, readings } from '../parameters';
import { quantity } from '../quantityParameters';

export default defineFunction({
  name: 'ABSORBANCE',
  family: 'reading',
  summary: 'Concentration, mol/L, from absorbance by the law of Beer and Lambert.',
  equations: {
    lines: ['c = (A − A₀)/(εl)', 'c = [(A − A₀)/l − ε_p c_tot]/(ε − ε_p)'],
    where: {
      c: 'concentration, mol/L',
      A: 'absorbance read, decadic',
      'A₀': 'blank',
      ε: 'absorptivity, molar, of the species wanted',
      l: 'path, the length through the sample',
      ε_p: 'molar absorptivity of the product; 0 where it does not absorb',
      c_tot: 'total, reactant and product together',
    },
  },
  method:
    'The law of Beer and Lambert. Where the reactant turns one to one into a product that absorbs as well, the second equation holds. On most instruments it is straight only up to an absorbance of about 2 (common practice).',
  uncertainty: uncertaintyOf.conversion,
  parameters: {
    readings: readings({ help: 'absorbance, decadic, one or many', unit: '1' }),
    absorptivity: number({ help: 'molar, of the species wanted', unit: 'L/(mol cm)', atLeast: 0 }),
    path: optional(quantity({ help: 'through the sample', unit: 'cm', to: 'cm', above: 0 }), 1, '1 cm'),
    blank: optional(number({ help: 'absorbance of the cell without it' }), 0),
    product: optional(
      number({ help: 'molar absorptivity of the product', unit: 'L/(mol cm)', atLeast: 0 }),
      undefined,
      'the product does not absorb',
    ),
    total: optional(
      quantity({ help: 'reactant and product together', unit: 'mol/L', to: 'mol/L', above: 0 }),
      undefined,
      'needed only with product',
    ),
  },
  result: { unit: 'mol/L', shape: 'as given' },
  example: { formula: '=PACE.ABSORBANCE({0.012;0.512},2500,1,0.012)', equals: [[0], [0.0002]] },
  refusals: [
    { formula: '=PACE.ABSORBANCE(0.5,2500,1,0,900)', mend: 'Give both product and total, or neither.' },
    {
      formula: '=PACE.ABSORBANCE(0.5,2500,1,0,2500,0.001)',
      mend: 'At this wavelength the reaction cannot be seen: choose another.',
    },
    {
      formula: '=PACE.ABSORBANCE(0.5,0)',
      mend: 'Give the molar absorptivity of the species at this wavelength, from standards if need be: PACE.STANDARDS.',
    },
  ],
  seeAlso: ['STANDARDS', 'COEFFICIENT', 'ORDERS', 'CONVERSION'],
  reference: 'doi:10.1351/goldbook.B00626',
  run({ readings, absorptivity, path, blank, product, total }) {
    if ((product === undefined) !== (total === undefined)) {
      const [given, missing] = product === undefined ? ['total', 'product'] : ['product', 'total'];
      throw new InvalidInput(`${missing} is needed with ${given}: nothing was given`);
    }
    const second = product === undefined ? undefined : { absorptivity: product, total: total! };
    return convertColumn(readings, (reading) =>
      concentrationFromAbsorbance(reading, { absorptivity, path, blank, ...(second && { product: second }) }),
    );
  },
  builtIn: sayAbsorbance,
});
