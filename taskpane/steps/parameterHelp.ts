/** What a parameter's own definition says of it, in one line. */
import { asRead } from '../../functions/documented';
import { boundsInWords, type Parameter } from '../../functions/parameters';

/** `of the gas; unit °C; above -273.15` */
export function parameterHelp({ help, unit, bounds, optional, whenOmitted }: Parameter): string {
  const hasNone = unit === '1' || unit === 'any' || unit === 'text';
  return [
    help,
    hasNone ? '' : `unit ${asRead(unit)}`,
    bounds ? boundsInWords(bounds) : '',
    optional ? `left empty: ${asRead(whenOmitted ?? 'not used')}` : '',
  ]
    .filter(Boolean)
    .join('; ');
}
