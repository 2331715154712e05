/** Every function, found by name or words, with its help and its example. */
import { functionNamed } from '../../functions/catalogue';
import { signature, typedName, type CellFunction } from '../../functions/define';
import { helpAddress } from '../../functions/help/pageName';
import type { Actions } from '../actions';
import { h, type Child } from '../h';
import { families, lookUp } from '../lookup';
import { parameterHelp } from './parameterHelp';
import type { Scene } from '../scene';
import { button, step, textField } from './fields';
import { formulaLine } from './formulaLine';
import { howItIsWorkedOut } from './howItIsWorkedOut';

export function lookUpStep({ state: { lookup } }: Scene, actions: Actions): HTMLElement {
  const chosen = functionNamed(lookup.chosen);
  return step('look-up', 'Look up', ...(chosen ? article(chosen, actions) : search(lookup.words, actions)));
}

function search(words: string, actions: Actions): Child[] {
  const found = lookUp(words);
  return [
    textField({
      id: 'look-up-words',
      label: 'Name or words',
      value: words,
      numeric: false,
      whenEmpty: 'half life',
      onInput: (typed) => void actions.changeLookup({ words: typed }),
    }),
    h('p', { className: 'hint', role: 'status' }, inShort(found.length)),
    ...(words.trim() === '' ? byFamily(found, actions) : [list(found, actions)]),
  ];
}

const inShort = (count: number): string => {
  if (count === 0) return 'no function speaks of that: try another word';
  return count === 1 ? 'one function' : `${count} functions`;
};

const byFamily = (found: readonly CellFunction[], actions: Actions): Child[] =>
  families.flatMap(([family, title]) => [
    h('h3', {}, title),
    list(
      found.filter((f) => f.family === family),
      actions,
    ),
  ]);

const list = (found: readonly CellFunction[], actions: Actions): HTMLElement =>
  h(
    'ul',
    { className: 'functions' },
    ...found.map((f) =>
      h(
        'li',
        {},
        button(typedName(f), () => void actions.changeLookup({ chosen: f.name }), 'link'),
        h('span', { className: 'hint' }, f.summary),
      ),
    ),
  );

function article(f: CellFunction, actions: Actions): Child[] {
  return [
    button('All functions', () => void actions.changeLookup({ chosen: '' }), 'small'),
    h('h3', {}, typedName(f)),
    h('p', {}, f.summary),
    h('p', {}, h('code', { className: 'signature' }, signature(f))),
    h(
      'dl',
      {},
      ...Object.entries(f.parameters).flatMap(([name, parameter]) => [
        h('dt', {}, name),
        h('dd', {}, parameterHelp(parameter)),
      ]),
      h('dt', {}, 'answer'),
      h('dd', {}, `${f.result.shape}, unit ${f.result.unit}`),
    ),
    f.caution !== undefined && h('p', { className: 'caution' }, f.caution),
    howItIsWorkedOut(f),
    h('p', { className: 'hint' }, `Reference: ${f.reference}`),
    readMore(f),
    h('p', { className: 'what' }, 'Example'),
    formulaLine({ formula: f.example.formula, sheet: '' }, actions),
  ];
}

/** Its page with equations, pictures and what helps when it refuses; beside the pane on whatever serves it. */
const readMore = (f: CellFunction): HTMLElement =>
  h(
    'p',
    {},
    h('a', { href: helpAddress(f), target: '_blank', rel: 'noopener' }, `All about ${typedName(f)}`),
  );
