/**
 * Quantities written by hand, read and converted: `"22 degC"`, `"752 mmHg"`, `"0.25 L"`.
 *
 * The conversions are mathjs's. Where its table is rounded or silent the unit is defined here from
 * its own definition:
 * - torr = 101325/760 Pa exactly (ISO 80000-4:2019, remark); mathjs rounds it, 3 parts in 10⁶ off
 * - mmHg, conventional = 133.322387415 Pa (BS 350-1:1974, 13.5951 g/cm³ × 9.80665 m/s²)
 * - mmH2O, conventional = 9.80665 Pa
 * - inHg, conventional = 25.4 mmHg (inch exactly 25.4 mm)
 * - psi = 0.45359237 kg × 9.80665 m/s² ⁄ (0.0254 m)² (NIST SP 811, B.8); mathjs rounds it, 6 parts in 10¹¹ off
 * - cal, thermochemical = 4.184 J exactly
 * - M = mol/L; d = 86400 s
 */
import * as mathjs from 'mathjs';
import { standardGravity } from './constants';
import { InvalidInput, shown } from './errors';

interface Quantity {
  equalBase(other: Quantity): boolean;
  toNumber(unit: string): number;
}

interface QuantityClass {
  new (value: number, unit: string): Quantity;
  createUnit(
    units: Record<string, { definition: string; prefixes?: string }>,
    options: { override: boolean },
  ): void;
}

/** Stands in for mathjs's big fractions, of which its unit table uses 5/9 alone. */
class Ratio {
  readonly isFraction = true;
  constructor(
    readonly n: number,
    readonly d: number,
  ) {}

  /** mathjs multiplies by it without asking what it is. */
  valueOf(): number {
    return this.n / this.d;
  }
}

/**
 * mathjs's unit class on plain numbers. Its own assembly would bring matrices, big numbers and complex
 * numbers along: 200 kB instead of 12 kB in a pane that must open at once.
 */
const { createUnitClass } = mathjs as unknown as { createUnitClass(parts: object): QuantityClass };

const Quantities = createUnitClass({
  config: { number: 'number' },
  addScalar: (a: number, b: number) => a + b,
  subtractScalar: (a: number, b: number) => a - b,
  multiplyScalar: (a: number, b: number) => a * b,
  divideScalar: (a: number, b: number) => a / b,
  pow: (a: number, b: number) => a ** b,
  abs: Math.abs,
  fix: Math.trunc,
  round: Math.round,
  equal: (a: number, b: number) => a === b,
  isNumeric: (value: unknown) => typeof value === 'number' || value instanceof Ratio,
  format: String,
  number: (value: number | Ratio) => (value instanceof Ratio ? value.n / value.d : Number(value)),
  Complex: { I: 0 },
  BigNumber: Number,
  Fraction: Ratio,
});

Quantities.createUnit(
  {
    torr: { definition: `${101325 / 760} Pa` },
    mmHg: { definition: '133.322387415 Pa' },
    inHg: { definition: `${25.4 * 133.322387415} Pa` },
    mmH2O: { definition: '9.80665 Pa' },
    psi: { definition: `${(0.45359237 * standardGravity) / 0.0254 ** 2} Pa` },
    M: { definition: '1 mol/L', prefixes: 'short' },
    d: { definition: '86400 s' },
    cal: { definition: '4.184 J', prefixes: 'short' },
  },
  { override: true },
);

/** Spellings of the trade that mathjs does not know, and what it calls them. */
// prettier-ignore
const spellings: Readonly<Record<string, string>> = {
  '°C': 'degC', '℃': 'degC', 'C': 'degC', 'celsius': 'degC', 'degc': 'degC', '°F': 'degF',
  'k': 'K', 'kelvin': 'K',
  'ml': 'mL', 'ML': 'mL', 'cc': 'cm^3', 'cm3': 'cm^3', 'cm³': 'cm^3', 'dm3': 'dm^3', 'dm³': 'dm^3',
  'm3': 'm^3', 'm³': 'm^3', 'mm3': 'mm^3', 'mm³': 'mm^3', 'µL': 'uL', 'μL': 'uL', 'ul': 'uL', 'l': 'L',
  'µm': 'um', 'μm': 'um', 'µg': 'ug', 'μg': 'ug',
  'µM': 'uM', 'μM': 'uM',
  'mmhg': 'mmHg', 'MMHG': 'mmHg', 'mm Hg': 'mmHg', 'inhg': 'inHg', 'in Hg': 'inHg', 'Torr': 'torr', 'TORR': 'torr', 'mmH2O': 'mmH2O', 'mmh2o': 'mmH2O', 'mmWS': 'mmH2O', 'mm H2O': 'mmH2O',
  'Bar': 'bar', 'Atm': 'atm', 'ATM': 'atm', 'PSI': 'psi', 'kpa': 'kPa', 'KPa': 'kPa', 'hpa': 'hPa', 'pa': 'Pa', 'mpa': 'MPa',
};

const kelvin = new Quantities(1, 'K');

const quantityText = /^([+−-]?(?:\d+(?:[.,]\d*)?|[.,]\d+)(?:e[+-]?\d+)?)\s*(.*)$/i;

/** A second number before the unit, which mathjs would multiply in: `"1 000 mL"` is not 0 mL. */
const secondNumber = /^(?!1\s*\/)\d/;

function unitOf(text: string, name: string): Quantity {
  const spelled = spellings[text] ?? text;
  try {
    if (!secondNumber.test(text)) return new Quantities(1, spelled);
  } catch {
    // said below
  }
  throw new InvalidInput(`${name} must carry a unit that is known: got "${text}"`);
}

/** Whether the text is a unit that is known. @example isUnit('mmHg') // true */
export function isUnit(text: string): boolean {
  try {
    unitOf(text, '');
    return true;
  } catch {
    return false;
  }
}

/**
 * Reads `"752 mmHg"` as a number of `unit`. Text without a unit is a number of `unit` already.
 *
 * @throws InvalidInput for text that is no quantity, an unknown unit, or a unit of the wrong kind
 * @example parseQuantity('760 torr', 'kPa', 'pressure') // 101.325
 */
export function parseQuantity(text: string, unit: string, name: string): number {
  const match = quantityText.exec(text.trim());
  if (!match)
    throw new InvalidInput(`${name} must be a number with a unit, such as "1 ${unit}": got "${text}"`);
  const value = Number(match[1].replace(',', '.').replace('−', '-'));
  return match[2] === '' ? value : convertUnit(value, match[2].trim(), unit, name);
}

/**
 * @throws InvalidInput when the two units measure different things, or for a temperature below absolute zero
 * @example convertUnit(22, 'degC', 'K', 'temperature') // 295.15
 */
export function convertUnit(value: number, from: string, to: string, name: string): number {
  const source = unitOf(from, name);
  const target = unitOf(to, name);
  if (!source.equalBase(target)) {
    throw new InvalidInput(
      `${name} must be in a unit like ${to}: ${shown(value)} ${from} measures something else`,
    );
  }
  const spelled = spellings[from] ?? from;
  if (source.equalBase(kelvin) && convertQuantity(value, spelled, 'K') < 0) {
    throw new InvalidInput(`${name} must not be below absolute zero: got ${shown(value)} ${from}`);
  }
  return convertQuantity(value, spelled, spellings[to] ?? to);
}

/** Between two units known to fit. @example convertQuantity(1, 'L', 'mL') // 1000 */
export function convertQuantity(value: number, from: string, to: string): number {
  return from === to ? value : new Quantities(value, from).toNumber(to);
}
