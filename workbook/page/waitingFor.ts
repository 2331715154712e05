/** Says which long calculation is under way, and lets the person stop it. */
import { h } from '../../taskpane/h';
import type { Underway } from '../../functions/longWork';

/** What is done sooner is not worth a word. */
const patience = 400; // ms

/** @returns to be told whenever a long calculation starts (with what it is) and ends (with nothing) */
export function waitingFor(element: HTMLElement): (underway: Underway | null) => void {
  let timer: ReturnType<typeof setTimeout> | undefined;
  element.setAttribute('role', 'status');
  return (underway) => {
    clearTimeout(timer);
    element.replaceChildren();
    if (!underway) return;
    timer = setTimeout(() => {
      element.replaceChildren(
        h(
          'span',
          {},
          `calculating ${underway.name}${underway.waiting > 0 ? `, ${underway.waiting} more after it` : ''} `,
        ),
        h('button', { type: 'button', className: 'small', onclick: underway.stop }, 'Stop'),
      );
    }, patience);
  };
}
