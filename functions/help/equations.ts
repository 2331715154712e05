/** The equations of a function, typeset, with what each sign stands for. */
import type { Equations } from '../define';
import { asMathML, signAsMathML } from '../equation/mathml';
import { escaped } from './html';

export function equationSection({ lines, where }: Equations): string {
  const quantities = Object.entries(where).map(
    ([sign, meaning]) => `<dt>${signAsMathML(quotedSpecies(sign))}</dt><dd>${escaped(meaning)}</dd>`,
  );
  return `<div class="equations">\n${lines.map(asMathML).join('\n')}\n</div>\n<dl class="where">\n${quantities.join('\n')}\n</dl>`;
}

/** `c(H⁺)`, as it is named, is written with its quotes. */
const quotedSpecies = (sign: string): string => sign.replace(/\((?=\p{Lu})([^)]*)\)$/u, '("$1")');
