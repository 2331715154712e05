/**
 * Reads a written mechanism: `A + B -> C; C <-> D`.
 *
 * Steps stand on lines of their own or between semicolons, and an arrow may follow on an arrow:
 * `A -> B -> C` is two steps. Arrows are `->` `=>` `→` and, both ways, `<->` `<=>` `⇌` `⇄` `↔`. A plus
 * joins two species only with a space on each side, since elsewhere it is a charge: `Fe3+`, `A+ + B-`.
 * A coefficient stands before its species: `2 NO2`, `0.5 O2`, `1/2 O2`. One side may be empty: `A ->` goes
 * away, `-> A` comes in at a steady rate.
 */
import { InvalidInput } from '../errors';
import type { Reaction, Scheme } from './scheme';
import { isOneWay, SchemeReader, type Arrow } from './schemeReader';

/** Coefficients by species, in order of appearance; `A + A` counts as `2 A`. */
type Side = ReadonlyMap<string, number>;

/**
 * @throws InvalidInput that points at the character where the text stops making sense
 * @example parseScheme('2 NO2 <-> N2O4').species.join(' ') // 'NO2 N2O4'
 */
export function parseScheme(text: string): Scheme {
  const reader = new SchemeReader(text);
  const places = new Map<string, number>();
  const reactions: Reaction[] = [];
  while (reader.skipToStep()) readChain(reader, places, reactions);
  if (reactions.length === 0)
    throw new InvalidInput('scheme must hold a step, such as A -> B: none was found');
  return { species: [...places.keys()], reactions };
}

/** One step, or several that share their sides: `A -> B -> C`. */
function readChain(reader: SchemeReader, places: Map<string, number>, reactions: Reaction[]): void {
  const start = reader.at;
  let left = readSide(reader, places);
  let arrow = reader.arrow();
  if (!arrow) throw reader.error('have an arrow in every step', 'none in the step', start);
  while (arrow) {
    const right = readSide(reader, places);
    if (left.size === 0 && right.size === 0) {
      throw reader.error('name a species on at least one side of an arrow', 'none', start);
    }
    reactions.push(...reactionsOf(left, right, arrow, places));
    left = right;
    arrow = reader.arrow();
  }
}

function readSide(reader: SchemeReader, places: Map<string, number>): Side {
  const side = new Map<string, number>();
  if (reader.isAtSideEnd()) return side;
  do {
    const number = reader.coefficient();
    const name = reader.species();
    if (!places.has(name)) places.set(name, places.size);
    side.set(name, (side.get(name) ?? 0) + number);
  } while (reader.plus());
  return side;
}

function reactionsOf(left: Side, right: Side, arrow: Arrow, places: ReadonlyMap<string, number>): Reaction[] {
  const forward = reaction(left, right, places);
  return isOneWay(arrow) ? [forward] : [forward, reaction(right, left, places)];
}

function reaction(left: Side, right: Side, places: ReadonlyMap<string, number>): Reaction {
  const names = new Set([...left.keys(), ...right.keys()]);
  const changes = [...names].map((name) => ({
    species: places.get(name)!,
    number: (right.get(name) ?? 0) - (left.get(name) ?? 0),
  }));
  return {
    left: [...left].map(([name, number]) => ({ species: places.get(name)!, number })),
    net: changes.filter(({ number }) => number !== 0),
    words: [sideInWords(left), '->', sideInWords(right)].filter(Boolean).join(' '),
  };
}

const sideInWords = (side: Side): string =>
  [...side].map(([name, number]) => (number === 1 ? name : `${number} ${name}`)).join(' + ');
