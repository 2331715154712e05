/**
 * The two ways a calculation can refuse, and the checks that do so.
 *
 * A message says the rule, then where it broke and the value seen, with no full stop:
 * `volume must be 0 or more: row 7 (-0.3 mL)`.
 */

/** The user can mend the call: a cell shows `#VALUE!` and these words. */
export class InvalidInput extends Error {
  override readonly name = 'InvalidInput';
}

/** The call is sound but the data cannot tell: a cell shows `#N/A` and these words. */
export class NotDetermined extends Error {
  override readonly name = 'NotDetermined';
}

/** A name and the number it stands for, as in `{ rateCoefficient }`. */
export type NamedNumbers = Readonly<Record<string, number>>;

/**
 * `rateCoefficient` → `rate coefficient`, so that a message reads like a sentence.
 *
 * @example inWords('rateCoefficient') // 'rate coefficient'
 */
export const inWords = (name: string): string =>
  name.replace(/[A-Z]/g, (letter) => ` ${letter.toLowerCase()}`);

/**
 * A number as a message shows it: up to six significant digits, no trailing zeros.
 *
 * @example shown(0.1 + 0.2) // '0.3'
 */
export const shown = (value: number): string =>
  Number.isFinite(value) ? String(Number(value.toPrecision(6))) : String(value);

function requireThat(holds: (value: number) => boolean, rule: string, numbers: NamedNumbers): void {
  for (const [name, value] of Object.entries(numbers)) {
    if (!holds(value)) throw new InvalidInput(`${inWords(name)} must be ${rule}: got ${shown(value)}`);
  }
}

/**
 * Every number is finite.
 *
 * @throws InvalidInput
 * @example requireFinite({ order: NaN }) // throws order must be a finite number: got NaN
 */
export const requireFinite = (numbers: NamedNumbers): void =>
  requireThat(Number.isFinite, 'a finite number', numbers);

/**
 * Every number is finite and above 0.
 *
 * @throws InvalidInput
 * @example requirePositive({ rateCoefficient: 0 }) // throws rate coefficient must be above 0: got 0
 */
export const requirePositive = (numbers: NamedNumbers): void =>
  requireThat((value) => Number.isFinite(value) && value > 0, 'above 0', numbers);

/**
 * Every number is finite and 0 or more.
 *
 * @throws InvalidInput
 * @example requireNotNegative({ volume: -0.3 }) // throws volume must be 0 or more: got -0.3
 */
export const requireNotNegative = (numbers: NamedNumbers): void =>
  requireThat((value) => Number.isFinite(value) && value >= 0, '0 or more', numbers);

/**
 * A species that takes part: a signed number, −2 for two used up.
 *
 * @throws InvalidInput for 0
 * @example requireStoichiometricNumber(-2) // undefined
 */
export function requireStoichiometricNumber(stoichiometricNumber: number): void {
  requireFinite({ stoichiometricNumber });
  if (stoichiometricNumber === 0) {
    throw new InvalidInput('stoichiometric number must not be 0: a species that takes no part has no rate');
  }
}
