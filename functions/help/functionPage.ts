/** The help page of one function, from its definition alone. */
import { functionNamed } from '../catalogue';
import { signature, typedName, type CellFunction } from '../define';
import { argumentFacts, argumentHeadings, asRead } from '../documented';
import { equationSection } from './equations';
import { exampleSection } from './exampleSheet';
import { figure } from './figure';
import { escaped, page, table } from './html';
import type { Picture } from './pictures/picture';
import { refusalSection } from './refusals';

export function functionPage(f: CellFunction, pictures: readonly Picture[]): string {
  const body = article(f, {
    linkTo: (name) => `${name}.html`,
    level: 1,
    pictures: pictures.filter(({ functions }) => functions.includes(f.name)),
  });
  return page(`${typedName(f)} – Flaskpace`, body);
}

interface Surroundings {
  /** Where a function's part of a page, or its page, is found. */
  readonly linkTo: (name: string) => string;
  /** Of its heading. */
  readonly level: number;
  readonly pictures: readonly Picture[];
}

/** All that is said of a function. */
export function article(f: CellFunction, { linkTo, level, pictures }: Surroundings): string {
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
    ...pictures.map((picture) => figure(picture, level + 1)),
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
  const unit = result.unit === '1' ? 'a pure number' : `unit: ${asRead(result.unit)}`;
  const detail =
    'detail' in parameters
      ? '; with detail TRUE a row for each number: value, standard uncertainty, lower and upper 95 % limit, degrees of freedom'
      : '';
  return `${shapes[result.shape]}; ${unit}${detail}.`;
}

function neighbours({ seeAlso }: CellFunction, linkTo: Surroundings['linkTo']): string {
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
