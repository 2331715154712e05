/** All runs of the table at once: which, what of each, and a survey of them. */
import type { Actions } from '../actions';
import { isOneBlock, type Surveyed } from '../calls/many';
import type { ManyAnswer } from '../choices';
import { plainNumber, valueWithUncertainty } from '../../functions/format';
import { h, type Child } from '../h';
import { later } from '../later';
import { miniature } from '../plots/miniature';
import { headingOf } from '../runs';
import type { Scene, Stamp } from '../scene';
import type { Survey } from '../store';
import { button, selectField, step } from './fields';
import { formulaLine } from './formulaLine';
import { progressBar } from './progress';

const answers: readonly { readonly value: ManyAnswer; readonly label: string }[] = [
  { value: 'survey', label: 'survey: one table, one formula' },
  { value: 'order', label: 'Order step’s answer for each run' },
  { value: 'rate', label: 'Rate step’s answer for each run' },
];

export function manyStep({ state, stamps, picked, insertion }: Scene, actions: Actions): HTMLElement {
  const { table, run, many, survey, progress } = state;
  if (!table || !run) return step('many', 'All runs', h('p', { className: 'hint' }, 'Choose a run first.'));
  const isApart = many.answer === 'survey' && picked.length > 0 && !isOneBlock(picked);
  const [first] =
    insertion?.parts.flatMap(({ content }) => ('formula' in content ? [content.formula] : [])) ?? [];
  return step(
    'many',
    'All runs',
    h(
      'p',
      { className: 'hint', role: 'status' },
      `${picked.length} of ${stamps.length} ${stamps.length === 1 ? 'run' : 'runs'} picked${survey ? surveyInWords(survey) : ''}`,
    ),
    h(
      'div',
      { className: 'row' },
      button('All', () => void actions.changeMany({ picked: stamps.map(({ key }) => key) }), 'small'),
      button('None', () => void actions.changeMany({ picked: [] }), 'small'),
    ),
    strip(stamps, new Set(picked.map(({ key }) => key)), actions),
    selectField(
      'many-answer',
      'What to put in',
      answers,
      many.answer,
      (chosen) => void actions.changeMany({ answer: chosen as ManyAnswer }),
    ),
    isApart &&
      h(
        'p',
        { className: 'problem' },
        'one survey takes runs that share their times and stand side by side: pick such, or a formula each',
      ),
    first !== undefined && formulaLine({ formula: first, sheet: table.sheet }, actions),
    progress
      ? progressBar(progress, actions)
      : button(
          `Survey ${picked.length === 1 ? 'this run' : `these ${picked.length} runs`} here`,
          () => void actions.surveyRuns(),
        ),
    survey && surveyTable(survey, headingOf(table, run.timeColumn).unit),
  );
}

function strip(stamps: readonly Stamp[], picked: ReadonlySet<number>, actions: Actions): HTMLElement {
  return h(
    'ul',
    { className: 'stamps', 'aria-label': 'runs' },
    ...stamps.map((stamp) => {
      const isPicked = picked.has(stamp.key);
      return later(h('li'), [stamp, isPicked], () => [stampOf(stamp, isPicked, actions)]);
    }),
  );
}

const stampOf = ({ key, name, path }: Stamp, isPicked: boolean, actions: Actions): HTMLElement =>
  h(
    'label',
    { for: `run-${key}` },
    miniature(path),
    h(
      'span',
      {},
      h('input', {
        id: `run-${key}`,
        type: 'checkbox',
        checked: isPicked,
        onchange: (event) => void actions.pickRun(key, (event.target as HTMLInputElement).checked),
      }),
      name,
    ),
  );

/** Read out when it is done; in a long table remarks are easily missed. */
function surveyInWords({ rows }: Survey): string {
  const remarks = rows.filter(({ flags }) => flags !== '').length;
  return `; survey below, ${remarks === 0 ? 'no' : remarks} ${remarks === 1 ? 'run' : 'runs'} with a remark`;
}

function surveyTable(survey: Survey, timeUnit: string): HTMLElement {
  const { rows, isWhole } = survey;
  const heading = (words: string): HTMLElement => h('th', { scope: 'col' }, words);
  return h(
    'div',
    { className: 'scrolled', tabindex: '0', role: 'region', 'aria-label': 'survey' },
    h(
      'table',
      { className: 'survey' },
      h('caption', {}, isWhole ? 'Survey' : `Survey, stopped after ${rows.length}`),
      h(
        'thead',
        {},
        h(
          'tr',
          {},
          heading('run'),
          heading('order'),
          heading('rate coefficient'),
          heading(timeUnit ? `half life / ${timeUnit}` : 'half life'),
        ),
      ),
      later(h('tbody'), [survey], () => rows.flatMap(surveyRows)),
    ),
  );
}

/** What needs a second look stands below its run, across the table. */
function surveyRows({ name, order, coefficient, uncertainty, halfLife, flags }: Surveyed): Child[] {
  const shown = (value: number | null): string => (value === null ? '–' : plainNumber(value, 3));
  return [
    h(
      'tr',
      {},
      h('th', { scope: 'row' }, name),
      h('td', {}, shown(order)),
      h('td', {}, coefficient === null ? '–' : valueWithUncertainty(coefficient, uncertainty)),
      h('td', {}, shown(halfLife)),
    ),
    flags !== '' && h('tr', { className: 'flags' }, h('td', { colspan: '4' }, flags)),
  ];
}
