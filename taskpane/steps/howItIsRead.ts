/** What was guessed of the table, to be put right. */
import type { Actions } from '../actions';
import { h } from '../h';
import type { Table } from '../runs';
import { lineLabel } from './columnField';
import { selectField } from './fields';

const nobody = '';

export function howItIsRead({ isTurned, names, labels }: Table, actions: Actions): HTMLElement {
  return h(
    'details',
    {},
    h('summary', {}, 'How the table is read'),
    h(
      'div',
      { className: 'pair' },
      selectField(
        'runs-stand-in',
        'Runs stand in',
        [
          { value: 'columns', label: 'columns' },
          { value: 'rows', label: 'rows' },
        ],
        isTurned ? 'rows' : 'columns',
        (chosen) => void actions.correctTable({ isTurned: chosen === 'rows' }),
      ),
      selectField(
        'names-column',
        'Names of runs',
        [
          { value: nobody, label: 'none: all rows are one run' },
          ...labels.map((one) => ({ value: String(one.column), label: lineLabel(one, isTurned) })),
        ],
        names === null ? nobody : String(names),
        (chosen) => void actions.correctTable({ names: chosen === nobody ? null : Number(chosen) }),
      ),
    ),
  );
}
