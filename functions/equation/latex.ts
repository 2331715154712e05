/** An equation as LaTeX, which GitHub and most editors set in a Markdown page. */
import type { Part, QuantitySign } from './equation';
import { readEquation } from './read';

const commands: Readonly<Record<string, string>> = {
  α: '\\alpha ',
  β: '\\beta ',
  γ: '\\gamma ',
  δ: '\\delta ',
  Δ: '\\Delta ',
  ε: '\\varepsilon ',
  κ: '\\kappa ',
  ν: '\\nu ',
  ρ: '\\rho ',
  σ: '\\sigma ',
  τ: '\\tau ',
  φ: '\\varphi ',
  '∞': '\\infty ',
  '≈': '\\approx ',
  '·': '\\cdot ',
  '−': '-',
  '→': '\\to ',
  '≥': '\\ge ',
  '≤': '\\le ',
  '±': '\\pm ',
  '⊤': '\\top ',
  '∑': '\\sum ',
  '∏': '\\prod ',
  '∫': '\\int ',
  '*': '\\ast ',
  '‡': '\\ddagger ',
  '½': '1/2',
};
const plain = (text: string): string => commands[text] ?? text;
const braces: Readonly<Record<string, string>> = { '{': '\\{', '}': '\\}' };

/** Words of text mode, where a raised charge needs its own mathematics. */
const upright = (text: string): string =>
  `\\mathrm{${text.replaceAll(' ', '\\ ').replace('⁺', '^+').replace('⁻', '^-')}}`;

export const asLatex = (equation: string): string => drawn(readEquation(equation)).trim();

function drawn(part: Part): string {
  switch (part.kind) {
    case 'number':
    case 'operator':
      return plain(part.text);
    case 'word':
      return upright(part.text);
    case 'function':
      return `\\${part.text} `;
    case 'sign':
      return quantity(part);
    case 'power':
      return `{${drawn(part.base)}}^{${drawn(part.exponent)}}`;
    case 'fraction':
      return `\\frac{${drawn(part.over)}}{${drawn(part.under)}}`;
    case 'root':
      return `\\sqrt{${drawn(part.of)}}`;
    case 'sum':
      return part.index ? `${plain(part.text)}_{${drawn(part.index)}}` : plain(part.text);
    case 'brackets':
      return `\\left${braces[part.open] ?? part.open}${drawn(part.inside)}\\right${braces[part.close] ?? part.close}`;
    case 'row':
      return part.parts.map(drawn).join('');
  }
}

function quantity({ letter, isChange, below, mark, of }: QuantitySign): string {
  const base = [...letter].length > 1 ? upright(letter) : plain(letter);
  const scripts = `${below ? `_{${drawn(below)}}` : ''}${mark ? `^{${plain(mark).trim()}}` : ''}`;
  return `${isChange ? plain('Δ') : ''}${base}${scripts}${of === undefined ? '' : `(${upright(of)})`}`;
}
