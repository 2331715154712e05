/** Reads the cells that fields point at. */
import { parseArea } from '../../functions/address';
import { CellError, type CellRange } from '../../functions/cell';
import { pointedName } from '../calls/argument';
import { functionOf } from '../signals';
import type { State } from '../store';
import type { Bench } from './bench';

/** What the fields of all steps that take cells as well as numbers point at. */
function namesIn({ rate, order, reading, temperature }: State, sheet: string): readonly string[] {
  const parameters = functionOf(reading.what)?.parameters ?? {};
  const inputs = Object.entries(reading.inputs).map(([name, typed]) =>
    pointedName(typed, sheet, parameters[name]?.kind === 'text'),
  );
  const { kind: _, ...typed } = rate;
  const others = [...Object.values(typed), order.endpoint, temperature.at];
  return [...others.map((one) => pointedName(one, sheet)), ...inputs].flatMap((name) => name ?? []);
}

/** Nothing is stored where nothing has changed, so that nothing is calculated again. */
export async function readPointedAt({ store, port }: Bench): Promise<void> {
  const { table, pointedAt } = store.state;
  if (!table) return;
  const found = new Map<string, CellRange>();
  for (const name of new Set(namesIn(store.state, table.sheet))) {
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
