/** Where the parts of a package hold formulas, besides the cells too, and how they are written anew there. */
import { applyEdits, type Edit } from './edits';
import {
  elementsOf,
  localName,
  plainText,
  scanXml,
  tagStart,
  xmlAttribute,
  xmlText,
  type XmlElement,
} from './xml';

/**
 * Elements, by their names without a prefix: of cells, formats, validations, names and tables (ISO/IEC 29500-1,
 * 18), of charts with their extensions (21.2), of sparklines ([MS-XLSX]) and of older controls (29500-4, 19.4).
 */
const elements = /^(?:n?f|formula[12]?|oldFormula|sqref|definedName|(?:calculatedColumn|totalsRow)Formula)$/;

/** Attributes: of pivot tables, shapes, controls, embedded objects, connections and names of linked workbooks. */
const attributes = /^(?:formula|textlink|macro|fmla[A-Z]\w*|linkedCell|listFillRange|link|command|refersTo)$/;

/** A drawing older than the format: seldom well-formed enough to read, its formulas in elements of their own. */
const isOldDrawing = (part: string): boolean => part.endsWith('.vml');
const oldFormulas = /(?<=<(?:[\w.-]+:)?Fmla\w+>)[^<]*/g;

/** The formulas of one element, as the file has them. */
export const formulasOf = (element: Pick<XmlElement, 'name' | 'attributes' | 'text'>): string[] => [
  ...Object.entries(element.attributes)
    .filter(([name]) => attributes.test(name))
    .map(([, text]) => plainText(text)),
  ...(elements.test(element.name) ? [plainText(element.text)] : []),
];

export const formulasIn = (xml: string, part: string): string[] =>
  isOldDrawing(part) ? (xml.match(oldFormulas) ?? []) : elementsOf(xml, part).flatMap(formulasOf);

/** The part with its formulas written anew; those that stay the same, and all between them, stay to the letter. */
export function rewriteFormulas(xml: string, part: string, rewrite: (formula: string) => string): string {
  if (isOldDrawing(part)) return xml.replace(oldFormulas, rewrite);
  const edits: Edit[] = [];
  let start = -1;
  let text = '';
  scanXml(xml, part, {
    open(tag, end) {
      start = elements.test(localName(tag.name)) ? end : -1;
      text = '';
      if (!Object.keys(tag.attributes).some((name) => attributes.test(name))) return;
      edits.push(
        ...attributeEdits(xml.slice(tagStart(xml, end), end), tagStart(xml, end), tag.attributes, rewrite),
      );
    },
    text: (more) => void (text += more),
    close(_tag, end) {
      if (start >= 0) {
        const before = plainText(text);
        const after = rewrite(before);
        if (after !== before) edits.push({ start, end: tagStart(xml, end), text: xmlText(after) });
      }
      start = -1;
    },
  });
  return applyEdits(xml, edits);
}

function attributeEdits(
  tag: string,
  at: number,
  values: Readonly<Record<string, string>>,
  rewrite: (formula: string) => string,
): Edit[] {
  return [...tag.matchAll(/\s([\w.:-]+)\s*=\s*(?:"[^"]*"|'[^']*')/g)].flatMap(([whole, name], n, all) => {
    if (!attributes.test(name)) return [];
    const before = plainText(values[name]);
    const after = rewrite(before);
    const start = at + all[n].index;
    const edit = { start, end: start + whole.length, text: ` ${name}="${xmlAttribute(after)}"` };
    return after === before ? [] : [edit];
  });
}
