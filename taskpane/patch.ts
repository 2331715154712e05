import { drawn, showsTheSame, withChildren } from './later';

/**
 * Makes the page look like a freshly drawn view while keeping the elements that stay: focus, caret,
 * scroll and live regions survive a redraw. What stands in an element marked `data-kept` is its own.
 */
export function patch(current: Element, next: Element): void {
  patchAttributes(current, next);
  patchHandlers(current, next);
  if (!next.hasAttribute('data-kept') && !showsTheSame(current, next))
    patchChildren(current, withChildren(next));
  patchProperties(current, next);
}

function patchAttributes(current: Element, next: Element): void {
  for (const { name } of [...current.attributes]) {
    const staysOpen = name === 'open' && current instanceof HTMLDetailsElement; // as the person left it
    if (!next.hasAttribute(name) && !staysOpen) current.removeAttribute(name);
  }
  for (const { name, value } of [...next.attributes]) {
    if (current.getAttribute(name) !== value) current.setAttribute(name, value);
  }
}

const handlers = [
  'onclick',
  'oninput',
  'onchange',
  'onkeydown',
  'onfocus',
  'onmouseenter',
  'onsubmit',
  'ontoggle',
] as const;

function patchHandlers(current: Element, next: Element): void {
  if (!(current instanceof HTMLElement && next instanceof HTMLElement)) return;
  for (const handler of handlers) {
    const wanted = next[handler];
    if (current[handler] !== wanted) Object.assign(current, { [handler]: wanted });
  }
}

function patchChildren(current: Element, next: Element): void {
  const wanted = [...next.childNodes];
  wanted.forEach((node, place) => {
    const old = current.childNodes[place];
    if (!old) current.append(ready(node));
    else if (old instanceof Element && node instanceof Element && isSame(old, node)) patch(old, node);
    else if (old.nodeType === Node.TEXT_NODE && node.nodeType === Node.TEXT_NODE) {
      if (old.nodeValue !== node.nodeValue) old.nodeValue = node.nodeValue;
    } else old.replaceWith(ready(node));
  });
  while (current.childNodes.length > wanted.length) current.lastChild!.remove();
}

const ready = (node: ChildNode): ChildNode => (node instanceof Element ? drawn(node) : node);

/** Two elements with different ids are different things, however alike. */
const isSame = (a: Element, b: Element): boolean => a.tagName === b.tagName && a.id === b.id;

/** What is typed or ticked is a property, not an attribute. */
function patchProperties(current: Element, next: Element): void {
  if (current instanceof HTMLInputElement && next instanceof HTMLInputElement) {
    if (current.value !== next.value) current.value = next.value;
    current.checked = next.checked;
  } else if (current instanceof HTMLSelectElement && next instanceof HTMLSelectElement) {
    // the options have moved over, and their choice with them: ask the wanted one by its value
    const chosen = next.getAttribute('data-chosen');
    if (chosen !== null && current.value !== chosen) current.value = chosen;
  }
}
