/** Which cells are the run. */
import { areaName } from '../../functions/address';
import { shown } from '../../src/errors';
import type { Actions } from '../actions';
import { runningTimeFormula } from '../calls/clock';
import { rises } from '../calls/order';
import { h, type Child } from '../h';
import { later } from '../later';
import { columnOf, headingOf, limitsOf, pointsOf, type Run, type Table } from '../runs';
import type { Scene } from '../scene';
import { functionOf, isConfinedGas, signalFor } from '../signals';
import type { State } from '../store';
import { placeName } from '../turned';
import { columnField } from './columnField';
import { findingsList } from './findings';
import { button, selectField, step, textField, type Choice } from './fields';
import { formulaLine } from './formulaLine';
import { howItIsRead } from './howItIsRead';

/** Drawn again only for another run or block: a table of many columns has long lists to choose from. */
export function runStep(scene: Scene, actions: Actions): HTMLElement {
  const { table, run, proposal, hint } = scene.state;
  const { what } = scene.state.reading;
  return later(step('run', 'Run'), [table, run, proposal, hint, what, isCautioned(scene.state)], () =>
    table && run ? chosenRun(table, run, scene, actions) : noRun(hint, actions),
  );
}

/** The open step has a caution of its own. */
const isCautioned = ({ task, reading }: State): boolean =>
  task === 'reading' && functionOf(reading.what)?.caution !== undefined;

const noRun = (hint: string, actions: Actions): Child[] => [
  h(
    'p',
    { className: 'hint' },
    'Click a cell in your table of times and readings, or select its columns with their headings.',
  ),
  hint !== '' && problem(hint),
  button('Use the selected cells', () => void actions.chooseSelection(), 'main'),
];

const problem = (words: string): HTMLElement => h('p', { className: 'problem', role: 'alert' }, words);

function chosenRun(table: Table, run: Run, { state, check }: Scene, actions: Actions): Child[] {
  const { proposal, hint } = state;
  return [
    h('p', { className: 'where' }, areaName(table.area)),
    ...runField(table, run, actions),
    h(
      'div',
      { className: 'pair' },
      columnField('time-column', 'Times', table, run.timeColumn, (timeColumn) =>
        actions.changeRun({ timeColumn }),
      ),
      columnField('reading-column', 'Readings', table, run.readingColumn, (readingColumn) =>
        actions.changeRun({ readingColumn }),
      ),
      rowField('first-row', 'From', table, run, 'firstRow', actions),
      rowField('last-row', 'To', table, run, 'lastRow', actions),
    ),
    ...unitFields(table, run, actions),
    ...clockTimes(table, run, actions),
    isFollowedInTime(table, run) && h('p', { className: 'hint' }, pointsInWords(table, run)),
    table.apart !== '' && h('p', { className: 'problem' }, table.apart),
    hint !== '' && problem(hint),
    howItIsRead(table, actions),
    proposal
      ? button(`Use ${areaName(proposal.area)} instead`, () => void actions.chooseProposal())
      : button('Use the selected cells', () => void actions.chooseSelection()),
    isFollowedInTime(table, run) && check && findingsList(check),
    !isCautioned(state) && caution(table, run, state.reading),
  ];
}

/** Which of several runs under each other. */
function runField({ stretches }: Table, { firstRow: chosen }: Run, actions: Actions): Child[] {
  if (stretches.length === 0) return [];
  const current = stretches.find(({ firstRow, lastRow }) => chosen >= firstRow && chosen <= lastRow);
  const field = selectField(
    'run-name',
    `Run, of ${stretches.length}`,
    stretches.map(({ name, firstRow }) => ({ value: String(firstRow), label: name })),
    String(current?.firstRow ?? ''),
    (value) => {
      const { firstRow, lastRow } = stretches.find((one) => String(one.firstRow) === value)!;
      void actions.changeRun({ firstRow, lastRow });
    },
  );
  return [h('div', { className: 'pair' }, field)];
}

/** Asked for only where a heading does not say it. */
function unitFields(table: Table, { timeColumn, readingColumn }: Run, actions: Actions): Child[] {
  const fields = [
    unitField('time-unit', 'Unit of times', table, timeColumn, actions),
    unitField('reading-unit', 'Unit of readings', table, readingColumn, actions),
  ];
  return fields.some(Boolean) ? [h('div', { className: 'pair' }, ...fields)] : [];
}

function unitField(id: string, label: string, table: Table, column: number, actions: Actions): Child {
  const { units = {} } = table.corrections;
  if (units[column] === undefined && headingOf(table, column).unit !== '') return null;
  return textField({
    id,
    label,
    value: units[column] ?? '',
    numeric: false,
    whenEmpty: 'heading says none',
    onInput: (unit) => void actions.correctTable({ units: { ...units, [column]: unit } }),
  });
}

/** A sheet counts clock times and dates in days, and words not at all. */
function clockTimes(table: Table, run: Run, actions: Actions): Child[] {
  const formula = runningTimeFormula(table, run);
  if (formula === null) return [];
  return [
    h(
      'p',
      { className: 'warning' },
      'These look like clock times or dates. For minutes since the first reading, put this into a free column with the heading “t / min”, and choose that column as Times:',
    ),
    formulaLine({ formula, sheet: table.sheet, id: 'clock-formula' }, actions),
  ];
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
  const all = { ...run, ...limitsOf(table, run.firstRow) };
  const times = columnOf(table, run.timeColumn, all);
  const stride = Math.ceil(times.length / longestList);
  const choices = times.flatMap(([time], place): Choice[] => {
    const row = all.firstRow + place;
    const isListed = place % stride === 0 || row === all.lastRow || row === run[which];
    const name = placeName(row, table.isTurned);
    const words = typeof time === 'number' ? `${name} (${shown(time)})` : name;
    return isListed ? [{ value: String(row), label: words }] : [];
  });
  return selectField(
    id,
    `${label} ${table.isTurned ? 'column' : 'row'}`,
    choices,
    String(run[which]),
    (value) => void actions.changeRun({ [which]: Number(value) }),
  );
}

function pointsInWords(table: Table, run: Run): string {
  const points = pointsOf(table, run).length;
  const gaps = run.lastRow - run.firstRow + 1 - points;
  const counted = `${points} ${points === 1 ? 'reading' : 'readings'}`;
  const place = table.isTurned ? 'column' : 'row';
  return gaps === 0
    ? counted
    : `${counted}; ${gaps} ${gaps === 1 ? `${place} without a pair of numbers is` : `${place}s without a pair of numbers are`} skipped`;
}

function caution(table: Table, run: Run, { what }: State['reading']): HTMLElement | null {
  const suits = signalFor(headingOf(table, run.readingColumn), rises(table, run));
  if (!isConfinedGas(what, suits)) return null;
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
