/** A value with its uncertainty, drawn the same way in every step. */
import type { Estimate } from '../calls/estimate';
import { plainNumber, valueWithUncertainty } from '../../functions/format';
import { h, type Child } from '../h';

/** `rate at 30 s`, the value with its unit, and the limits in words. */
export const estimateLines = (what: string, estimate: Estimate, unit: string): Child[] => [
  ...valueLines(what, estimate, unit),
  h('p', { className: 'hint' }, limitsInWords(estimate)),
];

export const valueLines = (what: string, { value, uncertainty }: Estimate, unit: string): Child[] => [
  h('p', { className: 'what' }, what),
  h(
    'p',
    { className: 'value' },
    valueWithUncertainty(value, uncertainty),
    ' ',
    h('span', { className: 'unit' }, unit),
  ),
];

export function limitsInWords({ uncertainty, lower, upper, degreesOfFreedom }: Estimate): string {
  if (uncertainty === null && lower === null && upper === null)
    return 'no uncertainty: too few readings to judge their scatter by';
  const freedom = degreesOfFreedom === null ? '' : `; ${plainNumber(degreesOfFreedom, 3)} degrees of freedom`;
  const limit = (value: number | null): string => (value === null ? 'no limit' : plainNumber(value));
  return `± is one standard uncertainty. 95 % limits ${limit(lower)} to ${limit(upper)}${freedom}`;
}

/** What is said at once, to a screen reader as well, whenever it changes. */
export const result = (...children: readonly Child[]): HTMLElement =>
  h('div', { className: 'result', role: 'status', 'aria-atomic': 'true' }, ...children);
