/** Numbers and lists as findings say them. */
import { shown } from '../../errors';

/** A number that was worked out: three significant digits say enough. */
export const roughly = (value: number): string => shown(Number(value.toPrecision(3)));

export const percent = (share: number): string => `${roughly(100 * share)} %`;

/** `one reading`, `4 readings`. */
export const counted = (count: number, thing: string, things = `${thing}s`): string =>
  count === 1 ? `one ${thing}` : `${count} ${things}`;

/** `a, b and c`; a long list is cut, and says so. */
export function listed(items: readonly string[], longest = 6): string {
  const said = items.length > longest ? items.slice(0, longest - 1) : items;
  const rest = items.length - said.length;
  const all = rest > 0 ? [...said, `${rest} more`] : said;
  return all.length < 2 ? all.join('') : `${all.slice(0, -1).join(', ')} and ${all[all.length - 1]}`;
}
