/** Pieces of a formula, each with the conditions under which it may be used. */

export interface Phrase {
  readonly text: string;
  readonly holds: readonly string[];
}

export const sure = (text: string): Phrase => ({ text, holds: [] });

export const holdsOf = (...phrases: readonly Phrase[]): string[] => phrases.flatMap(({ holds }) => holds);

/** A number that stands in the formula itself, in brackets where it is negative. */
export const isNumberText = (text: string): boolean => /^\(?-?\d*\.?\d+(?:E[+-]?\d+)?\)?$/.test(text);

/** That two numbers differ; nothing to say of two that are written out. */
export const differ = (a: string, b: string): string[] =>
  isNumberText(a) && isNumberText(b) ? [] : [`${a}<>${b}`];

/** A product without factors of 1. */
export const product = (...factors: readonly string[]): string =>
  factors.filter((factor) => factor !== '1').join('*') || '1';
