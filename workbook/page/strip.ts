/** The strip above the sheet: what this is, which file is open, and what can be done with files. */
import { helpAddress } from '../../functions/help/pageName';
import { h } from '../../taskpane/h';

export interface StripActions {
  open(): void;
  saveAs(): void;
  demo(): void;
}

export interface Strip {
  readonly element: HTMLElement;
  /** Which file is open, and whether it holds work that no file has yet. */
  showFile(name: string, isUnsaved: boolean): void;
  /** One sentence for the person; an empty one takes the last away. */
  say(words: string, tone?: 'good' | 'bad'): void;
}

export function fillStrip(element: HTMLElement, actions: StripActions): Strip {
  const file = h('p', { className: 'file' });
  const said = h('p', { className: 'said', role: 'status' });
  const button = (label: string, press: () => void, help: string): HTMLElement =>
    h('button', { type: 'button', className: 'small', title: help, onclick: press }, label);
  element.replaceChildren(
    h('h1', {}, 'Flaskpace'),
    h('p', { className: 'what-it-is' }, 'Reaction rates, typed into cells'),
    file,
    h(
      'div',
      { className: 'row', role: 'group', 'aria-label': 'File' },
      button('Open…', actions.open, 'Open an .xlsx workbook from this machine'),
      button('Save as…', actions.saveAs, 'Save this workbook as an .xlsx file'),
      button('Demo', actions.demo, 'Show the demo workbook'),
    ),
    h('a', { className: 'help', href: helpAddress(), target: '_blank', rel: 'noopener' }, 'Help'),
    said,
  );
  return {
    element,
    showFile(name, isUnsaved) {
      file.textContent = isUnsaved ? `${name}, not saved` : name;
      file.title = file.textContent;
      document.title = `${isUnsaved ? '• ' : ''}${name} – Flaskpace`;
    },
    say(words, tone = 'good') {
      said.className = `said ${tone}`;
      said.textContent = words;
    },
  };
}
