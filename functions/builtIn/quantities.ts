/** Quantities in formulas: their bounds, their units, and numbers that carry their unit as text. */
import { convertUnit } from '../../src/units';
import type { Bounds } from '../parameters';
import { NotSaid } from './said';
import { numberText, quoted } from './text';

/** That it is a number; an error there is the answer itself, which the second condition passes on. */
export const isNumber = (text: string): string[] => [`ISNUMBER(${text})`, `${text}<>""`];

/** The conditions of a bound, for a text that is not known to keep it. */
export function within(text: string, { above, atLeast, below, atMost, whole }: Bounds): string[] {
  const holds: string[] = [];
  if (above !== undefined) holds.push(`${text}>${numberText(above)}`);
  if (atLeast !== undefined) holds.push(`${text}>=${numberText(atLeast)}`);
  if (below !== undefined) holds.push(`${text}<${numberText(below)}`);
  if (atMost !== undefined) holds.push(`${text}<=${numberText(atMost)}`);
  if (whole) holds.push(`${text}=INT(${text})`);
  return holds;
}

/** Units differ by a factor, temperatures by a step as well. */
export function converted(text: string, from: string, to: string): string {
  if (from === to) return text;
  const step = convertUnit(0, from, to, '');
  const factor = tidy(convertUnit(1, from, to, '') - step, step === 0 ? 15 : 13);
  const scaled =
    factor === 1
      ? text
      : factor < 1 && isWhole(1 / factor)
        ? `${text}/${tidy(1 / factor)}`
        : `${text}*${numberText(factor)}`;
  return step === 0 ? `(${scaled})` : `(${scaled}+${numberText(step)})`;
}

/** Conversions leave a last digit that is not meant: 9.999999999999999E-5. */
export const tidy = (value: number, digits = 15): number => Number(value.toPrecision(digits));
const isWhole = (value: number): boolean => Number.isInteger(tidy(value));

/**
 * `21.4 degC` in a cell: the number before the unit, which must stay the unit it is. Figures without their
 * point are read, then divided: what a point means differs from country to country, and the function that
 * asks for it is not the same in all programs.
 */
export function numberBefore(text: string, cell: string, name: string): [string, string[], string] {
  const [, number, unit] = /^([+-]?\d*\.?\d+)(\s*[^\d\s.].*)$/.exec(cell) ?? [];
  if (number === undefined || unit.includes('.'))
    throw new NotSaid(`${name} is text that no formula can read`);
  const length = [...unit].length;
  return [
    `VALUE(SUBSTITUTE(LEFT(${text},LEN(${text})-${length}),".",""))/10^MAX(0,LEN(${text})-${length}-FIND(".",${text}&"."))`,
    [`EXACT(RIGHT(${text},${length}),${quoted(unit)})`],
    unit.trim(),
  ];
}
