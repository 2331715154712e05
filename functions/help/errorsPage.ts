/** What any function may say, and what helps. */
import type { Refusal } from '../define';
import { page, table } from './html';
import { refused } from '../refusals';
import { refusalRow } from './refusals';

export const anyRefusals: readonly Refusal[] = [
  { formula: '=PACE.TANGENT({0;1;2},{0;1},1)', mend: 'Choose both columns with the same rows.' },
  {
    formula: '=PACE.TANGENT({0,1;2,3},{0,1;4,9},1)',
    mend: 'Choose one column, or one row, for each argument.',
  },
  {
    formula: '=PACE.TANGENT({0;1;2},{"a";"b";"c"},1)',
    mend: 'Numbers are missing: does the range begin in the right column?',
  },
  {
    formula: '=PACE.TANGENT({0;1;2},{0;"1,000";4},1)',
    mend: 'Type the number anew as a number, not as text. Its comma could mean thousands or decimals.',
  },
  {
    formula: '=PACE.COEFFICIENT({0;10;20},{8;4;2},"first")',
    mend: 'Give a number, or point at a cell that holds one.',
  },
  {
    formula: '=PACE.COEFFICIENT({0;10;20},{8;4;2})',
    mend: 'Give the argument that is named; brackets in the help mark those you may leave out.',
  },
  { formula: '=PACE.COEFFICIENT({0;10;20},{8;4;2},{1;2})', mend: 'Point at one cell.' },
  {
    formula: '=PACE.COEFFICIENT({0;10;20},{8;4;2},1,"none")',
    mend: 'Give the reading at infinite time, or "free" to have it fitted, or leave it out for 0.',
  },
  {
    formula: '=PACE.COEFFICIENT({0;10;20},{8;4;2},1,,{0.1;0.1})',
    mend: 'Give one standard uncertainty for each reading.',
  },
  { formula: '=PACE.COEFFICIENT({5;5;5},{8;4;2},1)', mend: 'Check the column of times: all are the same.' },
  {
    formula: '=PACE.GASVOLUME(20,"21 degrees",101)',
    mend: 'Write the unit as degC (or °C), K, kPa, mmHg, mL, L, mol/L and so on.',
  },
  { formula: '=PACE.GASVOLUME(20,"-300 degC",101)', mend: 'Check the number and its unit.' },
  {
    formula: '=PACE.BETWEEN({0;10;20},{1;0.6;0.4},0,20,0)',
    mend: 'Give −1 for a reactant, +1 for a product, or leave it out.',
  },
  {
    formula: '=PACE.TANGENT({0;1;2},{0;#DIV/0!;4},1)',
    mend: 'An error in a range comes back as it is: mend that cell first. Conversions keep it in its place.',
  },
];

export function errorsPage(): string {
  const rows = anyRefusals.map(refused).map(refusalRow);
  const body = [
    '<h1>When a cell shows an error</h1>',
    '<p class="lead">A function says what is wrong instead of guessing. Rest the pointer on the cell’s mark to read its words.</p>',
    '<dl class="where">',
    '<dt><code>#VALUE!</code></dt><dd>The call can be mended. The words say the rule, where it broke and the value seen.</dd>',
    '<dt><code>#N/A</code></dt><dd>The call is sound, but the data cannot tell. The words say why; more or other readings may help.</dd>',
    '<dt><code>#BUSY!</code></dt><dd>It is still being worked out.</dd>',
    '<dt><code>#SPILL!</code></dt><dd>The answer needs more cells than are empty: clear those beside or below.</dd>',
    '<dt><code>#NAME?</code></dt><dd>The add-in is not loaded, or the name is misspelt.</dd>',
    '</dl>',
    '<h2>What any function may say</h2>',
    table(['the cell says', 'what helps'], rows),
    '<p>What one function alone says stands on its own page.</p>',
  ];
  return page('Flaskpace: when a cell shows an error', body.join('\n'));
}
