import { titratedConcentration } from '../../src/signal/linear';
import { convertColumn } from '../column';
import { sayTitre } from '../builtIn/linear';
import { defineFunction } from '../define';
import { uncertaintyOf } from '../uncertaintyOf';
import { number, optional, readings } from '../parameters';
import { quantity } from '../quantityParameters';

export default defineFunction({
  name: 'TITRE',
  family: 'reading',
  summary: 'Concentration in a quenched aliquot, mol/L, from the volume of titrant it took.',
  equations: {
    lines: ['c = z · c_t V/V_a'],
    where: {
      c: 'concentration in the aliquot, mol/L',
      z: 'ratio, moles of analyte for each mole of titrant',
      c_t: 'concentration of the titrant',
      V: 'volume of titrant used',
      V_a: 'volume of the aliquot',
    },
  },
  method: 'It belongs to the aliquot as it was drawn, before anything was added to quench it.',
  uncertainty: uncertaintyOf.conversion,
  parameters: {
    volumes: readings({ help: 'titrant used, one or many', unit: 'mL', atLeast: 0 }),
    titrant: quantity({ help: 'concentration of the titrant', unit: 'mol/L', to: 'mol/L', above: 0 }),
    aliquot: quantity({ help: 'volume that was drawn', unit: 'mL', to: 'mL', above: 0 }),
    ratio: optional(number({ help: 'moles of analyte per mole of titrant', above: 0 }), 1),
  },
  result: { unit: 'mol/L', shape: 'as given' },
  // peroxide by permanganate: 5 H2O2 to 2 MnO4⁻
  example: { formula: '=PACE.TITRE({12.4;8.2},"0.02 mol/L",10,2.5)', equals: [[0.062], [0.041]] },
  refusals: [
    {
      formula: '=PACE.TITRE(12.4,"0.02 mol",10)',
      mend: 'Give a concentration, with a unit such as mol/L or mmol/L.',
    },
  ],
  seeAlso: ['COEFFICIENT', 'ORDERS', 'ARRHENIUS'],
  reference: 'doi:10.1351/goldbook.T06387',
  caution:
    'Quench and titrate behind goggles; some quenched mixtures keep giving off gas. Local rules come first.',
  run: ({ volumes, titrant, aliquot, ratio }) =>
    convertColumn(volumes, (volume) => titratedConcentration(volume, titrant, aliquot, ratio)),
  builtIn: sayTitre,
});
