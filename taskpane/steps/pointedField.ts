/** A field that takes a number, words with a unit, or cells: typed, or pointed at in the sheet. */
import { asRead } from '../../functions/documented';
import type { Parameter } from '../../functions/parameters';
import { isUnit } from '../../src/units';
import type { Actions } from '../actions';
import { h } from '../h';
import { checkField, pointButton } from './fields';
import { parameterHelp } from './parameterHelp';

export interface PointedField {
  readonly id: string;
  readonly name: string;
  readonly parameter: Parameter;
  readonly value: string;
  readonly problem: string | null;
  readonly change: (typed: string) => Promise<void>;
}

/** All of its words come from the parameter's own definition. */
export function pointedField(
  { id, name, parameter, value, problem, change }: PointedField,
  actions: Actions,
): HTMLElement {
  const { unit, optional, whenOmitted, dimension, kind } = parameter;
  if (kind === 'flag')
    return h(
      'div',
      { className: 'field' },
      checkField(id, `${name}: ${parameter.help}`, value === 'TRUE', (on) => void change(on ? 'TRUE' : '')),
    );
  const [helpId, problemId] = [`${id}-help`, `${id}-problem`];
  return h(
    'div',
    { className: 'field' },
    h('label', { for: id }, isUnit(unit) ? `${name} / ${asRead(unit)}` : name),
    h(
      'div',
      { className: 'beside' },
      h('input', {
        id,
        type: 'text',
        autocomplete: 'off',
        spellcheck: 'false',
        value,
        placeholder: optional ? whenOmitted : null,
        'aria-required': optional ? null : 'true',
        'aria-invalid': problem ? 'true' : null,
        'aria-describedby': problem ? `${helpId} ${problemId}` : helpId,
        oninput: (event) => void change((event.target as HTMLInputElement).value),
      }),
      pointButton(
        name,
        () => void actions.pointAt(dimension === 'matrix' ? 'selection' : 'cell', change),
        dimension,
      ),
    ),
    h('p', { id: helpId, className: 'hint' }, parameterHelp(parameter)),
    problem && h('p', { id: problemId, className: 'problem', role: 'alert' }, problem),
  );
}
