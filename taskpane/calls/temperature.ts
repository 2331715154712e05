/** The temperature step: rate coefficients over temperature, by the functions of that family. */
import { isRange } from '../../functions/cell';
import { measuredParameters } from '../../functions/temperature/measuredParameters';
import { gasConstant } from '../../src/constants';
import { InvalidInput } from '../../src/errors';
import type { TemperatureChoice } from '../choices';
import type { Run, Table } from '../runs';
import { argumentOf, columnArgument, leftOut, truth, type Argument, type Pointing } from './argument';
import { askForRows, formulaText } from './call';
import { answeredEstimate, readEstimate, type Answered, type Estimate } from './estimate';
import type { Point } from './order';

/** Columns of the sheet. */
export interface Columns {
  readonly temperatures: number;
  readonly coefficients: number;
  readonly uncertainties: number | null;
}

/** Whether temperatures were chosen, or a heading names them. */
export const knowsTemperatures = ({ columns }: Table, { temperatures }: TemperatureChoice): boolean =>
  temperatures !== null || columns.some(({ heading }) => heading.quantity === 'temperature');

/**
 * As chosen, or else the first temperatures and the coefficients, or whatever stands right of them.
 *
 * @returns `null` for a run in time of which no column is known to hold temperatures: its times would give
 *   a number all the same
 */
export function columnsFor({ columns }: Table, choice: TemperatureChoice): Columns | null {
  const has = (column: number | null): column is number => columns.some((one) => one.column === column);
  const first = (quantity: string): number | undefined =>
    columns.find(({ heading }) => heading.quantity === quantity)?.column;
  const isRun = first('time') !== undefined;
  const temperatures = has(choice.temperatures)
    ? choice.temperatures
    : (first('temperature') ?? (isRun ? undefined : columns[0].column));
  if (temperatures === undefined) return null;
  const others = columns.map(({ column }) => column).filter((column) => column !== temperatures);
  const beside = others.find((column) => column > temperatures) ?? others[0];
  return {
    temperatures,
    coefficients: has(choice.coefficients) ? choice.coefficients : (first('coefficient') ?? beside),
    uncertainties: has(choice.uncertainties) ? choice.uncertainties : null,
  };
}

interface Given {
  readonly measured: readonly [Argument, Argument];
  readonly at: Argument;
  readonly uncertainties: Argument;
}

function givenBy(table: Table, run: Run, choice: TemperatureChoice, pointing: Pointing): Given | null {
  const columns = columnsFor(table, choice);
  if (!columns) return null;
  const { temperatures, coefficients, uncertainties } = columns;
  return {
    measured: [columnArgument(table, run, temperatures), columnArgument(table, run, coefficients)],
    at: argumentOf(choice.at, pointing),
    uncertainties: uncertainties === null ? leftOut : columnArgument(table, run, uncertainties),
  };
}

const energyCall = ({ measured, uncertainties }: Given, detail: Argument): [string, Argument[]] => [
  'ARRHENIUS',
  [...measured, uncertainties, detail],
];
const coefficientCall = ({ measured, at, uncertainties }: Given, detail: Argument): [string, Argument[]] => [
  'COEFFICIENTAT',
  [...measured, at, uncertainties, detail],
];

/** @returns `null` while no column is known to hold temperatures */
export function temperatureFormula(
  table: Table,
  run: Run,
  choice: TemperatureChoice,
  pointing: Pointing,
  detail: boolean,
): string | null {
  const given = givenBy(table, run, choice, pointing);
  const call = choice.answer === 'energy' ? energyCall : coefficientCall;
  return given && formulaText(...call(given, detail ? truth(true) : leftOut));
}

export interface TemperatureAnswer {
  /** Ea, kJ/mol. */
  readonly energy: Answered<Estimate>;
  readonly logFactor: Estimate | null;
  /** `null` where no temperature is asked for. */
  readonly predicted: (Answered<Estimate> & { readonly isExtrapolated: boolean }) | null;
  /** ln k against 1000 K/T. */
  readonly points: readonly Point[];
  readonly line: readonly Point[];
  /** The predicted coefficient in the same drawing. */
  readonly mark: readonly Point[];
}

/** @returns `null` while no column is known to hold temperatures */
export function temperatureAnswer(
  table: Table,
  run: Run,
  choice: TemperatureChoice,
  pointing: Pointing,
): TemperatureAnswer | null {
  const given = givenBy(table, run, choice, pointing);
  if (!given) return null;
  const rows = askForRows(...energyCall(given, truth(true)));
  const energy = answeredEstimate(rows);
  const logFactor = rows.length > 1 ? readEstimate(rows[1]) : null;
  const isAsked = choice.at.trim() !== '';
  const row = isAsked ? askForRows(...coefficientCall(given, truth(true))) : null;
  const predicted = row && { ...answeredEstimate(row), isExtrapolated: row[0][5] === 'extrapolated' };
  const points = pointsOf(given);
  const mark = predicted && 'ok' in predicted ? markAt(predicted.ok, energy, logFactor) : [];
  return {
    energy,
    logFactor,
    predicted,
    points,
    line: lineThrough([...points, ...mark], energy, logFactor),
    mark,
  };
}

/** Temperatures as the functions themselves read them, text with a unit too. */
function pointsOf({ measured: [temperatures, coefficients] }: Given): Point[] {
  const kelvins = numbersIn('temperatures', temperatures);
  const ks = numbersIn('coefficients', coefficients);
  return kelvins.flatMap((kelvin, row) => {
    const k = ks[row];
    const isPoint = kelvin !== null && k !== null && k > 0;
    return isPoint ? [{ x: 1000 / kelvin, y: Math.log(k) }] : [];
  });
}

function numbersIn(name: keyof typeof measuredParameters, { value }: Argument): readonly (number | null)[] {
  try {
    return isRange(value) ? measuredParameters[name].read(value, name).numbers : [];
  } catch (error) {
    if (error instanceof InvalidInput) return []; // the function says why, in words
    throw error;
  }
}

/** ln k = ln A − Ea/RT, drawn from what PACE.ARRHENIUS answered. */
function lineThrough(
  points: readonly Point[],
  energy: Answered<Estimate>,
  logFactor: Estimate | null,
): Point[] {
  if (!('ok' in energy) || !logFactor || points.length < 2) return [];
  const xs = points.map(({ x }) => x);
  return [Math.min(...xs), Math.max(...xs)].map((x) => ({
    x,
    y: logFactor.value - (energy.ok.value / gasConstant) * x,
  }));
}

/** Where on the line the predicted coefficient lies, so that its temperature need not be read twice. */
function markAt({ value }: Estimate, energy: Answered<Estimate>, logFactor: Estimate | null): Point[] {
  if (!('ok' in energy) || !logFactor || energy.ok.value === 0) return [];
  const y = Math.log(value);
  return [{ x: ((logFactor.value - y) * gasConstant) / energy.ok.value, y }];
}
