/** The table of functions in the README, worked out from the definitions. */
import { typedName, type CellFunction, type Family } from './define';

const families: Readonly<Record<Family, string>> = {
  reading: 'From reading to amount',
  rate: 'Rate',
  order: 'Order, rate coefficient, half life',
  temperature: 'Temperature and prediction',
  mechanism: 'Mechanism and planning',
  care: 'Care',
};

/** As argument help shows it: `PACE.EVENT(times, [change], [coefficient])`. */
export function signature(f: CellFunction): string {
  const parameters = Object.entries(f.parameters).map(([name, { optional }]) =>
    optional ? `[${name}]` : name,
  );
  return `${typedName(f)}(${parameters.join(', ')})`;
}

/** One part a family, one row a function. */
export function readmeTable(catalogue: readonly CellFunction[]): string {
  return (Object.keys(families) as Family[])
    .map((family) => [family, catalogue.filter((f) => f.family === family)] as const)
    .filter(([, functions]) => functions.length > 0)
    .map(([family, functions]) => [`### ${families[family]}`, '', ...table(functions)].join('\n'))
    .join('\n\n');
}

const table = (functions: readonly CellFunction[]): string[] => [
  '| function | answers | unit |',
  '|---|---|---|',
  ...functions.map((f) => `| \`${signature(f)}\` | ${f.summary} | ${f.result.unit} |`),
];
