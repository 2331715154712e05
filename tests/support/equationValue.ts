/** What an equation's right side comes to, so that what is typeset can be held against what is worked out. */
import type { Part } from '../../functions/equation/equation';
import { readEquation } from '../../functions/equation/read';

type Known = Readonly<Record<string, number>>;

/** @param equation with one `=`; what stands on its right side is worked out */
export function valueOf(equation: string, known: Known): number {
  const whole = readEquation(equation);
  if (whole.kind !== 'row') throw new Error(`no equation: ${equation}`);
  const equals = whole.parts.findIndex((part) => part.kind === 'operator' && part.text === '=');
  return sum(whole.parts.slice(equals + 1), known);
}

function sum(parts: readonly Part[], known: Known): number {
  let total = 0;
  let sign = 1;
  let product: Part[] = [];
  const close = (): void => {
    if (product.length > 0) total += sign * productOf(product, known);
    product = [];
  };
  for (const part of parts) {
    if (part.kind === 'operator' && '+−'.includes(part.text)) {
      close();
      sign = part.text === '−' ? -1 : 1;
    } else if (!(part.kind === 'operator' && part.text === '·')) product.push(part);
  }
  close();
  return total;
}

/** A function takes what stands next to it, once. */
function productOf([first, ...rest]: readonly Part[], known: Known): number {
  if (first.kind !== 'function') return one(first, known) * (rest.length > 0 ? productOf(rest, known) : 1);
  const [argument, ...after] = rest;
  const of = { ln: Math.log, lg: Math.log10, exp: Math.exp }[first.text]!;
  return of(one(argument, known)) * (after.length > 0 ? productOf(after, known) : 1);
}

function one(part: Part, known: Known): number {
  switch (part.kind) {
    case 'number':
      return Number(part.text);
    case 'sign':
      if (!(part.name in known)) throw new Error(`${part.name} has no value`);
      return known[part.name];
    case 'power':
      return one(part.base, known) ** one(part.exponent, known);
    case 'fraction':
      return one(part.over, known) / one(part.under, known);
    case 'root':
      return Math.sqrt(one(part.of, known));
    case 'brackets': {
      const inside = one(part.inside, known);
      return part.open === '|' ? Math.abs(inside) : inside;
    }
    case 'row':
      return sum(part.parts, known);
    default:
      throw new Error(`${part.kind} cannot be worked out`);
  }
}
