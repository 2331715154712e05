import { standardRowHeadings } from '../../functions/results';
import { columnsFor, temperatureFormula } from '../calls/temperature';
import { areaOf, headingOf, type Run, type Table } from '../runs';
import type { State } from '../store';
import { detailColumns, headingsFor, oneFormula, type Insertion } from './insertion';

export function temperatureInsertion(
  table: Table,
  run: Run,
  { temperature, pointedAt, put }: Pick<State, 'temperature' | 'pointedAt' | 'put'>,
): Insertion {
  const { withDetail } = put;
  const pointing = { sheet: table.sheet, pointedAt };
  const formula = temperatureFormula(table, run, temperature, pointing, withDetail);
  const columns = columnsFor(table, temperature);
  const reads = [columns.temperatures, columns.coefficients].map((column) => areaOf(table, column, run));
  const { unit } = headingOf(table, columns.coefficients);
  if (temperature.answer === 'energy')
    return { ...(withDetail ? twoRows(formula) : oneEnergy(formula)), reads, hasDetail: true };
  const name = `k at ${/^[-+.\d]+$/.test(temperature.at.trim()) ? `${temperature.at.trim()} °C` : temperature.at.trim()}`;
  return {
    name,
    ...oneFormula(formula, { rows: 1, columns: detailColumns(withDetail) + (withDetail ? 1 : 0) }),
    headings: [...headingsFor(name, unit, withDetail), ...(withDetail ? ['beyond those measured'] : [])],
    reads,
    hasDetail: true,
  };
}

const energyName = 'activation energy';
const energyHeading = 'Ea / (kJ/mol)';

const oneEnergy = (formula: string): Omit<Insertion, 'reads' | 'hasDetail'> => ({
  name: energyName,
  ...oneFormula(formula, { rows: 1, columns: 1 }),
  headings: [energyHeading],
});

/** Ea and ln A under each other, each with its name before it. */
function twoRows(formula: string): Omit<Insertion, 'reads' | 'hasDetail'> {
  const size = { rows: 2, columns: standardRowHeadings.length };
  const names = [energyHeading, 'ln A'].map((value, down) => ({ down, right: 0, content: { value } }));
  return {
    name: energyName,
    parts: [...names, { down: 0, right: 1, content: { formula }, spills: size }],
    size: { ...size, columns: size.columns + 1 },
    headings: ['over temperature', ...standardRowHeadings],
  };
}
