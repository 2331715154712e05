/**
 * What the statistics are worth, by simulation: `npm run simulate` writes docs/simulations.md anew, which takes
 * a while; `npm run simulate -- 200` tries with fewer runs and prints.
 */
import { mkdirSync, writeFileSync } from 'node:fs';
import { coverageTable } from './coverage';
import { verdictTable } from './verdicts';
import { windowTable } from './windows';

const seed = 20260302;
const asked = process.argv[2];
const runs = asked === undefined ? 10_000 : Number(asked);
if (!(Number.isInteger(runs) && runs >= 10)) {
  console.error(`runs must be a whole number, 10 or more: got ${asked}`);
  process.exit(2);
}

const text = `# What the statistics are worth

By simulation with made-up runs, seed ${seed}: \`npm run simulate\` makes these tables anew.

## 95 % limits

${coverageTable(runs, seed)}

## Verdict on the order

${verdictTable(runs, seed)}

## Default window of a tangent

${windowTable(Math.max(10, Math.round(runs / 20)), seed)}
`;

if (asked === undefined) {
  mkdirSync('docs', { recursive: true });
  writeFileSync('docs/simulations.md', text);
  console.log('wrote docs/simulations.md');
} else {
  console.log(text);
}
