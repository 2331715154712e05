/** A question over the page that must be answered first. */
import { h } from '../../taskpane/h';

/** @returns the answer chosen, or `null` when the question was put away with Escape */
export function ask<A extends string>(words: string, answers: readonly A[]): Promise<A | null> {
  return new Promise((resolve) => {
    const answer = (chosen: A | null): void => {
      dialog.remove();
      resolve(chosen);
    };
    const dialog = h(
      'dialog',
      { className: 'flaskpace', 'aria-labelledby': 'question', oncancel: () => answer(null) },
      h('p', { id: 'question' }, words),
      h(
        'div',
        { className: 'row' },
        ...answers.map((one, place) =>
          h(
            'button',
            { type: 'button', className: place === 0 ? 'main' : '', onclick: () => answer(one) },
            one,
          ),
        ),
      ),
    );
    document.body.append(dialog);
    dialog.showModal();
  });
}
