import { InvalidInput } from '../../src/errors';
import { overlayExponent, type OverlayRun } from '../../src/order/overlay';
import { pairReadings } from '../../src/series/series';
import type { Column } from '../column';
import { NotSaid } from '../builtIn/said';
import { defineFunction } from '../define';
import { uncertaintyOf } from '../uncertaintyOf';
import { column } from '../parameters';
import { standardRow } from '../results';

export default defineFunction({
  name: 'OVERLAYORDER',
  family: 'order',
  summary: 'Order in a reactant: the exponent that best lays two runs on one curve.',
  equations: {
    lines: ['τ = ∫c^β dt'],
    where: {
      τ: 'normalised time, on which the products of both runs are laid',
      c: 'concentration of the reactant',
      β: 'order in the reactant',
      t: 'time',
    },
  },
  method:
    'β is where the scatter of both runs about one common polynomial, of a degree that AICc chooses, exceeds that about two separate ones least. A standard row: value, standard uncertainty, 95 % limits, degrees of freedom. The runs must differ in the reactant, and in nothing else.',
  uncertainty: uncertaintyOf.profile,
  parameters: {
    times1: column({ help: 'times of the first run', unit: 'time' }),
    products1: column({ help: 'product formed in it' }),
    reactants1: column({ help: 'concentration of the reactant in it' }),
    times2: column({ help: 'times of the second run', unit: 'time' }),
    products2: column({ help: 'product formed in it' }),
    reactants2: column({ help: 'concentration of the reactant in it' }),
  },
  result: { unit: '1', shape: 'table' },
  // two runs of a first order: product c₀(1 − 2^−t)
  example: {
    formula: '=PACE.OVERLAYORDER({0;1;2;3},{0;4;6;7},{8;4;2;1},{0;1;2;3},{0;2;3;3.5},{4;2;1;0.5})',
    equals: [[1]],
    within: 0.05,
  },
  refusals: [
    {
      formula: '=PACE.OVERLAYORDER({0;1;2;3},{0;4;6;7},{8;4;2;1},{0;1;2;3},{0;4;6;7},{8;4;2;1})',
      mend: 'Make a second run with the reactant at another concentration.',
    },
    {
      formula: '=PACE.OVERLAYORDER({0;1},{0;4},{8;4},{0;1},{0;2},{4;2})',
      mend: 'Take more readings in each run.',
    },
  ],
  seeAlso: ['NORMALTIME', 'EXPONENTS', 'ORDER'],
  reference: 'doi:10.1002/anie.201609757',
  isLong: { fromCells: 600 },
  run: ({ times1, products1, reactants1, times2, products2, reactants2 }) => [
    standardRow(
      overlayExponent(runOf(times1, products1, reactants1, '1'), runOf(times2, products2, reactants2, '2')),
    ),
  ],
  builtIn: () => {
    throw new NotSaid(
      'its exponent is searched for, about a curve whose degree is found by trial, which no built-in function does',
    );
  },
});

/** Only times at which both product and reactant are known. */
function runOf(times: Column, products: Column, reactants: Column, which: string): OverlayRun {
  const counts = [times, products, reactants].map(({ numbers }) => numbers.length);
  if (new Set(counts).size > 1) {
    throw new InvalidInput(
      `times${which}, products${which} and reactants${which} must be of one length: got ${counts.join(', ')}`,
    );
  }
  const isKept = times.numbers.map((_, i) => products.numbers[i] !== null && reactants.numbers[i] !== null);
  const kept = times.numbers.map((time, i) => (isKept[i] ? time : null));
  return { product: pairReadings(kept, products.numbers), reactant: pairReadings(kept, reactants.numbers) };
}
