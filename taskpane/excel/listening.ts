/** What the person does in Excel: where they are, and which formula stands there. */
import type { ActiveCell } from '../port';

/** Registering takes a round trip; whoever stops before it is over is stopped all the same. */
export function onSelection(listener: () => void): () => void {
  const registration = Excel.run(async (context) => {
    const handler = context.workbook.onSelectionChanged.add(async () => listener());
    await context.sync();
    return handler;
  });
  registration.catch(() => undefined); // the pane works without it, through its own button
  return () => {
    registration
      .then((handler) =>
        Excel.run(handler.context, async (context) => {
          handler.remove();
          await context.sync();
        }),
      )
      .catch(() => undefined);
  };
}

/** Excel tells nothing of what is being typed. */
export function onActiveCell(listener: (cell: ActiveCell | null) => void): () => void {
  let asked = 0;
  const look = async (): Promise<void> => {
    const mine = ++asked;
    const found = await Excel.run(readActiveCell).catch(() => null); // a chart is selected, or a cell is edited
    if (mine === asked) listener(found);
  };
  const stop = onSelection(() => void look());
  void look();
  return () => {
    asked++;
    stop();
  };
}

async function readActiveCell(context: Excel.RequestContext): Promise<ActiveCell> {
  const cell = context.workbook.getActiveCell();
  const sheet = context.workbook.worksheets.getActiveWorksheet();
  cell.load({ formulas: true, rowIndex: true, columnIndex: true });
  sheet.load({ name: true });
  await context.sync();
  const [[typed]] = cell.formulas as unknown[][];
  return {
    at: { sheet: sheet.name, row: cell.rowIndex, column: cell.columnIndex, rows: 1, columns: 1 },
    formula: typeof typed === 'string' && typed.startsWith('=') ? typed : null,
  };
}
