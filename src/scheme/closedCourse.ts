/** Courses that need no integration: simple schemes whose equations have a closed form. */
import { requireCourse } from './course';
import type { Reaction, Scheme } from './scheme';

/** What a scheme is made up of; species are named by their places. */
export type ClosedForm =
  /** One step A → … of first order, or several that compete for A. */
  | { readonly kind: 'first order'; readonly a: number }
  /** A ⇌ B. */
  | { readonly kind: 'reversible'; readonly a: number; readonly b: number }
  /** A → B + …, B → …, each of first order; `gain` is how many B one A gives. */
  | { readonly kind: 'consecutive'; readonly a: number; readonly b: number; readonly gain: number }
  /** 2 A → …, with the rate ka². */
  | { readonly kind: 'one with itself'; readonly a: number }
  /** A + B → …, with the rate kab. */
  | { readonly kind: 'one with another'; readonly a: number; readonly b: number };

/**
 * @returns nothing for a scheme that has to be integrated
 * @example closedFormOf(parseScheme('A -> B -> C'))?.kind // 'consecutive'
 */
export function closedFormOf({ reactions }: Scheme): ClosedForm | undefined {
  const spent = reactions.map(spentAlone);
  const [[first, second], [a, b]] = [reactions, spent];
  if (a !== undefined && spent.every((one) => one === a)) return { kind: 'first order', a };
  if (reactions.length === 1) return ofSecondOrder(first);
  if (reactions.length > 2 || a === undefined || b === undefined) return undefined;
  const [gain, back] = [netOf(first, b), netOf(second, a)];
  if (back === 0) return { kind: 'consecutive', a, b, gain };
  const isExchange = gain === 1 && back === 1 && reactions.every(({ net }) => net.length === 2);
  return isExchange ? { kind: 'reversible', a, b } : undefined;
}

const netOf = ({ net }: Reaction, place: number): number =>
  net.find(({ species }) => species === place)?.number ?? 0;

/** The species whose one particle a step takes and needs nothing else. */
function spentAlone(reaction: Reaction): number | undefined {
  const [only, ...others] = reaction.left;
  const isAlone = only?.number === 1 && others.length === 0 && netOf(reaction, only.species) === -1;
  return isAlone ? only.species : undefined;
}

function ofSecondOrder(reaction: Reaction): ClosedForm | undefined {
  const { left } = reaction;
  if (!left.every(({ species, number }) => netOf(reaction, species) === -number)) return undefined;
  const [one, another] = left;
  if (left.length === 1 && one.number === 2) return { kind: 'one with itself', a: one.species };
  if (left.length === 2 && one.number === 1 && another.number === 1)
    return { kind: 'one with another', a: one.species, b: another.species };
  return undefined;
}

/**
 * The course of such a scheme; arguments and rows are those of {@link courseOf}.
 *
 * @returns nothing for a scheme that has to be integrated
 * @throws InvalidInput where something is missing or out of range
 * @see K. J. Laidler, Chemical Kinetics, 3rd ed. (1987), 2.2 and 8.3 (from memory); each is a solution of the
 *   scheme's equations by substitution
 * @example closedCourseOf(parseScheme('A -> B'), [Math.LN2], [1, 0], [1])?.[0] // Float64Array [0.5, 0.5]
 */
export function closedCourseOf(
  scheme: Scheme,
  coefficients: ArrayLike<number>,
  initial: ArrayLike<number>,
  times: ArrayLike<number>,
): Float64Array[] | undefined {
  const form = closedFormOf(scheme);
  if (!form) return undefined;
  requireCourse(scheme, coefficients, initial, times);
  return Array.from(times, (time) => {
    const { extents, a, b } = advanceOf(form, coefficients, initial, time);
    const concentrations = Float64Array.from(initial);
    extents.forEach((extent, step) =>
      scheme.reactions[step].net.forEach(
        ({ species, number }) => (concentrations[species] += number * extent),
      ),
    );
    // what is left of much keeps its digits only where nothing was taken away
    concentrations[form.a] = a;
    if ('b' in form) concentrations[form.b] = b!;
    return concentrations;
  });
}

interface Advance {
  /** How far each step has gone, ∫v dt; of a reversible one the net way, as its forward direction. */
  readonly extents: readonly number[];
  /** Concentrations. */
  readonly a: number;
  readonly b?: number;
}

function advanceOf(
  form: ClosedForm,
  k: ArrayLike<number>,
  initial: ArrayLike<number>,
  time: number,
): Advance {
  const a = initial[form.a];
  switch (form.kind) {
    case 'first order': {
      const all = Array.from(k).reduce((sum, one) => sum + one, 0);
      const reached = a * slowed(all, time);
      return { extents: Array.from(k, (one) => one * reached), a: a * Math.exp(-all * time) };
    }
    case 'reversible': {
      const b = initial[form.b];
      const [reached, left] = [slowed(k[0] + k[1], time), Math.exp(-(k[0] + k[1]) * time)];
      return {
        extents: [(k[0] * a - k[1] * b) * reached],
        a: a * left + k[1] * (a + b) * reached,
        b: b * left + k[0] * (a + b) * reached,
      };
    }
    case 'consecutive': {
      const [b, gained] = [initial[form.b], form.gain * k[0] * a];
      return {
        extents: [
          k[0] * a * slowed(k[0], time),
          k[1] * b * slowed(k[1], time) + k[1] * gained * slowedTwice(k[0], k[1], time),
        ],
        a: a * Math.exp(-k[0] * time),
        b: b * Math.exp(-k[1] * time) + gained * between(k[0], k[1], time),
      };
    }
    case 'one with itself': {
      const slowing = 1 + 2 * k[0] * a * time;
      return { extents: [(k[0] * a * a * time) / slowing], a: a / slowing };
    }
    case 'one with another': {
      const b = initial[form.b];
      const [less, more] = [Math.min(a, b), Math.max(a, b)];
      const pace = k[0] * less * slowed(k[0] * (more - less), time);
      const left = (less * Math.exp(-k[0] * (more - less) * time)) / (1 + pace);
      return { extents: [(more * pace) / (1 + pace)], a: left + a - less, b: left + b - less };
    }
  }
}

/** (1 − exp(−λt))/λ: the time that counts where things slow down with λ. */
const slowed = (rate: number, time: number): number => (rate === 0 ? time : -Math.expm1(-rate * time) / rate);

/** ∫ exp(−λu − μ(t − u)) du over 0 < u < t: what stands between two steps, in whichever order. */
function between(one: number, other: number, time: number): number {
  const [less, more] = [Math.min(one, other), Math.max(one, other)];
  return Math.exp(-less * time) * slowed(more - less, time);
}

/** The integral of that: what is past both. Early on it is the rest of larger numbers, and a series keeps its digits. */
function slowedTwice(one: number, other: number, time: number): number {
  const [less, more] = [Math.min(one, other), Math.max(one, other)];
  if (more * time < 1) return time * time * earlyShare(-less * time, -more * time);
  return (slowed(less, time) - between(less, more, time)) / more;
}

/** ∑ₘ ∑ⱼ xʲyᵐ⁻ʲ/(m + 2)!, for x and y from −1 to 0. */
function earlyShare(x: number, y: number): number {
  let [sum, products, power, factorial] = [0, 1, 1, 2];
  for (let m = 0; m < 20; m++) {
    sum += products / factorial;
    power *= y;
    products = products * x + power;
    factorial *= m + 3;
  }
  return sum;
}
