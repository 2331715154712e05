/** A drawing before anything draws it: the pane makes elements of it, the help pages text. */
export interface Shape {
  readonly tag: string;
  readonly attributes: Readonly<Record<string, string | number>>;
  readonly children: readonly (Shape | string)[];
}

export const shape = (
  tag: string,
  attributes: Shape['attributes'],
  ...children: Shape['children']
): Shape => ({ tag, attributes, children });

const entities: Readonly<Record<string, string>> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;' };
const escaped = (text: string): string => text.replace(/[&<>"]/g, (sign) => entities[sign]);

/** As SVG. */
export function asText({ tag, attributes, children }: Shape): string {
  const written = Object.entries(attributes).map(([name, value]) => ` ${name}="${escaped(String(value))}"`);
  const inside = children.map((child) => (typeof child === 'string' ? escaped(child) : asText(child)));
  return `<${tag}${written.join('')}>${inside.join('')}</${tag}>`;
}
