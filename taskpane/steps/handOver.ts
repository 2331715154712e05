/** A copy of the workbook for someone who installs nothing. */
import type { Actions } from '../actions';
import type { CellsAndWhy, HandedCopy } from '../copying';
import { h, type Child } from '../h';
import type { WorkbookFiles } from '../port';
import type { Copying, State } from '../store';
import { button, step } from './fields';
import { list } from './list';

const title = 'Hand over';

/** @param files left out where the host gives none */
export function handOverStep(
  { copying }: State,
  files: WorkbookFiles | undefined,
  actions: Actions,
): HTMLElement {
  return step('hand-over', title, ...(files ? withFiles(copying, files, actions) : elsewhere()));
}

function withFiles(copying: Copying | null, { gives, verb }: WorkbookFiles, actions: Actions): Child[] {
  return [
    h(
      'p',
      {},
      'Makes a copy of this workbook for someone who installs nothing. This workbook stays as it is.',
    ),
    h(
      'ul',
      { className: 'plain' },
      h('li', {}, 'Formulas that built-in functions can say work on in them.'),
      h('li', {}, 'Others, such as fits, are frozen to their value, with a note.'),
      h('li', {}, 'A new sheet, “Method”, tells how each was worked out.'),
      h('li', {}, `The copy ${gives}.`),
    ),
    h('p', { className: 'hint', role: 'status' }, said(copying)),
    copying?.kind === 'making' && making(actions),
    ...(copying?.kind === 'made' ? made(copying.copy, verb, actions) : []),
    !copying && button('Make the copy', () => void actions.makeCopy(), 'main'),
  ];
}

/** Stays where it is, so that it is read out. */
function said(copying: Copying | null): string {
  if (!copying) return '';
  if (copying.kind === 'making') return `${copying.doing} …`;
  const time = copying.at.toLocaleTimeString([], { hour: '2-digit', minute: '2-digit' });
  const { live, frozen, left } = copying.copy;
  return live + frozen.length + left.length > 0
    ? `The copy, of the workbook as it was at ${time}:`
    : `No formula of ours stands in this workbook: the copy of ${time} is the same, calculated anew.`;
}

/** How far it is nobody knows; that it goes on can be seen. */
const making = (actions: Actions): HTMLElement =>
  h(
    'div',
    { className: 'progress' },
    h('progress', { 'aria-label': 'making the copy' }),
    button('Stop', () => actions.stop(), 'small'),
  );

const made = (copy: HandedCopy, verb: string, actions: Actions): Child[] => [
  counts(copy),
  h(
    'div',
    { className: 'row' },
    button(verb, () => void actions.giveCopy(), 'main'),
    button('Make it again', () => void actions.makeCopy()),
  ),
  copy.frozen.length > 0 && details('What is frozen, and why', copy.frozen),
  copy.left.length > 0 && details('What still needs the add-in', copy.left),
  copy.failing.length > 0 && details('Which showed an error', [{ why: '', cells: copy.failing }]),
];

function counts({ live, frozen, left, failing }: HandedCopy): HTMLElement | false {
  const rows: readonly (readonly [count: number, meaning: string])[] = [
    [live, 'live: they follow their inputs'],
    [cellsIn(frozen), 'frozen to their value'],
    [cellsIn(left), 'not in cells: these still need the add-in'],
    [failing.length, 'showed an error before, and still do'],
  ];
  const shown = rows.filter(([count]) => count > 0);
  return (
    shown.length > 0 &&
    h(
      'dl',
      { className: 'counts' },
      ...shown.flatMap(([count, meaning]) => [h('dt', {}, String(count)), h('dd', {}, meaning)]),
    )
  );
}

const cellsIn = (groups: readonly CellsAndWhy[]): number =>
  groups.reduce((sum, { cells }) => sum + cells.length, 0);

const details = (summary: string, groups: readonly CellsAndWhy[]): HTMLElement =>
  h(
    'details',
    {},
    h('summary', {}, summary),
    h(
      'ul',
      { className: 'plain' },
      ...groups.map(({ why, cells }) =>
        h('li', {}, why && `${why}: `, h('span', { className: 'where' }, list(cells))),
      ),
    ),
  );

/** Where the host keeps the file to itself there are two other ways. */
const elsewhere = (): Child[] => [
  h('p', {}, 'This Excel does not let an add-in read the workbook’s file. Save the workbook, then either'),
  h(
    'ul',
    { className: 'plain' },
    h('li', {}, 'open it in Flaskpace’s local workbook (npm start) and choose Hand over there, or'),
    h('li', {}, 'run ', h('code', {}, 'npm run handover -- IN.xlsx OUT.xlsx'), '.'),
  ),
];
