/** What could spoil a result of the chosen run, in words, the worst first. */
import type { Check, Concern } from '../findings';
import { h } from '../h';

/** More than this at once is not read. */
const firstFew = 3;

export function findingsList({ concerns, clean }: Check): HTMLElement {
  return h(
    'div',
    { className: 'findings' },
    h('p', { className: 'count', role: 'status' }, inShort(concerns, clean)),
    concerns.length === 0 ? lookedFor(clean) : list(concerns.slice(0, firstFew)),
    concerns.length > firstFew &&
      h(
        'details',
        {},
        h('summary', {}, `and ${concerns.length - firstFew} more`),
        list(concerns.slice(firstFew)),
      ),
  );
}

/** `nothing found in 24 pairs`: what was looked for can be asked for. */
const inShort = (concerns: readonly Concern[], clean: string): string => {
  if (concerns.length === 0) return clean.split(':')[0];
  return concerns.length === 1 ? 'one thing to look at' : `${concerns.length} things to look at`;
};

const lookedFor = (clean: string): HTMLElement =>
  h(
    'details',
    {},
    h('summary', {}, 'What was looked for'),
    h(
      'p',
      { className: 'hint' },
      clean
        .slice(clean.indexOf(':') + 1)
        .replace('looked for', '')
        .trim(),
    ),
  );

const list = (concerns: readonly Concern[]): HTMLElement =>
  h('ul', {}, ...concerns.map((concern) => h('li', {}, ...inWords(concern))));

const inWords = ({ finding, where, meaning, advice }: Concern): HTMLElement[] => [
  h('p', { className: 'finding' }, `${sentence(finding)} `, h('span', { className: 'place' }, `(${where})`)),
  h('p', {}, `${sentence(advice)}.`),
  h('details', {}, h('summary', {}, 'Why'), h('p', { className: 'hint' }, `${sentence(meaning)}.`)),
];

const sentence = (words: string): string => words.charAt(0).toUpperCase() + words.slice(1);
