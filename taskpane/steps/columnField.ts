/** One of the table's columns, by its letter and heading. */
import { columnName } from '../../functions/address';
import type { Table } from '../runs';
import { selectField, type Choice } from './fields';

/** @param none stands first where no column need be chosen, and gives `null` */
export function columnField<None extends Choice | undefined = undefined>(
  id: string,
  label: string,
  table: Table,
  chosen: number | null,
  choose: (column: None extends Choice ? number | null : number) => Promise<void>,
  none?: None,
): HTMLElement {
  const choices = table.columns.map(({ column, heading }): Choice => {
    const named =
      heading.text === `column ${columnName(column)}`
        ? heading.text
        : `${columnName(column)}: ${heading.text}`;
    return { value: String(column), label: named };
  });
  const all = none ? [none, ...choices] : choices;
  return selectField(id, label, all, chosen === null ? '' : String(chosen), (value) => {
    const column = value === '' ? null : Number(value);
    void choose(column as Parameters<typeof choose>[0]);
  });
}
