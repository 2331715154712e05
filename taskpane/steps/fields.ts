/** Labelled controls, drawn the same way in every step. */
import { h, type Child } from '../h';
import { later } from '../later';

export interface TextField {
  readonly id: string;
  readonly label: string;
  readonly value: string;
  readonly unit?: string;
  /** What leaving it empty means, shown in the empty field. */
  readonly whenEmpty?: string;
  /** What is wrong with it, in words. */
  readonly problem?: string | null;
  readonly numeric?: boolean;
  readonly onInput: (value: string) => void;
  /** Takes the active cell in place of what is typed. */
  readonly onPoint?: () => void;
}

export function textField({
  id,
  label,
  value,
  unit,
  whenEmpty,
  problem,
  numeric = true,
  onInput,
  onPoint,
}: TextField): HTMLElement {
  const problemId = `${id}-problem`;
  const input = h('input', {
    id,
    type: 'text',
    inputmode: numeric ? 'decimal' : 'text',
    autocomplete: 'off',
    spellcheck: 'false',
    value,
    placeholder: whenEmpty,
    'aria-invalid': problem ? 'true' : null,
    'aria-describedby': problem ? problemId : null,
    oninput: (event) => onInput((event.target as HTMLInputElement).value),
  });
  return h(
    'div',
    { className: 'field' },
    h('label', { for: id }, unit ? `${label} / ${unit}` : label),
    onPoint ? h('div', { className: 'beside' }, input, pointButton(label, onPoint)) : input,
    problem && h('p', { id: problemId, className: 'problem', role: 'alert' }, problem),
  );
}

/** @param dimension cells are taken for a range, the active cell for one value */
export function pointButton(
  name: string,
  onPoint: () => void,
  dimension: 'scalar' | 'matrix' = 'scalar',
): HTMLElement {
  const isMany = dimension === 'matrix';
  return h(
    'button',
    {
      type: 'button',
      className: 'small',
      'aria-label': `${isMany ? 'Cells: take the selected ones' : 'Cell: take the active one'} for ${name}`,
      onclick: onPoint,
    },
    isMany ? 'Cells' : 'Cell',
  );
}

export interface Choice {
  readonly value: string;
  readonly label: string;
}

export function selectField(
  id: string,
  label: string,
  choices: readonly Choice[],
  chosen: string,
  onChange: (value: string) => void,
): HTMLElement {
  return h(
    'div',
    { className: 'field' },
    h('label', { for: id }, label),
    later(
      h('select', {
        id,
        'data-chosen': chosen,
        onchange: (event) => onChange((event.target as HTMLSelectElement).value),
      }),
      [JSON.stringify(choices)],
      () =>
        choices.map(({ value, label: words }) => h('option', { value, selected: value === chosen }, words)),
    ),
  );
}

/** A few choices side by side, one of them taken. */
export function choiceOfOne<Value extends string>(
  group: string,
  legend: string,
  choices: readonly (readonly [value: Value, label: string])[],
  chosen: Value,
  onChange: (value: Value) => void,
): HTMLElement {
  return h(
    'fieldset',
    { className: 'kinds' },
    h('legend', {}, legend),
    ...choices.map(([value, label]) => {
      const id = `${group}-${value.replace('.', '-')}`;
      return h(
        'label',
        { for: id },
        h('input', {
          id,
          type: 'radio',
          name: `flaskpace-${group}`,
          checked: value === chosen,
          onchange: () => onChange(value),
        }),
        h('span', {}, label),
      );
    }),
  );
}

export function checkField(
  id: string,
  label: string,
  checked: boolean,
  onChange: (checked: boolean) => void,
): HTMLElement {
  return h(
    'label',
    { className: 'check', for: id },
    h('input', {
      id,
      type: 'checkbox',
      checked,
      onchange: (event) => onChange((event.target as HTMLInputElement).checked),
    }),
    label,
  );
}

export function button(label: string, onClick: () => void, className = ''): HTMLElement {
  return h('button', { type: 'button', className, onclick: onClick }, label);
}

/** One step of the work, under its heading. */
export function step(id: string, title: string, ...children: readonly Child[]): HTMLElement {
  return h(
    'section',
    { id, 'aria-labelledby': `${id}-title` },
    h('h2', { id: `${id}-title`, tabindex: '-1' }, title),
    ...children,
  );
}
