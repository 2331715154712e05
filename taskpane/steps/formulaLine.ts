/** The formula of a step: copied as a whole, explained part by part. */
import type { Actions } from '../actions';
import { formulaParts, type FormulaPart } from '../formulaParts';
import { h } from '../h';
import { button } from './fields';

export function formulaLine(formula: string, actions: Actions): HTMLElement {
  const parts = formulaParts(formula);
  const first = parts.find(({ says }) => says);
  // another function begins with nothing explained: by its id it is another element
  const saysId = `formula-says-${first?.text.split('.')[1] ?? 'nothing'}`;
  return h(
    'div',
    { className: 'formula' },
    h(
      'code',
      {
        id: 'formula',
        role: 'toolbar',
        'aria-label': 'formula, part by part',
        onkeydown: move,
      },
      ...parts.map((part) => partOf(part, part === first, saysId)),
    ),
    button('Copy', () => void actions.copy(formula), 'small'),
    h('p', { id: saysId, className: 'hint says', 'data-kept': true }, 'Point at a part to see what it is.'),
  );
}

/** One part alone can be reached by the tab key, the others from it by the arrows. */
const partOf = ({ text, says }: FormulaPart, isFirst: boolean, saysId: string): HTMLElement | string =>
  says === undefined
    ? text
    : h(
        'span',
        {
          className: 'part',
          role: 'button',
          tabindex: isFirst ? '0' : '-1',
          'data-says': says,
          'aria-describedby': saysId,
          onfocus: explain,
          onmouseenter: explain,
        },
        text,
      );

function explain({ target }: Event): void {
  const part = target as HTMLElement;
  part.closest('.formula')!.querySelector('.says')!.textContent = part.dataset.says!;
}

const steps: Readonly<Record<string, (at: number, last: number) => number>> = {
  ArrowRight: (at, last) => Math.min(at + 1, last),
  ArrowLeft: (at) => Math.max(at - 1, 0),
  Home: () => 0,
  End: (_, last) => last,
};

function move(event: Event): void {
  const { key, target, currentTarget } = event as KeyboardEvent;
  const parts = [...(currentTarget as Element).querySelectorAll<HTMLElement>('.part')];
  const to = steps[key]?.(parts.indexOf(target as HTMLElement), parts.length - 1);
  if (to === undefined) return;
  event.preventDefault();
  parts.forEach((part, place) => (part.tabIndex = place === to ? 0 : -1));
  parts[to].focus();
}
