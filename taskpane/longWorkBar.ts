/** Says which long calculation of the sheet is under way and how far it is, and lets the person stop it. */
import type { Underway } from '../functions/longWork';
import { h, type Child } from './h';
import { patch } from './patch';

/** What is done sooner is not worth a word. */
const patience = 400; // ms

/** @returns to be told whenever a long calculation starts, goes on (with what it is), or the last has ended (with nothing) */
export function longWorkBar(element: HTMLElement): (underway: Underway | null) => void {
  let timer: ReturnType<typeof setTimeout> | undefined;
  let last: Underway | null = null;
  element.setAttribute('role', 'status');
  const draw = (): void => {
    const next = element.cloneNode(false) as HTMLElement;
    if (last) next.append(...inWords(last).filter((one): one is HTMLElement => one instanceof HTMLElement));
    patch(element, next);
  };
  return (underway) => {
    const begins = underway && !last;
    last = underway;
    if (begins) timer = setTimeout(draw, patience);
    else if (!underway) clearTimeout(timer);
    if (!underway || element.hasChildNodes()) draw();
  };
}

function inWords({ name, waiting, progress, stop }: Underway): Child[] {
  const more = waiting > 0 ? `, ${waiting} more after it` : '';
  const { doing = '', share } = progress ?? {};
  return [
    h('p', {}, `calculating ${name}${more}`),
    // read out as it changes where it says what is done next; counting up would be too much
    h('p', { className: 'hint', 'aria-hidden': share === undefined ? null : 'true' }, doing),
    share !== undefined && bar(name, doing, share),
    h('button', { type: 'button', className: 'small', onclick: stop }, 'Stop'),
  ];
}

/** Only where it is known how far it is. */
const bar = (name: string, doing: string, share: number): HTMLElement =>
  h('progress', {
    max: '100',
    value: String(Math.round(100 * share)),
    'aria-label': name,
    'aria-valuenow': Math.round(100 * share),
    'aria-valuetext': doing,
  });
