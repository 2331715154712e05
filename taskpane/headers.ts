/** What a column heading says: `V / mL`, `t (s)`, `time, min`, `m/g`, `A`. */

export type Quantity =
  | 'time'
  | 'volume'
  | 'mass'
  | 'pressure'
  | 'amount'
  | 'concentration'
  | 'absorbance'
  | 'pH'
  | 'temperature'
  | 'fraction'
  | 'coefficient'
  | 'unknown';

export interface Heading {
  /** As it stands in the sheet. */
  readonly text: string;
  readonly quantity: Quantity;
  /** As it stands in the sheet; `1` where the quantity has none, empty where nobody said. */
  readonly unit: string;
}

/** Spellings of units of each quantity; the first pattern that takes the whole unit decides. */
const units: readonly (readonly [Quantity, RegExp])[] = [
  ['time', /^(?:[mµμn]?s|secs?|seconds?|min|mins|minutes?|h|hrs?|hours?|d|days?|weeks?)$/i],
  ['volume', /^(?:[mµμu]?l|cc|[dcm]?m(?:\^?3|³))$/i],
  ['mass', /^(?:[mµμuk]?g)$/i],
  ['pressure', /^(?:[khm]?pa|m?bar|torr|mmhg|atm|psi)$/i],
  ['concentration', /^(?:[mµμun]?mol\s*[/·⋅* ]?\s*(?:l|dm|cm|m).*|[mµμn]?M|[mµμ]?g\s*\/\s*m?l)$/i],
  ['amount', /^[mµμun]?mol$/i],
  ['temperature', /^(?:°\s?[cf]|℃|deg\s?[cf]|k)$/i],
];

/** Words and symbols that name a quantity on their own. A single letter counts only when it stands alone. */
const names: readonly (readonly [Quantity, RegExp])[] = [
  ['coefficient', /^k(?![A-Za-z])|\brate (?:coefficient|constant)\b/],
  ['fraction', /^x$|\bfraction\b|\bconversion\b/i],
  ['time', /^t$|\b(?:time|elapsed|clock)\b/i],
  ['absorbance', /^A(?:bs)?\.?$|\babsorb|\bA\d{3}\b|\boptical density\b/i],
  ['pH', /^pH\b/],
  ['volume', /^V$|\bvol(?:ume)?\b|\bgas\b/i],
  ['mass', /^m$|\bmass\b|\bweight\b|\bbalance\b/i],
  ['pressure', /^[pP]$|\bpress(?:ure)?\b/i],
  ['concentration', /^c$|\bconc(?:entration)?\b|^\[.+\]$/i],
  ['amount', /^n$|\bamount\b|\bmoles?\b/i],
  ['temperature', /^[Tθ]$|\btemp(?:erature)?\b/],
];

const unitless = new Set<Quantity>(['absorbance', 'pH', 'fraction']);

/** `name (unit)`, `name [unit]`, `name / unit`, `name, unit`, `name in unit`: the usual ways, in this order. */
const forms: readonly RegExp[] = [
  /^(.*\S)\s*\(([^()]*(?:\([^()]*\)[^()]*)*)\)$/,
  /^(.*\S)\s*\[([^[\]]+)\]$/,
  /^([^/]*[^/\s])\s*\/\s*(\S.*)$/,
  /^(.*\S)\s*,\s*([^,]+)$/,
  /^(.*\S)\s+in\s+(\S+)$/i,
];

const quantityOfUnit = (unit: string): Quantity =>
  units.find(([, spelling]) => spelling.test(unit))?.[0] ?? 'unknown';
const quantityOfName = (name: string): Quantity =>
  names.find(([, spelling]) => spelling.test(name))?.[0] ?? 'unknown';

/** A unit in brackets of its own, `(mL)`, is the unit. */
const bare = (unit: string): string => unit.trim().replace(/^\((.*)\)$/, '$1');

/**
 * @param text the heading cell
 * @example readHeading('V / mL') // { text: 'V / mL', quantity: 'volume', unit: 'mL' }
 */
export function readHeading(text: string): Heading {
  const heading = headingAsWritten(text);
  return isResult.test(heading.text) && heading.quantity === 'time'
    ? { ...heading, quantity: 'unknown' }
    : heading;
}

/** In a unit of time, and yet no time at which something was read. */
const isResult = /\bhalf[ -]?li(?:fe|ves)\b/i;

function headingAsWritten(text: string): Heading {
  const trimmed = text.trim();
  for (const form of forms) {
    const match = form.exec(trimmed);
    if (!match) continue;
    const [, name, inBrackets] = match;
    const unit = bare(inBrackets);
    const byUnit = quantityOfUnit(unit);
    const byName = quantityOfName(name.trim());
    if (byUnit !== 'unknown') return { text: trimmed, quantity: byUnit, unit };
    if (byName !== 'unknown' && /^(?:1|a\.?u\.?|[-–])$/i.test(unit))
      return { text: trimmed, quantity: byName, unit: '1' };
    if (byName !== 'unknown' && form !== forms[3]) return { text: trimmed, quantity: byName, unit };
  }
  const byUnit = quantityOfUnit(bare(trimmed));
  // `A, first tablet`: what stands behind the comma tells runs apart
  const ofWhole = quantityOfName(trimmed);
  const byName = ofWhole === 'unknown' ? quantityOfName(trimmed.split(',')[0].trim()) : ofWhole;
  if (byName !== 'unknown') return { text: trimmed, quantity: byName, unit: unitless.has(byName) ? '1' : '' };
  if (byUnit !== 'unknown' && trimmed.length > 1)
    return { text: trimmed, quantity: byUnit, unit: bare(trimmed) };
  return { text: trimmed, quantity: 'unknown', unit: '' };
}

/** A heading that names no unit, with the one that is known of it all the same. */
export function withUnit(heading: Heading, unit: string): Heading {
  if (heading.unit !== '' || unit.trim() === '') return heading;
  const { quantity } = readHeading(`${heading.text} / ${unit.trim()}`);
  return {
    ...heading,
    quantity: heading.quantity === 'unknown' ? quantity : heading.quantity,
    unit: unit.trim(),
  };
}

/** What a heading says besides its unit: `A1` of `A1 / mL`. */
export function nameOf({ text, unit }: Heading): string {
  const matches = forms.map((form) => form.exec(text));
  return matches.find((match) => match && unit !== '' && bare(match[2]) === unit)?.[1].trim() ?? text;
}

/** Is this cell a unit and nothing else, as on a row of units under the names? */
export const isUnitOnly = (text: string): boolean => quantityOfUnit(bare(text)) !== 'unknown';

/** The unit of a rate: `mL/s`, `(mol/L)/s`, `1/min`; in words where a heading names no unit. */
export function rateUnit(reading: Heading, time: Heading): string {
  const perTime = time.unit === '' ? 'time unit' : time.unit;
  if (reading.unit === '') return `reading unit per ${perTime}`;
  const above = /[/·⋅*\s]/.test(reading.unit) ? `(${reading.unit})` : reading.unit;
  return time.unit === '' ? `${above} per ${perTime}` : `${above}/${perTime}`;
}
