import { standardRowHeadings } from '../../functions/results';
import {
  columnsFor,
  temperatureAnswer,
  temperatureFormula,
  type TemperatureAnswer,
} from '../calls/temperature';
import type { NumberFormats } from '../numberFormats';
import { areaOf, headingOf, type Run, type Table } from '../runs';
import type { State } from '../store';
import { detailColumns, estimateFormats, headingsFor, oneFormula, type Insertion } from './insertion';

export function temperatureInsertion(
  table: Table,
  run: Run,
  { temperature, pointedAt, put }: Pick<State, 'temperature' | 'pointedAt' | 'put'>,
): Insertion | null {
  const { withDetail } = put;
  const pointing = { sheet: table.sheet, pointedAt };
  const formula = temperatureFormula(table, run, temperature, pointing, withDetail);
  const columns = columnsFor(table, temperature);
  if (!columns || formula === null) return null;
  const reads = [columns.temperatures, columns.coefficients].map((column) => areaOf(table, column, run));
  const { unit } = headingOf(table, columns.coefficients);
  const answer = (): TemperatureAnswer | null => temperatureAnswer(table, run, temperature, pointing);
  if (temperature.answer === 'energy')
    return {
      ...(withDetail ? twoRows(formula, answer) : oneEnergy(formula, answer)),
      reads,
      hasDetail: true,
    };
  const name = `k at ${/^[-+.\d]+$/.test(temperature.at.trim()) ? `${temperature.at.trim()} °C` : temperature.at.trim()}`;
  return {
    name,
    ...oneFormula(formula, { rows: 1, columns: detailColumns(withDetail) + (withDetail ? 1 : 0) }, () =>
      withWords(estimateFormats(answer()?.predicted ?? refused, detailColumns(withDetail)), withDetail),
    ),
    headings: [...headingsFor(name, unit, withDetail), ...(withDetail ? ['beyond those measured'] : [])],
    reads,
    hasDetail: true,
  };
}

const refused = { refused: 'no temperature is asked for' };

/** The last column of the detail holds words. */
const withWords = (formats: NumberFormats, isLonger: boolean): NumberFormats =>
  isLonger ? formats.map((row) => [...row, null]) : formats;

const energyName = 'activation energy';
const energyHeading = 'Ea / (kJ/mol)';

type Answer = () => TemperatureAnswer | null;

const oneEnergy = (formula: string, answer: Answer): Omit<Insertion, 'reads' | 'hasDetail'> => ({
  name: energyName,
  ...oneFormula(formula, { rows: 1, columns: 1 }, () => estimateFormats(answer()?.energy ?? refused, 1)),
  headings: [energyHeading],
});

/** Ea and ln A under each other, each with its name before it. */
function twoRows(formula: string, answer: Answer): Omit<Insertion, 'reads' | 'hasDetail'> {
  const size = { rows: 2, columns: standardRowHeadings.length };
  const formats = (): NumberFormats => {
    const { energy = refused, logFactor } = answer() ?? {};
    return logFactor
      ? [energy, { ok: logFactor }].flatMap((one) => estimateFormats(one, size.columns))
      : estimateFormats(energy, size.columns);
  };
  const names = [energyHeading, 'ln A'].map((value, down) => ({ down, right: 0, content: { value } }));
  return {
    name: energyName,
    parts: [...names, { down: 0, right: 1, content: { formula }, spills: size, formats }],
    size: { ...size, columns: size.columns + 1 },
    headings: ['over temperature', ...standardRowHeadings],
  };
}
