/** The table of functions in the README, worked out from the definitions. */
import { asRead } from './documented';
import { signature, type CellFunction, type Family } from './define';

const families: Readonly<Record<Family, string>> = {
  reading: 'From reading to amount',
  rate: 'Rate',
  order: 'Order, rate coefficient, half life',
  temperature: 'Temperature and prediction',
  mechanism: 'Mechanism and planning',
  care: 'Care',
};

/** The families that have functions, in the order of the work, with their headings. */
export const byFamily = (
  catalogue: readonly CellFunction[],
): [heading: string, functions: CellFunction[]][] =>
  (Object.keys(families) as Family[])
    .map((family): [string, CellFunction[]] => [
      families[family],
      catalogue.filter((f) => f.family === family),
    ])
    .filter(([, functions]) => functions.length > 0);

/** One part a family, one row a function. */
export const readmeTable = (catalogue: readonly CellFunction[]): string =>
  byFamily(catalogue)
    .map(([heading, functions]) => [`### ${heading}`, '', ...table(functions)].join('\n'))
    .join('\n\n');

const table = (functions: readonly CellFunction[]): string[] => [
  '| function | answers | unit |',
  '|---|---|---|',
  ...functions.map((f) => `| \`${signature(f)}\` | ${f.summary} | ${asRead(f.result.unit)} |`),
];
