/** Which cells are the run. */
import { areaName } from '../../functions/address';
import { shown } from '../../src/errors';
import type { Actions } from '../actions';
import { h } from '../h';
import { columnOf, headingOf, pointsOf, type Run, type Table } from '../runs';
import type { Scene } from '../scene';
import { columnField } from './columnField';
import { findingsList } from './findings';
import { button, selectField, step, type Choice } from './fields';

export function runStep(
  { state: { table, run, proposal, hint }, check }: Scene,
  actions: Actions,
): HTMLElement {
  if (!table || !run) {
    return step(
      'run',
      'Run',
      h(
        'p',
        { className: 'hint' },
        'Click a cell in your table of times and readings, or select its columns with their headings.',
      ),
      hint !== '' && h('p', { className: 'problem', role: 'alert' }, hint),
      button('Use the selected cells', () => void actions.chooseSelection(), 'main'),
    );
  }
  return step(
    'run',
    'Run',
    h('p', { className: 'where' }, areaName(table.area)),
    h(
      'div',
      { className: 'pair' },
      columnField('time-column', 'Times', table, run.timeColumn, (timeColumn) =>
        actions.changeRun({ timeColumn }),
      ),
      columnField('reading-column', 'Readings', table, run.readingColumn, (readingColumn) =>
        actions.changeRun({ readingColumn }),
      ),
      rowField('first-row', 'From row', table, run, 'firstRow', actions),
      rowField('last-row', 'To row', table, run, 'lastRow', actions),
    ),
    h('p', { className: 'hint' }, pointsInWords(table, run)),
    hint !== '' && h('p', { className: 'problem', role: 'alert' }, hint),
    proposal
      ? button(`Use ${areaName(proposal.area)} instead`, () => void actions.chooseProposal())
      : button('Use the selected cells', () => void actions.chooseSelection()),
    isFollowedInTime(table, run) && check && findingsList(check),
    caution(table, run),
  );
}

/** So many rows still make a list that can be picked from; beyond, every nth. */
const longestList = 200;

function rowField(
  id: string,
  label: string,
  table: Table,
  run: Run,
  which: 'firstRow' | 'lastRow',
  actions: Actions,
): HTMLElement {
  const all = { ...run, firstRow: table.firstRow, lastRow: table.lastRow };
  const times = columnOf(table, run.timeColumn, all).cells;
  const stride = Math.ceil(times.length / longestList);
  const choices = times.flatMap(([time], place): Choice[] => {
    const row = table.firstRow + place;
    const isListed = place % stride === 0 || row === table.lastRow || row === run[which];
    const words = typeof time === 'number' ? `${row + 1} (${shown(time)})` : `${row + 1}`;
    return isListed ? [{ value: String(row), label: words }] : [];
  });
  return selectField(
    id,
    label,
    choices,
    String(run[which]),
    (value) => void actions.changeRun({ [which]: Number(value) }),
  );
}

function pointsInWords(table: Table, run: Run): string {
  const points = pointsOf(table, run).length;
  const gaps = run.lastRow - run.firstRow + 1 - points;
  const counted = `${points} ${points === 1 ? 'reading' : 'readings'}`;
  return gaps === 0
    ? counted
    : `${counted}; ${gaps} ${gaps === 1 ? 'row without a pair of numbers is' : 'rows without a pair of numbers are'} skipped`;
}

/** Volume and pressure are how a gas run is read. */
function caution(table: Table, run: Run): HTMLElement | null {
  const { quantity, text } = headingOf(table, run.readingColumn);
  const isGas = quantity === 'pressure' || (quantity === 'volume' && !/titre|titer|burette/i.test(text));
  if (!isGas) return null;
  return h(
    'p',
    { className: 'caution' },
    h('strong', {}, 'Gas in closed glass can burst it. '),
    'Keep the vessel vented, stand a shield before it, and follow the rules of your laboratory.',
  );
}

/** A table over temperature is no run, and a check of one would only mislead. */
const isFollowedInTime = (table: Table, run: Run): boolean =>
  headingOf(table, run.timeColumn).quantity !== 'temperature';
