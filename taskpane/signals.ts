/** What can be measured, and the function that turns it into an amount or a concentration. */
import { functionNamed } from '../functions/catalogue';
import type { CellFunction } from '../functions/define';
import type { Parameter } from '../functions/parameters';
import { isUnit } from '../src/units';
import type { Heading, Quantity } from './headers';

export interface Signal {
  readonly functionName: string;
  /** What was measured, as a person says it. */
  readonly label: string;
  /** The symbol or word for what comes out of it. */
  readonly becomes: string;
}

/** In the order of the functions; the first that suits a heading is proposed. */
export const signals: readonly Signal[] = [
  { functionName: 'GASVOLUME', label: 'gas volume', becomes: 'n(gas)' },
  { functionName: 'GASPRESSURE', label: 'gas pressure, closed space', becomes: 'n(gas)' },
  { functionName: 'TOTALPRESSURE', label: 'total pressure, all gas', becomes: 'p left' },
  { functionName: 'MASSLOSS', label: 'mass of the open vessel', becomes: 'n(gas)' },
  { functionName: 'ACIDITY', label: 'pH', becomes: 'c(ion)' },
  { functionName: 'ABSORBANCE', label: 'absorbance', becomes: 'c' },
  { functionName: 'CONDUCTIVITY', label: 'conductivity', becomes: 'c left' },
  { functionName: 'TITRE', label: 'titre of aliquots', becomes: 'c' },
  { functionName: 'STANDARDS', label: 'reading beside standards', becomes: 'c' },
  { functionName: 'CONVERSION', label: 'any reading linear in concentration', becomes: 'fraction converted' },
  { functionName: 'REMAINING', label: 'product formed', becomes: 'c left' },
];

/** The readings stand for themselves: an amount, a concentration, or something in proportion to one. */
export const asItIs = '';

const byQuantity: Readonly<Partial<Record<Quantity, string>>> = {
  volume: 'GASVOLUME',
  pressure: 'GASPRESSURE',
  mass: 'MASSLOSS',
  pH: 'ACIDITY',
  absorbance: 'ABSORBANCE',
};

/** @param rises a gas burette fills, while less and less titrant is needed for what reacts away */
export function signalFor({ quantity, text }: Heading, rises: boolean): string {
  if (quantity === 'volume' && (!rises || /\btit(?:re|er)|burette/i.test(text))) return 'TITRE';
  if (/\bconductivity\b|^[κΛ](?=\W|$)|\b[mµμ]?S\/cm\b/i.test(text)) return 'CONDUCTIVITY';
  return byQuantity[quantity] ?? asItIs;
}

/** Where gas is caught in glass. */
const confined = new Set(['GASVOLUME', 'GASPRESSURE', 'TOTALPRESSURE']);

/** @param suits what the readings look like, where they are taken as they stand */
export const isConfinedGas = (what: string, suits: string): boolean =>
  confined.has(what === asItIs ? suits : what);

export const signalNamed = (functionName: string): Signal | undefined =>
  signals.find((signal) => signal.functionName === functionName);

/** The function of a choice; `undefined` where the readings stand as they are. */
export const functionOf = (what: string): CellFunction | undefined =>
  what === asItIs ? undefined : functionNamed(what);

export interface Field {
  readonly name: string;
  readonly parameter: Parameter;
}

/** The parameter that takes the run's readings. */
export const readingsParameter = (f: CellFunction): string =>
  Object.entries(f.parameters).find(([, { kind }]) => kind === 'readings')![0];

/** All that a conversion asks for besides the readings; it answers one column, so no detail. */
export function fieldsOf(f: CellFunction): readonly Field[] {
  const own = readingsParameter(f);
  return Object.entries(f.parameters)
    .filter(([name, { kind }]) => name !== own && name !== 'detail' && kind !== 'uncertainties')
    .map(([name, parameter]) => ({ name, parameter }));
}

/** What a heading already answers: the unit of the readings, where it is not the usual one. */
export function knownInputs(f: CellFunction, { unit }: Heading): Readonly<Record<string, string>> {
  const usual = f.parameters.unit?.whenOmitted;
  const isNew = usual !== undefined && usual.toLowerCase() !== unit.toLowerCase();
  return isNew && unit !== '' && isUnit(unit) ? { unit } : {};
}

/** In words, where the heading names a unit that the function does not take; empty otherwise. */
export function unitProblem(f: CellFunction, heading: Heading): string {
  const { unit } = f.parameters[readingsParameter(f)];
  const differs = unit !== heading.unit && isUnit(unit) && isUnit(heading.unit);
  return differs
    ? `PACE.${f.name} takes ${unit}, and the heading says ${heading.unit}: bring the readings to ${unit} first`
    : '';
}
