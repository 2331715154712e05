/** Names for the grid's buttons and fields, most of which (0.25.1) come as a picture alone. */

/** By the picture on the button; where one picture serves two buttons, by what the button does. */
const byPicture: Readonly<Record<string, string>> = {
  undo: 'Undo',
  redo: 'Redo',
  brush: 'Copy the format',
  'clear-format-double': 'Clear contents and format',
  'font-size-increase': 'Larger letters',
  'font-size-reduce': 'Smaller letters',
  bold: 'Bold',
  italic: 'Italic',
  underline: 'Underline',
  strikethrough: 'Strike through',
  percent: 'As percent',
  dollar: 'As currency',
  'add-digits': 'One decimal more',
  'reduce-digits': 'One decimal fewer',
  protect: 'Protect cells',
  shortcut: 'Keyboard shortcuts',
  'hide-gridlines-double': 'Grid lines',
  convert: 'All sheets',
  close: 'Close',
  increase: 'Zoom in',
  reduce: 'Zoom out',
};

const addsSheet = '[data-u-comp="sheet-bar-append-button"]';

interface Unnamed {
  readonly selector: string;
  name(element: Element): string | undefined;
}

const unnamed: readonly Unnamed[] = [
  { selector: 'button[role="handle"]:not([aria-label])', name: () => 'Zoom' },
  {
    selector: 'button:not([aria-label])',
    name: (button) => (button.textContent?.trim() ? undefined : nameOfButton(button)),
  },
  { selector: '[data-u-comp="defined-name"] input:not([aria-label])', name: () => 'Cell or name to go to' },
  {
    selector: 'input:not([aria-label])',
    name: (input) => (/^\d+$/.test((input as HTMLInputElement).value) ? 'Size of letters' : 'Font'),
  },
  {
    selector: '[data-u-comp="editor"]:not([aria-label])',
    name: () => 'Cell editor',
  },
];

function nameOfButton(button: Element): string | undefined {
  const picture = /univerjs-icon-([a-z0-9-]+)-icon/.exec(
    button.querySelector('svg')?.getAttribute('class') ?? '',
  )?.[1];
  if (picture === 'increase' && button.matches(addsSheet)) return 'Add a sheet';
  return picture === undefined ? undefined : (byPicture[picture] ?? picture.replace(/-/g, ' '));
}

/** Names what is there, and what the grid adds later. @returns a function that stops */
export function nameControls(container: HTMLElement): () => void {
  const nameAll = (): void => {
    for (const { selector, name } of unnamed) {
      for (const element of container.querySelectorAll(selector)) {
        const words = name(element);
        if (words !== undefined) element.setAttribute('aria-label', words);
      }
    }
  };
  const watching = new MutationObserver(nameAll);
  watching.observe(container, { childList: true, subtree: true });
  nameAll();
  return () => watching.disconnect();
}
