/**
 * An equation is written as one types it in a line of text, `n = (p − ρgh)V/(RT)`, and typeset from that:
 *
 * - letters that touch are a product, and a stroke divides what touches it on the left by what touches it on
 *   the right, up to the next space; brackets that only hold a fraction's parts together are not shown
 * - `₁` and `_i` or `_(words)` stand below, `²` and `^x` or `^(n − 1)` above; `∞`, `½`, `*` and `‡` belong to their letter
 * - `Δ` belongs to the letter behind it; d is always a differential; √ ∑ ∏ ∫ act on what follows
 * - what stands in double quotes is upright, as words and chemical formulas are: `c("H⁺")`
 */
export type Part =
  | { readonly kind: 'number' | 'operator' | 'word' | 'function'; readonly text: string }
  | QuantitySign
  | { readonly kind: 'power'; readonly base: Part; readonly exponent: Part }
  | { readonly kind: 'fraction'; readonly over: Part; readonly under: Part }
  | { readonly kind: 'root'; readonly of: Part }
  | { readonly kind: 'sum'; readonly text: string; readonly index?: Part }
  | { readonly kind: 'brackets'; readonly open: string; readonly close: string; readonly inside: Part }
  | { readonly kind: 'row'; readonly parts: readonly Part[] };

/** What stands for a quantity, with all that tells it from others of its letter: `y∞`, `ΔH‡`, `c(H⁺)`. */
export interface QuantitySign {
  readonly kind: 'sign';
  /** As it is written, without quotes. */
  readonly name: string;
  readonly letter: string;
  readonly isChange: boolean;
  readonly below?: Part;
  readonly mark?: string;
  readonly of?: string;
}

/** As it is read in a line of text: without the quotes. */
export const inLine = (equation: string): string => equation.replaceAll('"', '');

/** Every part of an equation, itself first. */
export function partsIn(part: Part): Part[] {
  const inner = ((): readonly (Part | undefined)[] => {
    switch (part.kind) {
      case 'power':
        return [part.base, part.exponent];
      case 'fraction':
        return [part.over, part.under];
      case 'root':
        return [part.of];
      case 'brackets':
        return [part.inside];
      case 'row':
        return part.parts;
      default:
        return [];
    }
  })();
  return [part, ...inner.flatMap((one) => (one ? partsIn(one) : []))];
}

/** The names of the quantities that an equation speaks of, each once. */
export const quantitiesIn = (part: Part): string[] => [
  ...new Set(partsIn(part).flatMap((one) => (one.kind === 'sign' ? [one.name] : []))),
];
