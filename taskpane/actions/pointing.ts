/** Reads the cells that fields point at. */
import { parseArea } from '../../functions/address';
import { CellError, type CellRange } from '../../functions/cell';
import { pointedName } from '../calls/argument';
import type { State } from '../store';
import type { Bench } from './bench';

/** What is typed into the fields of all steps that take cells as well as numbers. */
const typedIn = ({ order }: State): readonly string[] => [order.endpoint];

/** Nothing is stored where nothing has changed, so that nothing is calculated again. */
export async function readPointedAt({ store, port }: Bench): Promise<void> {
  const { table, pointedAt } = store.state;
  if (!table) return;
  const names = typedIn(store.state).flatMap((typed) => pointedName(typed, table.sheet) ?? []);
  const found = new Map<string, CellRange>();
  for (const name of new Set(names)) {
    const area = { sheet: table.sheet, ...parseArea(name)! };
    const cells = await port.read(area).then(
      (reading) => reading.cells,
      (): CellRange => [[new CellError('#REF!', `there is no such place in the workbook: ${name}`)]],
    );
    found.set(name, cells);
  }
  if (!isSame(found, pointedAt)) store.change({ pointedAt: found });
}

const isSame = (a: State['pointedAt'], b: State['pointedAt']): boolean =>
  a.size === b.size && [...a].every(([name, cells]) => JSON.stringify(cells) === JSON.stringify(b.get(name)));
