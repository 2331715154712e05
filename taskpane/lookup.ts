/** Finding a function by its name or by words of its help. */
import { catalogue } from '../functions/catalogue';
import { howInWords } from '../functions/documented';
import { typedName, type CellFunction, type Family } from '../functions/define';

export const families: readonly (readonly [Family, string])[] = [
  ['reading', 'Reading to amount or concentration'],
  ['rate', 'Rate'],
  ['order', 'Order, rate coefficient, half life'],
  ['temperature', 'Temperature'],
  ['mechanism', 'Mechanism and planning'],
  ['care', 'Care'],
];

const wordsOf = (f: CellFunction): string =>
  [
    typedName(f),
    f.summary,
    howInWords(f),
    ...Object.entries(f.parameters).flatMap(([name, { help }]) => [name, help]),
  ].join(' ');

/** As it is compared: half lives are found where a half life is asked for. */
const plain = (words: string): string => words.toLowerCase().replace(/\blives\b/g, 'life');

/**
 * Functions that hold every word typed; those that bear it in their name or summary come first.
 *
 * @returns all of them where nothing is typed
 */
export function lookUp(typed: string): readonly CellFunction[] {
  const wanted = plain(typed).replace(/^=/, '').split(/\s+/).filter(Boolean);
  const bears = (words: string): boolean => wanted.every((word) => plain(words).includes(word));
  const rank = (f: CellFunction): number => (bears(typedName(f)) ? 0 : bears(f.summary) ? 1 : 2);
  return catalogue
    .filter((f) => bears(wordsOf(f)))
    .map((f) => ({ f, rank: rank(f) }))
    .sort((a, b) => a.rank - b.rank)
    .map(({ f }) => f);
}
