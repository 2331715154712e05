/** Which order, how well it fits, what coefficient and half life follow. */
import type { Actions } from '../actions';
import { givenBy, orderFormula, type OrderAnswer, type OrderLine } from '../calls/order';
import type { Answered, Estimate } from '../calls/estimate';
import type { EndpointKind, OrderAnswerKind, OrderChoice } from '../choices';
import { plainNumber, valueWithUncertainty } from '../../functions/format';
import { h, type Child } from '../h';
import { fitPlot, residualPlot } from '../plots/fitPlot';
import { plainPlot } from '../plots/runPlot';
import { headingOf, pointsOf, type Run, type Table } from '../runs';
import type { Scene } from '../scene';
import { estimateLines, result } from './estimate';
import { choiceOfOne, selectField, step, textField } from './fields';
import { formulaLine } from './formulaLine';

const orders: readonly (readonly [string, string])[] = [
  ['0', '0'],
  ['0.5', '½'],
  ['1', '1'],
  ['1.5', '1½'],
  ['2', '2'],
  ['3', '3'],
  ['free', 'fitted'],
];

const endpoints: readonly { readonly value: EndpointKind; readonly label: string }[] = [
  { value: 'zero', label: '0: all of it is used up' },
  { value: 'given', label: 'a reading I know' },
  { value: 'free', label: 'fitted to the readings' },
];

const answers: readonly { readonly value: OrderAnswerKind; readonly label: string }[] = [
  { value: 'coefficient', label: 'rate coefficient' },
  { value: 'halfLife', label: 'half life' },
  { value: 'order', label: 'order, fitted' },
  { value: 'curve', label: 'fit, as a column' },
  { value: 'orders', label: 'table of all orders' },
];

export function orderStep(scene: Scene, actions: Actions): HTMLElement {
  const { state, order: answer, orders: compared } = scene;
  const { table, run, order } = state;
  if (!table || !run || !answer || !compared)
    return step('order', 'Order', h('p', { className: 'hint' }, 'Choose a run first.'));
  const formula = orderFormula(
    givenBy(table, run, order, { sheet: table.sheet, pointedAt: state.pointedAt }),
    order,
    state.put.withDetail && !['curve', 'orders'].includes(order.answer),
  );
  return step(
    'order',
    'Order',
    choiceOfOne(
      'order',
      'Which order',
      orders,
      order.order,
      (chosen) => void actions.changeOrder({ order: chosen }),
    ),
    ...endpointFields(order, answer, actions),
    ...drawing(table, run, answer),
    result(...inWords(table, run, order, answer)),
    verdicts(compared, answer),
    selectField(
      'order-answer',
      'What to put in',
      answers,
      order.answer,
      (chosen) => void actions.changeOrder({ answer: chosen as OrderAnswerKind }),
    ),
    formulaLine({ formula, sheet: table.sheet }, actions),
  );
}

function endpointFields(order: OrderChoice, { coefficient }: OrderAnswer, actions: Actions): Child[] {
  const refused = 'refused' in coefficient ? coefficient.refused : '';
  const problem = /^endpoint\b/.test(refused) ? refused : null;
  const set = (endpoint: string): Promise<void> => actions.changeOrder({ endpoint });
  return [
    selectField(
      'endpoint-kind',
      'Reading at the end',
      endpoints,
      order.endpointKind,
      (kind) => void actions.changeOrder({ endpointKind: kind as EndpointKind }),
    ),
    ...(order.endpointKind === 'given'
      ? [
          textField({
            id: 'endpoint',
            label: 'Number or cell',
            value: order.endpoint,
            numeric: false,
            whenEmpty: '0',
            problem,
            onInput: (typed) => void set(typed),
            onPoint: () => void actions.pointAt('cell', set),
          }),
        ]
      : []),
  ];
}

function drawing(table: Table, run: Run, { curve, residuals, coefficient, unit }: OrderAnswer): Child[] {
  if (curve.length === 0) return [plainPlot(table, run)];
  const time = headingOf(table, run.timeColumn);
  const says =
    'ok' in coefficient ? `rate coefficient ${plainNumber(coefficient.ok.value)} ${unit}` : 'no coefficient';
  return [
    fitPlot({
      readings: pointsOf(table, run).map(({ time: x, value: y }) => ({ x, y })),
      curve,
      x: time.text,
      y: headingOf(table, run.readingColumn).text,
      says,
    }),
    residualPlot(residuals, time),
  ];
}

function inWords(table: Table, run: Run, choice: OrderChoice, answer: OrderAnswer): Child[] {
  const { order, coefficient, halfLife, unit } = answer;
  if ('refused' in order) return [problem(order.refused)];
  if ('refused' in coefficient) return [problem(coefficient.refused)];
  const isFitted = choice.order === 'free';
  const time = headingOf(table, run.timeColumn).unit;
  return [
    ...(isFitted ? estimateLines('order, fitted', order.ok, '') : []),
    ...estimateLines(
      `rate coefficient${isFitted ? ', the order taken as fitted' : ''}`,
      coefficient.ok,
      unit,
    ),
    h('p', { className: 'what' }, 'half life'),
    h('p', {}, inShort(halfLife, time)),
  ];
}

const problem = (words: string): HTMLElement => h('p', { className: 'problem' }, words);

/** `22.31 ± 0.14 min, 95 % 22.03 to 22.6`. */
function inShort(answer: Answered<Estimate>, unit: string): string {
  if ('refused' in answer) return answer.refused;
  const { value, uncertainty, lower, upper } = answer.ok;
  const limits =
    lower === null || upper === null ? '' : `, 95 % ${plainNumber(lower)} to ${plainNumber(upper)}`;
  return `${[valueWithUncertainty(value, uncertainty), unit].filter(Boolean).join(' ')}${limits}`;
}

/** What the answer above is refused for is not said again. */
function verdicts(
  compared: Answered<readonly OrderLine[]>,
  { order, coefficient }: OrderAnswer,
): HTMLElement | false {
  if ('refused' in compared) {
    const isSaid = [order, coefficient].some((one) => 'refused' in one && one.refused === compared.refused);
    return !isSaid && h('p', { className: 'hint' }, compared.refused);
  }
  const heading = (words: string): HTMLElement => h('th', { scope: 'col' }, words);
  return h(
    'table',
    { className: 'verdicts' },
    h('caption', {}, 'Which order the readings speak for'),
    h('thead', {}, h('tr', {}, heading('order'), heading('weight'), heading('verdict'))),
    h('tbody', {}, ...compared.ok.map(verdictRow)),
  );
}

const verdictRow = ({ order, isFree, weight, verdict }: OrderLine): HTMLElement => {
  const name = order === null ? '–' : plainNumber(order, 3);
  return h(
    'tr',
    {},
    h('th', { scope: 'row' }, isFree ? `fitted: ${name}` : name),
    h('td', {}, weight === null ? '–' : `${Math.round(100 * weight)} %`),
    h('td', {}, verdict),
  );
};
