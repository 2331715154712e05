/** Where the formula goes, and what it will fill. */
import { areaName } from '../../functions/address';
import type { Actions } from '../actions';
import { h, type Child } from '../h';
import { planFor, type Plan } from '../plan';
import type { Scene } from '../scene';
import type { State } from '../store';
import { button, checkField, step, textField } from './fields';
import { list } from './list';

const title = 'Put it in';

/** @param canChart whether the workbook's host draws charts */
export function putInStep(
  { state, insertion, isAnswered }: Scene,
  actions: Actions,
  canChart: boolean,
): HTMLElement {
  const { table, put } = state;
  if (!insertion)
    return step(
      'put-in',
      title,
      h(
        'p',
        { className: 'hint' },
        table ? 'Nothing to put in here.' : 'An answer can be written beside its run.',
      ),
      undoButton(state, actions),
    );
  const plan = planFor(insertion, table?.sheet ?? '', put);
  const isReady = typeof plan !== 'string' && isAnswered;
  return step(
    'put-in',
    title,
    textField({
      id: 'target',
      label: 'Write to cell',
      value: put.target,
      numeric: false,
      problem: typeof plan === 'string' ? plan : null,
      onInput: (typed) => void actions.changeTarget(typed),
    }),
    button('Use the active cell', () => void actions.targetActiveCell(), 'small'),
    h(
      'div',
      { className: 'checks' },
      insertion.headings.length > 0 &&
        checkField(
          'with-heading',
          'Heading with unit above',
          put.withHeading,
          (withHeading) => void actions.changeOptions({ withHeading }),
        ),
      insertion.hasDetail &&
        checkField(
          'with-detail',
          'Uncertainty and limits beside it',
          put.withDetail,
          (withDetail) => void actions.changeOptions({ withDetail }),
        ),
      canChart &&
        insertion.chart &&
        checkField(
          'with-chart',
          insertion.chart.isFit ? 'A chart of the readings and the fit' : 'A chart of the readings',
          put.withChart,
          (withChart) => void actions.changeOptions({ withChart }),
        ),
    ),
    ...(typeof plan === 'string' ? [] : preview(plan, put.inUse)),
    put.question && typeof plan !== 'string'
      ? question(put.question, actions)
      : h(
          'button',
          { type: 'button', className: 'main', disabled: !isReady, onclick: () => void actions.putIn(false) },
          insertion.becomesReadings ? 'Put it in and go on with it' : 'Put it in',
        ),
    undoButton(state, actions),
  );
}

function preview(plan: Plan, inUse: readonly string[]): Child[] {
  const headings = plan.cells.flatMap(({ content }) => ('value' in content ? [`“${content.value}”`] : []));
  return [
    h(
      'p',
      { className: 'hint' },
      'Fills ',
      h('span', { className: 'where' }, areaName(plan.area)),
      headings.length > 0 && `, under ${list(headings)}`,
    ),
    inUse.length > 0 && h('p', { className: 'warning' }, `Not empty now: ${list(inUse)}`),
  ];
}

function question(areas: readonly string[], actions: Actions): HTMLElement {
  return h(
    'div',
    { className: 'question', role: 'alertdialog', 'aria-labelledby': 'overwrite-question' },
    h('p', { id: 'overwrite-question' }, `Something stands in ${list(areas)}. Replace it?`),
    h(
      'div',
      { className: 'row' },
      button('Keep it', () => actions.declineOverwrite(), 'main'),
      button('Replace it', () => void actions.putIn(true)),
    ),
  );
}

function undoButton({ deeds }: State, actions: Actions): HTMLElement | null {
  const last = deeds[deeds.length - 1];
  return last ? button(`Undo: ${last.description}`, () => void actions.undoLast()) : null;
}
