/** One of the table's columns, by its letter and heading; a row by its number where the runs stand in rows. */
import type { Table, TableColumn } from '../runs';
import { lineName, unnamed } from '../turned';
import { selectField, type Choice } from './fields';

/** `B: V / mL`. */
export const lineLabel = ({ column, heading }: TableColumn, isTurned: boolean): string =>
  heading.text === unnamed(column, isTurned)
    ? heading.text
    : `${lineName(column, isTurned)}: ${heading.text}`;

/** @param none stands first where no column need be chosen, and gives `null` */
export function columnField<None extends Choice | undefined = undefined>(
  id: string,
  label: string,
  { columns, isTurned }: Table,
  chosen: number | null,
  choose: (column: None extends Choice ? number | null : number) => Promise<void>,
  none?: None,
): HTMLElement {
  const choices = columns.map((one): Choice => ({
    value: String(one.column),
    label: lineLabel(one, isTurned),
  }));
  const all = none ? [none, ...choices] : choices;
  return selectField(id, label, all, chosen === null ? '' : String(chosen), (value) => {
    const column = value === '' ? null : Number(value);
    void choose(column as Parameters<typeof choose>[0]);
  });
}
