/** The equations of a function, typeset as on its help page, with its method: for who wants to know. */
import type { CellFunction } from '../../functions/define';
import { equationSection } from '../../functions/help/equations';
import { h } from '../h';
import { later } from '../later';

export const howItIsWorkedOut = (f: CellFunction): HTMLElement =>
  later(h('details', { id: `how-${f.name.toLowerCase()}` }), [f], () => [
    h('summary', {}, 'How it is worked out'),
    typeset(f),
    h('p', { className: 'hint' }, f.method),
    h('p', { className: 'hint' }, h('strong', {}, 'How sure it is. '), f.uncertainty),
  ]);

/** A long equation is scrolled in its own place, by keyboard too. */
function typeset({ equations }: CellFunction): HTMLElement | null {
  if (!equations) return null;
  const place = h('div', { className: 'typeset', tabindex: '0', role: 'region', 'aria-label': 'equations' });
  place.innerHTML = equationSection(equations); // it escapes what it is given
  return place;
}
