/** The reference of all functions in docs/functions.md, worked out from the definitions. */
import { isRange, type CellResult } from './cell';
import { signature, typedName, type CellFunction, type Equations } from './define';
import { argumentFacts, argumentHeadings, asRead, exampleCell } from './documented';
import { asLatex } from './equation/latex';
import { byFamily } from './readmeTable';

/** Everything a definition says, one part a function. */
export function referencePage(catalogue: readonly CellFunction[]): string {
  const parts = byFamily(catalogue).flatMap(([heading, functions]) => [
    `## ${heading}`,
    ...functions.map(part),
  ]);
  return `${[title, ...parts].join('\n\n')}\n`;
}

const title = `# The functions, one by one

Worked out from their definitions; what they have in common stands in the [README](../README.md#the-functions).`;

function part(f: CellFunction): string {
  return [
    `### ${typedName(f)}`,
    f.summary,
    `\`${signature(f)}\` in ${f.result.unit === '1' ? 'pure numbers' : asRead(f.result.unit)}`,
    parameterTable(f),
    ...(f.equations ? [typeset(f.equations), quantities(f.equations)] : []),
    `**How.** ${f.method}`,
    `**How sure.** ${f.uncertainty}`,
    `**Example.** \`${f.example.formula}\` shows ${shown(f.example.equals)}`,
    ...(f.caution === undefined ? [] : [`**Take care.** ${f.caution}`]),
    `**See also.** ${f.seeAlso.map((name) => `[${typedName({ name })}](#pace${name.toLowerCase()})`).join(', ')}`,
    `**Source.** ${f.reference}`,
  ].join('\n\n');
}

const typeset = ({ lines }: Equations): string =>
  lines.map((line) => `\`\`\`math\n${asLatex(line)}\n\`\`\``).join('\n\n');

const quantities = ({ where }: Equations): string =>
  Object.entries(where)
    .map(([sign, meaning]) => `\`${sign}\` ${meaning}`)
    .join('; ');

const parameterTable = ({ parameters }: CellFunction): string =>
  [
    ['argument', ...argumentHeadings],
    ['argument', ...argumentHeadings].map(() => '---'),
    ...Object.entries(parameters).map(([name, parameter]) => [
      `\`${name}\``,
      ...argumentFacts(parameter).map((fact) => fact.replaceAll('|', '\\|')),
    ]),
  ]
    .map((cells, row) => (row === 1 ? `|${cells.join('|')}|` : `| ${cells.join(' | ')} |`))
    .join('\n');

/** Rows with ; between them and cells with , as in a formula; tables by their first row alone. */
function shown(result: CellResult): string {
  if (!isRange(result)) return `\`${exampleCell(result)}\``;
  const rows = result.map((row) => row.map(exampleCell).join(', '));
  const isTable = typeof result[0][0] === 'string';
  return isTable
    ? `a table with the headings of its first row, ${rows.length} rows`
    : `\`${rows.join('; ')}\``;
}
