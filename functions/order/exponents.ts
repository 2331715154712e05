import { nearestSimpleOrder, partialOrders } from '../../src/order/exponents';
import type { Estimate } from '../../src/estimate';
import { columnsBeside } from '../block';
import type { CellValue } from '../cell';
import { detail } from '../commonParameters';
import { sayExponents } from '../builtIn/exponents';
import { defineFunction } from '../define';
import { uncertaintyOf } from '../uncertaintyOf';
import { block, column } from '../parameters';
import { standardRow } from '../results';

export default defineFunction({
  name: 'EXPONENTS',
  family: 'order',
  summary: 'Partial orders and rate coefficient, from initial rates at several concentrations.',
  equations: {
    lines: ['ln r = ln k + ∑ᵢ nᵢ ln cᵢ'],
    where: {
      r: 'initial rate of a run',
      k: 'rate coefficient',
      nᵢ: 'order in reactant i',
      cᵢ: 'initial concentration of reactant i',
    },
  },
  method:
    'Linear least squares, so that each rate counts with the same share of itself. A row: the order in each reactant, k last. With detail one standard row each, and beside an order the nearest simple one where its 95 % limits hold it. Change one reactant at a time, over as wide a range as the method allows.',
  uncertainty: uncertaintyOf.line,
  parameters: {
    rates: column({ help: 'initial rates, one a run' }),
    concentrations: block({ help: 'initial concentrations, one column a reactant' }),
    detail: detail(),
  },
  result: { unit: '1; k in rate per concentrations', shape: 'table' },
  // r = 3 a² b
  example: {
    formula: '=PACE.EXPONENTS({0.003;0.0045;0.00675},{0.1,0.1;0.1,0.15;0.15,0.1})',
    equals: [[2, 1, 3]],
  },
  refusals: [
    {
      formula: '=PACE.EXPONENTS({1;2;4},{0.1,0.1;0.2,0.2;0.4,0.4})',
      mend: 'Change one reactant while the other stays.',
    },
    {
      formula: '=PACE.EXPONENTS({1;2},{0.1,0.1;0.2,0.1})',
      mend: 'Make more runs: one more than there are reactants.',
    },
    {
      formula: '=PACE.EXPONENTS({1;2;4},{0.1,0.1;0.2,0.1;0.4,0.1})',
      mend: 'Vary this reactant as well, or leave its column out.',
    },
    {
      formula: '=PACE.EXPONENTS({1;-2;4},{0.1;0.2;0.4})',
      mend: 'Give rates as positive numbers, with the coefficient −1 for a reactant.',
    },
  ],
  seeAlso: ['START', 'EVENT', 'OVERLAYORDER', 'UNIT'],
  reference: 'doi:10.1351/goldbook.O04322',
  run({ rates, concentrations, detail }) {
    const columns = columnsBeside(concentrations, rates, { block: 'concentrations', beside: 'rates' });
    const kept = [...rates.numbers.keys()].filter(
      (run) => rates.numbers[run] !== null && columns.every(({ numbers }) => numbers[run] !== null),
    );
    const picked = (numbers: readonly (number | null)[]): Float64Array =>
      Float64Array.from(kept, (run) => numbers[run]!);
    const found = partialOrders(
      picked(rates.numbers),
      columns.map(({ numbers }) => picked(numbers)),
    );
    if (!detail) return [[...found.orders.map(({ value }) => value), found.rateCoefficient.value]];
    return [...found.orders.map(orderRow), [...standardRow(found.rateCoefficient), '']];
  },
  builtIn: sayExponents,
});

const orderRow = (order: Estimate): CellValue[] => [...standardRow(order), nearestSimpleOrder(order) ?? ''];
