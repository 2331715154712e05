/** The formula of a step: copied as a whole, explained part by part. */
import { areaName } from '../../functions/address';
import type { Actions } from '../actions';
import { cellsRead, formulaParts, readArea, type FormulaPart, type Read } from '../formulaParts';
import { h } from '../h';
import { markColour } from '../markColours';
import { button } from './fields';

export interface ShownFormula {
  readonly formula: string;
  /** Where names without a sheet are meant; empty where there is none. */
  readonly sheet: string;
  /** Where another formula stands on the page, too. */
  readonly id?: string;
}

export function formulaLine(
  { formula, sheet, id = 'formula' }: ShownFormula,
  actions: Pick<Actions, 'copy' | 'show'>,
): HTMLElement {
  const parts = formulaParts(formula);
  const read = cellsRead(parts, sheet);
  const numbers = new Map(read.map(({ area }, place) => [areaName(area), place + 1]));
  const first = parts.find(({ says }) => says);
  // another function begins with nothing explained: by its id it is another element
  const saysId = `${id}-says-${first?.text.split('.')[1] ?? 'nothing'}`;
  const numberOf = ({ text }: FormulaPart): number | undefined => {
    const area = readArea(text, sheet);
    return area && numbers.get(areaName(area));
  };
  return h(
    'div',
    { className: 'formula' },
    h(
      'code',
      {
        id,
        role: 'toolbar',
        'aria-label': 'formula, part by part',
        onkeydown: move,
      },
      ...parts.map((part) => partOf(part, part === first, saysId, numberOf(part))),
    ),
    button('Copy', () => void actions.copy(formula), 'small'),
    h('p', { id: saysId, className: 'hint says', 'data-kept': true }, 'Point at a part to see what it is.'),
    read.length > 0 && showButtons(read, actions),
  );
}

/** Cells have the same number and colour here, in the formula, and in the sheet where they can be marked. */
const showButtons = (read: readonly Read[], actions: Pick<Actions, 'show'>): HTMLElement =>
  h(
    'div',
    { className: 'reads', role: 'group', 'aria-label': 'cells that it reads' },
    h('span', { className: 'hint' }, 'Show'),
    ...read.map(({ name, area }, place) =>
      h(
        'button',
        {
          type: 'button',
          className: 'small',
          title: areaName(area),
          'aria-label': `${place + 1} ${name}: show ${areaName(area)}`,
          style: coloured(place),
          onclick: () => void actions.show(area),
        },
        h('span', { className: 'number' }, String(place + 1)),
        ` ${name}`,
      ),
    ),
  );

const coloured = (place: number): string => `--mark: ${markColour(place)}`;

/** One part alone can be reached by the tab key, the others from it by the arrows. */
const partOf = (
  { text, says }: FormulaPart,
  isFirst: boolean,
  saysId: string,
  number: number | undefined,
): HTMLElement | string =>
  says === undefined
    ? text
    : h(
        'span',
        {
          className: 'part',
          role: 'button',
          tabindex: isFirst ? '0' : '-1',
          'data-says': says,
          'data-number': number,
          style: number && coloured(number - 1),
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
