/** Long work: how far it is, and the way to stop it. */
import type { Actions } from '../actions';
import { h } from '../h';
import type { Progress } from '../store';
import { button } from './fields';

export function progressBar({ what, done, of }: Progress, actions: Actions): HTMLElement {
  return h(
    'div',
    { className: 'progress' },
    h('label', { for: 'progress' }, `${what}: ${done} of ${of}`),
    h('progress', { id: 'progress', max: of, value: String(done) }),
    button('Stop', () => actions.stop(), 'small'),
  );
}
