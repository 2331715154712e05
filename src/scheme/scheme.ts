/** A mechanism as the calculation sees it: one-way reactions among numbered species. */

/** A species and how many of it: a coefficient on one side, or the net change. */
export interface Term {
  /** Place in {@link Scheme.species}. */
  readonly species: number;
  readonly number: number;
}

/** One direction of one step. Its rate is v = k ∏ c^(coefficient) over its left side as written. */
export interface Reaction {
  readonly left: readonly Term[];
  /** What one turn changes: right side less left side; a catalyst does not appear. */
  readonly net: readonly Term[];
  /** As a message names it: `A + B -> C`. */
  readonly words: string;
}

export interface Scheme {
  /** In order of first appearance. */
  readonly species: readonly string[];
  /** One a rate coefficient, in order; a reversible step gives two, forward first. */
  readonly reactions: readonly Reaction[];
}

/**
 * A coefficient and the reaction it belongs to.
 *
 * @example reactionInWords(parseScheme('A <-> B'), 1) // 'coefficient 2 (B -> A)'
 */
export const reactionInWords = ({ reactions }: Scheme, place: number): string =>
  `coefficient ${place + 1} (${reactions[place].words})`;
