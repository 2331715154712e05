/** The help page of one function, from its definition alone. */
import { functionNamed } from '../catalogue';
import { signature, typedName, type CellFunction } from '../define';
import { argumentFacts, argumentHeadings } from '../documented';
import { equationSection } from './equations';
import { exampleSection } from './exampleSheet';
import { escaped, page, table } from './html';
import { refusalSection } from './refusals';

export const functionPage = (f: CellFunction): string =>
  page(
    `${typedName(f)} – Flaskpace`,
    article(f, (name) => `${name}.html`),
  );

/** Where a function's part of a page, or its page, is found. */
type LinkTo = (name: string) => string;

/** All that is said of a function. @param level of its heading, 2 where several stand on one page */
export function article(f: CellFunction, linkTo: LinkTo, level = 1): string {
  const [first, second] = [`h${level}`, `h${level + 1}`];
  const heading = (text: string): string => `<${second}>${text}</${second}>`;
  const parts = [
    `<${first} id="${f.name.toLowerCase()}">${typedName(f)}</${first}>`,
    `<p class="lead">${escaped(f.summary)}</p>`,
    `<pre>${escaped(signature(f))}</pre>`,
    f.caution && `<p class="caution"><strong>Take care.</strong> ${escaped(f.caution)}</p>`,
    heading('What you give'),
    argumentTable(f),
    heading('What you get'),
    `<p>${escaped(answerInWords(f))}</p>`,
    heading('How it is worked out'),
    f.equations && equationSection(f.equations),
    `<p>${escaped(f.method)}</p>`,
    heading('How sure it is'),
    `<p>${escaped(f.uncertainty)}</p>`,
    heading('Example'),
    exampleSection(f),
    heading('When it refuses'),
    refusalSection(f),
    heading('See also'),
    neighbours(f, linkTo),
    heading('Source'),
    `<p>${linked(f.reference)}</p>`,
  ];
  return parts.filter(Boolean).join('\n');
}

const argumentTable = ({ parameters }: CellFunction): string =>
  table(
    ['name', ...argumentHeadings],
    Object.entries(parameters).map(([name, parameter]) => [
      `<code>${name}</code>`,
      ...argumentFacts(parameter).map(escaped),
    ]),
  );

const shapes: Readonly<Record<CellFunction['result']['shape'], string>> = {
  'one value': 'One value',
  'as given': 'One value for each cell given, in the same shape',
  column: 'A column that spills below the cell',
  table: 'A table that spills from the cell',
};

function answerInWords({ result, parameters }: CellFunction): string {
  const unit = result.unit === '1' ? 'a pure number' : `unit: ${result.unit}`;
  const detail =
    'detail' in parameters
      ? '; with detail TRUE a row: value, standard uncertainty, lower and upper 95 % limit, degrees of freedom'
      : '';
  return `${shapes[result.shape]}; ${unit}${detail}.`;
}

function neighbours({ seeAlso }: CellFunction, linkTo: LinkTo): string {
  const items = seeAlso.map((name) => {
    const f = functionNamed(name)!;
    return `<li><a href="${linkTo(name.toLowerCase())}">${typedName(f)}</a> ${escaped(f.summary)}</li>`;
  });
  return `<ul class="functions">\n${items.join('\n')}\n</ul>`;
}

/** A DOI leads to its document. */
const linked = (reference: string): string =>
  escaped(reference).replace(
    /doi:(10\.[^\s;,]+)/g,
    (_, doi: string) => `<a href="https://doi.org/${doi}">doi:${doi}</a>`,
  );
