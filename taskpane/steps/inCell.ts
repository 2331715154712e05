/** A formula of ours that stands in the active cell, explained part by part, with the cells that it reads. */
import { cellName } from '../../functions/address';
import type { Actions } from '../actions';
import { h } from '../h';
import { step } from './fields';
import type { Chosen } from '../store';
import { formulaLine } from './formulaLine';

/** A place of its own, so that what follows stays what it is when a formula comes and goes. */
export const inCell = (chosen: Chosen | null, actions: Actions): HTMLElement =>
  h('div', { className: 'chosen' }, chosen && explained(chosen, actions));

const explained = ({ formula, at }: Chosen, actions: Actions): HTMLElement =>
  step(
    'in-cell',
    `In cell ${cellName(at.row, at.column)}`,
    formulaLine({ formula, sheet: at.sheet, id: 'formula-in-cell' }, actions),
  );
