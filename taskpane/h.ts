/** Elements from plain calls: `h('p', { className: 'hint' }, 'words')`. */

export type Child = Node | string | null | undefined | false;
type Handler = (event: Event) => void;
type Attribute = string | number | boolean | null | undefined | Handler;
export type Attributes = Readonly<Record<string, Attribute>>;

/**
 * An HTML element. `on…` is a handler, `className`, `value` and `checked` are properties, `true` is an
 * attribute without a value, `false` and `null` leave one out; all else is an attribute as it stands.
 */
export function h<K extends keyof HTMLElementTagNameMap>(
  tag: K,
  attributes: Attributes = {},
  ...children: readonly Child[]
): HTMLElementTagNameMap[K] {
  return furnish(document.createElement(tag), attributes, children);
}

/** The same for a drawing. */
export function svg<K extends keyof SVGElementTagNameMap>(
  tag: K,
  attributes: Attributes = {},
  ...children: readonly Child[]
): SVGElementTagNameMap[K] {
  return furnish(document.createElementNS('http://www.w3.org/2000/svg', tag), attributes, children);
}

const properties = new Set(['className', 'value', 'checked', 'selected']);

function furnish<E extends Element>(element: E, attributes: Attributes, children: readonly Child[]): E {
  for (const [name, value] of Object.entries(attributes)) {
    if (value === null || value === undefined || value === false) continue;
    if (typeof value === 'function') Object.assign(element, { [name]: value });
    else if (properties.has(name) && element instanceof HTMLElement)
      Object.assign(element, { [name]: value });
    else element.setAttribute(name, value === true ? '' : String(value));
  }
  element.append(...children.filter((child): child is Node | string => !!child || child === ''));
  return element;
}
