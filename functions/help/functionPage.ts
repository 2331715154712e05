/** The help page of one function, from its definition alone. */
import { isRange, type CellResult } from '../cell';
import { typedName, type CellFunction } from '../define';
import { argumentFacts, argumentHeadings, exampleCell } from '../documented';
import type { Parameter } from '../parameters';
import { signature } from '../readmeTable';
import { escaped, page } from './html';

/** Where a function's page lies, beside the index. */
export const pageName = ({ name }: Pick<CellFunction, 'name'>): string => `${name.toLowerCase()}.html`;

export function functionPage(f: CellFunction): string {
  const parts = [
    '<nav><a href="index.html">All functions</a></nav>',
    `<h1>${typedName(f)}</h1>`,
    `<p>${escaped(f.summary)}</p>`,
    `<pre>${escaped(signature(f))}</pre>`,
    f.caution === undefined ? '' : `<p class="caution"><strong>Take care.</strong> ${escaped(f.caution)}</p>`,
    '<h2>Arguments</h2>',
    argumentTable(f),
    '<h2>Answer</h2>',
    `<p>${escaped(answerInWords(f))}</p>`,
    '<h2>How it is worked out</h2>',
    `<p>${escaped(f.method)}</p>`,
    '<h2>Example</h2>',
    `<pre>${escaped(f.example.formula)}</pre>`,
    shown(f.example.equals),
    '<h2>When it refuses</h2>',
    '<p><code>#VALUE!</code> with words: the call can be mended, and the words say the rule, where it broke and the value seen. <code>#N/A</code> with words: the call is sound, but the data cannot tell. Rest the pointer on the cell’s mark to read them.</p>',
    '<h2>Source</h2>',
    `<p>${linked(f.reference)}</p>`,
  ];
  return page(`${typedName(f)} – Flaskpace`, parts.filter(Boolean).join('\n'));
}

const argumentTable = ({ parameters }: CellFunction): string => `<table>
<thead><tr>${['name', ...argumentHeadings].map((heading) => `<th>${heading}</th>`).join('')}</tr></thead>
<tbody>
${Object.entries(parameters)
  .map(([name, parameter]) => argumentRow(name, parameter))
  .join('\n')}
</tbody>
</table>`;

function argumentRow(name: string, parameter: Parameter): string {
  const cells = [`<code>${name}</code>`, ...argumentFacts(parameter).map(escaped)];
  return `<tr>${cells.map((cell) => `<td>${cell}</td>`).join('')}</tr>`;
}

const shapes: Readonly<Record<CellFunction['result']['shape'], string>> = {
  'one value': 'One value',
  'as given': 'One value for each cell given, in the same shape',
  column: 'A column that spills below the cell',
  table: 'A table that spills from the cell',
};

function answerInWords({ result, parameters }: CellFunction): string {
  const unit = result.unit === '1' ? 'a pure number' : `unit: ${result.unit}`;
  const detail =
    'detail' in parameters ? '; with detail TRUE, a row with its uncertainty and 95 % limits' : '';
  return `${shapes[result.shape]}; ${unit}${detail}.`;
}

function shown(result: CellResult): string {
  const rows = isRange(result) ? result : [[result]];
  const body = rows.map(
    (row) => `<tr>${row.map((cell) => `<td>${escaped(exampleCell(cell))}</td>`).join('')}</tr>`,
  );
  return `<p class="quiet">shows</p>\n<table><tbody>${body.join('')}</tbody></table>`;
}

/** A DOI leads to its document. */
const linked = (reference: string): string =>
  escaped(reference).replace(
    /doi:(10\.[^\s;,]+)/g,
    (_, doi: string) => `<a href="https://doi.org/${doi}">doi:${doi}</a>`,
  );
