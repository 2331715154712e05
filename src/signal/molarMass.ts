import { InvalidInput } from '../errors';
import { atomicWeights } from './atomicWeights';

/**
 * Molar mass of a chemical formula, with brackets and hydrates: `CO2`, `Ca(OH)2`, `Na2S2O3·5H2O`.
 *
 * Parsed here: the kept parsers carry isotope means of their own that leave IUPAC's band for some
 * elements, and several times this module's size.
 *
 * @param formula element symbols, counts, ( ) or [ ], and `·`, `*` or `.` before a hydrate part
 * @returns M, g/mol
 * @throws InvalidInput where the formula cannot be read, saying at which character
 * @see standard atomic weights 2021, doi:10.1515/pac-2019-0603
 * @example molarMass('CO2') // 44.009
 */
export function molarMass(formula: string): number {
  const text = plainDigits(formula.trim());
  if (text === '') throw new InvalidInput('formula must not be empty');
  const parts = text.split(/[·•∙*.]/);
  let start = 0;
  let total = 0;
  for (const part of parts) {
    const [, count, body] = /^(\d*)(.*)$/.exec(part)!;
    if (Number(count) === 0 && count !== '') fail('a count of 0', start, text);
    total += (count === '' ? 1 : Number(count)) * massOf(body, text, start + count.length);
    start += part.length + 1;
  }
  return total;
}

/** Subscript digits, as copied from a document, are digits. */
const plainDigits = (text: string): string =>
  text.replace(/[₀-₉]/g, (digit) => String(digit.charCodeAt(0) - 0x2080));

function fail(why: string, at: number, whole: string): never {
  throw new InvalidInput(
    `formula must be made of element symbols and counts: ${why} at character ${at + 1} of "${whole}"`,
  );
}

const token = /([A-Z][a-z]?)(\d*)|([([])|([)\]])(\d*)/y;

function massOf(body: string, whole: string, offset: number): number {
  const open: { readonly bracket: string; readonly massBefore: number }[] = [];
  let mass = 0;
  const failAt = (at: number, why: string): never => fail(why, offset + at, whole);
  if (body === '') failAt(0, 'nothing');
  token.lastIndex = 0;
  while (token.lastIndex < body.length) {
    const at = token.lastIndex;
    const match = token.exec(body);
    if (!match) return failAt(at, `"${body[at]}"`);
    const [, symbol, count, opening, closing, groupCount] = match;
    if (symbol) {
      const weight = atomicWeights[symbol];
      if (weight === undefined) return failAt(at, `"${symbol}" has no standard atomic weight`);
      mass += weight * countOf(count, at + symbol.length);
    } else if (opening) {
      open.push({ bracket: opening, massBefore: mass });
      mass = 0;
    } else if (closing) {
      const before = open.pop();
      if (before === undefined) return failAt(at, `"${closing}" without its opening bracket`);
      if ((before.bracket === '(') !== (closing === ')'))
        return failAt(at, `"${closing}" closes "${before.bracket}"`);
      mass = before.massBefore + mass * countOf(groupCount, at + 1);
    }
  }
  if (open.length > 0) failAt(body.length, 'a bracket is not closed');
  return mass;

  function countOf(digits: string, at: number): number {
    if (digits === '') return 1;
    if (Number(digits) === 0) failAt(at, 'a count of 0');
    // C02, with a zero for the letter, would pass for two atoms of carbon
    if (digits.startsWith('0')) failAt(at, 'a count that begins with 0');
    return Number(digits);
  }
}
