/** Which rate, what it is, and the formula that gives it. */
import type { Actions } from '../actions';
import type { Estimate } from '../calls/estimate';
import { rateFormula, resolved, type RateAnswer } from '../calls/rate';
import type { RateChoice, RateKind } from '../choices';
import { plainNumber, valueWithUncertainty } from '../../functions/format';
import { h, type Child } from '../h';
import { rateUnit } from '../headers';
import { rateName } from '../insertions/rate';
import { overlayFor } from '../plots/overlay';
import { plainPlot, ratesPlot, runPlot } from '../plots/runPlot';
import { columnOf, headingOf, pointsOf, type Run, type Table } from '../runs';
import type { Scene } from '../scene';
import { estimateLines, result, valueLines } from './estimate';
import { choiceOfOne, step, textField } from './fields';
import { formulaLine } from './formulaLine';

const kinds: readonly (readonly [RateKind, string])[] = [
  ['average', 'Average'],
  ['tangent', 'Tangent'],
  ['column', 'Whole column'],
];

export function rateStep(
  { state: { table, run, rate, put, pointedAt }, rate: answer }: Scene,
  actions: Actions,
): HTMLElement {
  if (!table || !run || !answer)
    return step('rate', 'Rate', h('p', { className: 'hint' }, 'Choose a run first.'));
  const unit = rateUnit(headingOf(table, run.readingColumn), headingOf(table, run.timeColumn));
  const pointing = { sheet: table.sheet, pointedAt };
  return step(
    'rate',
    'Rate',
    choiceOfOne('kind', 'Which rate', kinds, rate.kind, (kind) => void actions.changeRate({ kind })),
    fieldsFor(table, run, rate, answer, actions),
    ...drawing(table, run, resolved(rate, pointing), answer, unit),
    result(...inWords(table, run, rate, answer, unit)),
    h('p', { className: 'hint' }, scaleCaution),
    formulaLine(
      { formula: rateFormula(table, run, rate, pointing, put.withDetail), sheet: table.sheet },
      actions,
    ),
  );
}

function fieldsFor(
  table: Table,
  run: Run,
  rate: RateChoice,
  answer: RateAnswer,
  actions: Actions,
): HTMLElement {
  const { unit } = headingOf(table, run.timeColumn);
  const wrong = answer.kind === 'refused' ? answer : null;
  const field = (
    name: Exclude<keyof RateChoice, 'kind'>,
    label: string,
    more: { unit?: string; whenEmpty?: string } = {},
  ): HTMLElement =>
    textField({
      id: `rate-${name}`,
      label,
      value: rate[name],
      problem: wrong?.field === name ? wrong.words : null,
      numeric: false,
      onInput: (typed) => void actions.changeRate({ [name]: typed }),
      onPoint: () => void actions.pointAt('cell', (cell) => actions.changeRate({ [name]: cell })),
      ...more,
    });
  const window = [
    field('points', 'Readings used', { whenEmpty: 'chosen' }),
    field('degree', 'Degree', { whenEmpty: '2' }),
  ];
  const sign = field('coefficient', 'Stoichiometric number', { whenEmpty: '±1' });
  const main: readonly HTMLElement[] = {
    average: () => [field('from', 'From', { unit }), field('to', 'To', { unit })],
    tangent: () => [field('time', 'At time', { unit })],
    column: () => [],
  }[rate.kind]();
  const more = rate.kind === 'average' ? [sign] : [...window, sign];
  const isOpen = more.some((element) => element.querySelector('.problem'));
  return h(
    'div',
    { id: `fields-${rate.kind}` },
    main.length > 0 && h('div', { className: 'pair' }, ...main),
    h(
      'details',
      { open: isOpen },
      h('summary', {}, 'How it is worked out'),
      h('p', { className: 'hint' }, howItIsDone[rate.kind]),
      h('div', { className: 'pair' }, ...more),
    ),
  );
}

/** Heat goes with volume, cooling with surface. */
const scaleCaution =
  'A rate read on a few millilitres says nothing about how heat gets out of a large vessel.';

const howItIsDone: Readonly<Record<RateKind, string>> = {
  average:
    'Change between two times over the time it took; between readings, straight lines. The stoichiometric number is −1 for a reactant, +1 for a product; left empty, its sign follows the run.',
  tangent:
    'Slope, at this time, of the least-squares polynomial through the nearest readings. Left empty, their number is chosen from the data. The stoichiometric number is −1 for a reactant, +1 for a product; left empty, its sign follows the run.',
  column:
    'The tangent at every reading. Left empty, the number of readings used is chosen from the data. The stoichiometric number is −1 for a reactant, +1 for a product; left empty, its sign follows the run.',
};

function drawing(table: Table, run: Run, rate: RateChoice, answer: RateAnswer, unit: string): Child[] {
  if (answer.kind === 'refused') return [plainPlot(table, run)];
  const points = pointsOf(table, run);
  const time = headingOf(table, run.timeColumn);
  const reading = headingOf(table, run.readingColumn);
  if (answer.kind === 'one') {
    const says = `${rateName(table, run, rate)}: ${plainNumber(answer.rate.value)} ${unit}`;
    return [runPlot({ points, time, reading, overlay: overlayFor(points, rate), says })];
  }
  const rows = ratesByTime(table, run, answer.rates);
  const ascending = rows.map(({ time: x, rate: { value } }) => ({ x, y: value })).sort((a, b) => a.x - b.x);
  return [runPlot({ points, time, reading }), ratesPlot(ascending, time, unit)];
}

/** Rates beside the times they belong to. */
function ratesByTime(
  table: Table,
  run: Run,
  rates: readonly (Estimate | null)[],
): { time: number; rate: Estimate }[] {
  const times = columnOf(table, run.timeColumn, run);
  return rates.flatMap((rate, row) => {
    const time = times[row]?.[0];
    return rate && typeof time === 'number' ? [{ time, rate }] : [];
  });
}

function inWords(table: Table, run: Run, rate: RateChoice, answer: RateAnswer, unit: string): Child[] {
  switch (answer.kind) {
    case 'refused':
      return [
        answer.field === null
          ? h('p', { className: 'problem' }, answer.words)
          : h('p', { className: 'hint' }, 'No rate yet: see the field marked above.'),
      ];
    case 'one':
      return estimateLines(rateName(table, run, rate), answer.rate, unit);
    case 'column':
      return columnInWords(table, run, answer.rates, unit);
  }
}

/** A table for those who cannot see the plot; long runs are cut. */
const longestTable = 100;

function columnInWords(table: Table, run: Run, rates: readonly (Estimate | null)[], unit: string): Child[] {
  const rows = ratesByTime(table, run, rates);
  if (rows.length === 0) return [h('p', { className: 'problem' }, 'no reading has a rate')];
  const fastest = rows.reduce((best, row) =>
    Math.abs(row.rate.value) > Math.abs(best.rate.value) ? row : best,
  );
  const time = headingOf(table, run.timeColumn);
  const cut = rows.length > longestTable ? ` (the first ${longestTable} of ${rows.length})` : '';
  return [
    ...valueLines(
      `largest rate, at ${[plainNumber(fastest.time), time.unit].filter(Boolean).join(' ')}`,
      fastest.rate,
      unit,
    ),
    h(
      'details',
      {},
      h('summary', {}, `All ${rows.length} rates${cut}`),
      h(
        'table',
        {},
        h(
          'thead',
          {},
          h('tr', {}, h('th', { scope: 'col' }, time.text), h('th', { scope: 'col' }, `rate (${unit})`)),
        ),
        h(
          'tbody',
          {},
          ...rows
            .slice(0, longestTable)
            .map(({ time: at, rate }) =>
              h(
                'tr',
                {},
                h('td', {}, plainNumber(at)),
                h('td', {}, valueWithUncertainty(rate.value, rate.uncertainty)),
              ),
            ),
        ),
      ),
    ),
  ];
}
