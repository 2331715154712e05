/** An equation as MathML, which browsers set by themselves. */
import { escaped } from '../help/html';
import { inLine, type Part, type QuantitySign } from './equation';
import { readEquation } from './read';

export const asMathML = (equation: string): string =>
  `<math display="block" alttext="${escaped(inLine(equation))}">${drawn(readEquation(equation))}</math>`;

/** The same within a line of text, for one sign. */
export const signAsMathML = (sign: string): string => `<math>${drawn(readEquation(sign))}</math>`;

const applied = '<mo>&#x2061;</mo>';
const thinSpace = '<mspace width="0.17em"/>';

function drawn(part: Part): string {
  switch (part.kind) {
    case 'number':
      return `<mn>${part.text}</mn>`;
    case 'operator':
      return `<mo>${escaped(part.text)}</mo>`;
    case 'word':
      return upright(part.text);
    case 'function':
      return `<mrow><mi>${part.text}</mi>${applied}</mrow>`;
    case 'sign':
      return quantity(part);
    case 'power':
      return `<msup>${drawn(part.base)}${drawn(part.exponent)}</msup>`;
    case 'fraction':
      return `<mfrac>${drawn(part.over)}${drawn(part.under)}</mfrac>`;
    case 'root':
      return `<msqrt>${drawn(part.of)}</msqrt>`;
    case 'sum': {
      const sign = `<mo>${part.text}</mo>`;
      return part.index ? `<munder>${sign}${drawn(part.index)}</munder>` : sign;
    }
    case 'brackets':
      return `<mrow>${fence(part.open, 'prefix')}${drawn(part.inside)}${fence(part.close, 'postfix')}</mrow>`;
    case 'row':
      return `<mrow>${part.parts.map((one, place) => `${isSetApart(part.parts, place) ? thinSpace : ''}${drawn(one)}`).join('')}</mrow>`;
  }
}

const fence = (sign: string, form: string): string =>
  `<mo fence="true" stretchy="true" form="${form}">${sign}</mo>`;

/** One letter would be slanted. */
const upright = (text: string): string =>
  [...text].length === 1
    ? `<mi mathvariant="normal">${escaped(text)}</mi>`
    : text.includes(' ')
      ? `<mtext>${escaped(text)}</mtext>`
      : `<mi>${escaped(text)}</mi>`;

function quantity({ letter, isChange, below, mark, of }: QuantitySign): string {
  const base = `<mi>${escaped(letter)}</mi>`;
  const sign =
    below && mark
      ? `<msubsup>${base}${drawn(below)}<mo>${mark}</mo></msubsup>`
      : below
        ? `<msub>${base}${drawn(below)}</msub>`
        : mark
          ? `<msup>${base}<mo>${mark}</mo></msup>`
          : base;
  if (!isChange && of === undefined) return sign;
  const change = isChange ? upright('Δ') : '';
  const species =
    of === undefined ? '' : `${fence('(', 'prefix')}<mtext>${escaped(of)}</mtext>${fence(')', 'postfix')}`;
  return `<mrow>${change}${sign}${species}</mrow>`;
}

/** Functions and fractions read better with a little room; operators bring their own. */
function isSetApart(parts: readonly Part[], place: number): boolean {
  if (place === 0) return false;
  const [before, here] = [parts[place - 1].kind, parts[place].kind];
  if (before === 'function') return here !== 'brackets';
  if (before === 'operator' || before === 'sum' || here === 'operator') return false;
  return here === 'function' || here === 'fraction' || before === 'fraction';
}
