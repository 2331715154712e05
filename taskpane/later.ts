/** Parts of a view that are drawn only where what they rest on is another than on the page. */
import type { Child } from './h';

interface Part {
  readonly on: readonly unknown[];
  /** Gone once it is drawn. */
  readonly draw?: () => readonly Child[];
}

const parts = new WeakMap<Element, Part>();

/**
 * Puts off an element's further children. Their handlers must rest on nothing but `on` either.
 *
 * @param on what the children show: the same things, the same children
 */
export function later<E extends Element>(
  element: E,
  on: readonly unknown[],
  draw: () => readonly Child[],
): E {
  element.setAttribute('data-later', '');
  parts.set(element, { on, draw });
  return element;
}

/** Draws what was put off of the element's own children; what is put off below them stays so. */
export function withChildren<E extends Element>(element: E): E {
  const { on, draw } = parts.get(element) ?? {};
  if (on && draw) {
    parts.set(element, { on });
    element.append(...draw().filter((child): child is Node | string => !!child));
  }
  return element;
}

/** Draws all that was put off, in the element and below it: it comes new to the page. */
export function drawn<E extends Element>(element: E): E {
  withChildren(element)
    .querySelectorAll('[data-later]')
    .forEach((below) => parts.get(below)?.draw && drawn(below));
  return element;
}

/** @returns whether the children on the page show what the next would; remembers what they show from now on */
export function showsTheSame(current: Element, next: Element): boolean {
  const [now, wanted] = [parts.get(current), parts.get(next)];
  if (!wanted) {
    parts.delete(current);
    return false;
  }
  parts.set(current, { on: wanted.on });
  return !!now && now.on.length === wanted.on.length && now.on.every((one, i) => one === wanted.on[i]);
}
