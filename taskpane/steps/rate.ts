/** Second step: which rate, what it is, and the formula that gives it. */
import type { Actions } from '../actions';
import { plainNumber, valueWithUncertainty } from '../format';
import { h, type Child } from '../h';
import { rateUnit } from '../headers';
import { rateName } from '../plan';
import { overlayFor } from '../plots/overlay';
import { ratesPlot, runPlot } from '../plots/runPlot';
import { rateFormula, type Answer, type Rate } from '../rateCall';
import { columnOf, headingOf, pointsOf, type Run, type Table } from '../runs';
import type { Scene } from '../scene';
import type { RateChoice, RateKind } from '../store';
import { button, step, textField } from './fields';
import { plainPlot } from './run';

const kinds: readonly (readonly [RateKind, string])[] = [
  ['average', 'Average'],
  ['tangent', 'Tangent'],
  ['column', 'Whole column'],
];

export function rateStep(
  { state: { table, run, rate, put }, rate: answer }: Scene,
  actions: Actions,
): HTMLElement {
  if (!table || !run || !answer)
    return step('rate', '2 Rate', h('p', { className: 'hint' }, 'Choose a run first.'));
  const unit = rateUnit(headingOf(table, run.readingColumn), headingOf(table, run.timeColumn));
  return step(
    'rate',
    '2 Rate',
    kindChoice(rate.kind, actions),
    fieldsFor(table, run, rate, answer, actions),
    ...drawing(table, run, rate, answer, unit),
    h(
      'div',
      { className: 'result', role: 'status', 'aria-atomic': 'true' },
      ...inWords(table, run, rate, answer, unit),
    ),
    formulaLine(rateFormula(table, run, rate, put.withDetail), actions),
  );
}

function kindChoice(chosen: RateKind, actions: Actions): HTMLElement {
  return h(
    'fieldset',
    { className: 'kinds' },
    h('legend', {}, 'Which rate'),
    ...kinds.map(([kind, label]) =>
      h(
        'label',
        { for: `kind-${kind}` },
        h('input', {
          id: `kind-${kind}`,
          type: 'radio',
          name: 'flaskpace-rate-kind',
          checked: kind === chosen,
          onchange: () => void actions.changeRate({ kind }),
        }),
        h('span', {}, label),
      ),
    ),
  );
}

function fieldsFor(table: Table, run: Run, rate: RateChoice, answer: Answer, actions: Actions): HTMLElement {
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
      onInput: (typed) => void actions.changeRate({ [name]: typed }),
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

const howItIsDone: Readonly<Record<RateKind, string>> = {
  average:
    'Change between two times over the time it took; between readings, straight lines. The stoichiometric number is −1 for a reactant, +1 for a product; left empty, its sign follows the run.',
  tangent:
    'Slope, at this time, of the least-squares polynomial through the nearest readings. Left empty, their number is chosen from the data. The stoichiometric number is −1 for a reactant, +1 for a product; left empty, its sign follows the run.',
  column:
    'The tangent at every reading. Left empty, the number of readings used is chosen from the data. The stoichiometric number is −1 for a reactant, +1 for a product; left empty, its sign follows the run.',
};

function drawing(table: Table, run: Run, rate: RateChoice, answer: Answer, unit: string): Child[] {
  if (answer.kind === 'absent' || answer.kind === 'refused') return [plainPlot(table, run)];
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
  rates: readonly (Rate | null)[],
): { time: number; rate: Rate }[] {
  const times = columnOf(table, run.timeColumn, run).cells;
  return rates.flatMap((rate, row) => {
    const time = times[row]?.[0];
    return rate && typeof time === 'number' ? [{ time, rate }] : [];
  });
}

function inWords(table: Table, run: Run, rate: RateChoice, answer: Answer, unit: string): Child[] {
  switch (answer.kind) {
    case 'absent':
      return [h('p', { className: 'hint' }, `PACE.${answer.functionName} is not part of this version.`)];
    case 'refused':
      return [
        answer.field === null
          ? h('p', { className: 'problem' }, answer.words)
          : h('p', { className: 'hint' }, 'No rate yet: see the field marked above.'),
      ];
    case 'one':
      return [
        h('p', { className: 'what' }, rateName(table, run, rate)),
        h(
          'p',
          { className: 'value' },
          valueWithUncertainty(answer.rate.value, answer.rate.uncertainty),
          ' ',
          h('span', { className: 'unit' }, unit),
        ),
        h('p', { className: 'hint' }, limitsInWords(answer.rate)),
      ];
    case 'column':
      return columnInWords(table, run, answer.rates, unit);
  }
}

function limitsInWords({ lower, upper, degreesOfFreedom }: Rate): string {
  if (lower === null || upper === null) return 'no uncertainty: too few readings to judge their scatter by';
  const freedom = degreesOfFreedom === null ? '' : `; ${plainNumber(degreesOfFreedom, 3)} degrees of freedom`;
  return `± is one standard uncertainty. 95 % limits ${plainNumber(lower)} to ${plainNumber(upper)}${freedom}`;
}

/** A table for those who cannot see the plot; long runs are cut. */
const longestTable = 100;

function columnInWords(table: Table, run: Run, rates: readonly (Rate | null)[], unit: string): Child[] {
  const rows = ratesByTime(table, run, rates);
  if (rows.length === 0) return [h('p', { className: 'problem' }, 'no reading has a rate')];
  const fastest = rows.reduce((best, row) =>
    Math.abs(row.rate.value) > Math.abs(best.rate.value) ? row : best,
  );
  const time = headingOf(table, run.timeColumn);
  const cut = rows.length > longestTable ? ` (the first ${longestTable} of ${rows.length})` : '';
  return [
    h(
      'p',
      { className: 'what' },
      `largest rate, at ${[plainNumber(fastest.time), time.unit].filter(Boolean).join(' ')}`,
    ),
    h(
      'p',
      { className: 'value' },
      valueWithUncertainty(fastest.rate.value, fastest.rate.uncertainty),
      ' ',
      h('span', { className: 'unit' }, unit),
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

function formulaLine(formula: string, actions: Actions): HTMLElement {
  return h(
    'div',
    { className: 'formula' },
    h('code', { id: 'formula', tabindex: '0', 'aria-label': 'formula' }, formula),
    button('Copy', () => void actions.copy(formula), 'small'),
  );
}
