/** The steps of the work, one of them open. */
import type { Actions } from '../actions';
import type { Task } from '../choices';
import { h } from '../h';

export const tasks: readonly (readonly [Task, string])[] = [
  ['reading', 'Reading'],
  ['rate', 'Rate'],
  ['order', 'Order'],
  ['many', 'All runs'],
  ['temperature', 'Temperature'],
  ['handOver', 'Hand over'],
  ['lookUp', 'Look up'],
];

export function taskBar(open: Task, actions: Actions): HTMLElement {
  return h(
    'nav',
    { 'aria-label': 'steps' },
    ...tasks.map(([task, label]) =>
      h(
        'button',
        {
          id: `task-${task}`,
          type: 'button',
          'aria-current': task === open ? 'step' : null,
          onclick: () => void actions.openTask(task),
        },
        label,
      ),
    ),
  );
}
