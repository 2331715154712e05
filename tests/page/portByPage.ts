/** The port of the page, as a port on this side: every call crosses into the browser. */
import { CellError, type CellValue, type ErrorCode } from '../../functions/cell';
import { CellsInUse, type RangeReading, type WorkbookPort, type WriteReceipt } from '../../taskpane/port';
import type { Page } from 'playwright-core';

/** Only plain data crosses: an error object is known on the other side by what it holds. */
interface CrossedError {
  readonly isCellError: true;
  readonly code: ErrorCode;
  readonly message: string;
}

type Outcome = { readonly value: unknown } | { readonly error: string; readonly areas?: readonly string[] };

const reborn = (cell: CellValue | CrossedError): CellValue =>
  typeof cell === 'object' && cell !== null && 'isCellError' in cell
    ? new CellError(cell.code, cell.message)
    : cell;

export async function portByPage(page: Page): Promise<WorkbookPort> {
  const listeners = new Set<() => void>();
  let watchers = 0;
  await page.exposeFunction('selectionMoved', () => listeners.forEach((listener) => listener()));
  await page.evaluate(() =>
    window.flaskpace.port.onSelectionChange(
      () => void (window as unknown as { selectionMoved(): void }).selectionMoved(),
    ),
  );

  async function call<T>(method: keyof WorkbookPort, ...args: readonly unknown[]): Promise<T> {
    const outcome = await page.evaluate(
      async ([name, given]): Promise<Outcome> => {
        const port = window.flaskpace.port as unknown as Record<
          string,
          (...all: readonly unknown[]) => Promise<unknown>
        >;
        const marked = (value: unknown): unknown => {
          if (Array.isArray(value)) return value.map(marked);
          if (typeof value !== 'object' || value === null) return value;
          const entries = Object.entries(value).map(([key, part]) => [key, marked(part)] as const);
          const isPlain = Object.getPrototypeOf(value) === Object.prototype;
          return { ...Object.fromEntries(entries), ...(isPlain ? {} : { isCellError: true }) };
        };
        try {
          return { value: marked(await port[name](...given)) };
        } catch (error) {
          const { message, areas } = error as Error & { areas?: readonly string[] };
          return { error: message, ...(areas && { areas }) };
        }
      },
      [method, args] as const,
    );
    if ('value' in outcome) return outcome.value as T;
    throw outcome.areas ? new CellsInUse(outcome.areas) : new Error(outcome.error);
  }

  const reading = (crossed: RangeReading): RangeReading => ({
    area: crossed.area,
    cells: crossed.cells.map((row) => row.map(reborn)),
  });
  const readingOrNone = (crossed: RangeReading | null): RangeReading | null => crossed && reading(crossed);

  return {
    host: await page.evaluate(() => window.flaskpace.port.host),
    canChart: await page.evaluate(() => window.flaskpace.port.canChart),
    selection: () => call<RangeReading | null>('selection').then(readingOrNone),
    regionAroundActiveCell: () => call<RangeReading | null>('regionAroundActiveCell').then(readingOrNone),
    activeCell: () => call('activeCell'),
    read: (area) => call<RangeReading>('read', area).then(reading),
    onSelectionChange(listener) {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    onActiveCell(listener) {
      const name = `activeCell${++watchers}`;
      void page.exposeFunction(name, listener).then(() =>
        page.evaluate((one) => {
          window.flaskpace.port.onActiveCell((cell) =>
            (window as unknown as Record<string, (cell: unknown) => void>)[one](cell),
          );
        }, name),
      );
      return () => undefined;
    },
    occupied: (area) => call('occupied', area),
    write: (cells, options) => call<WriteReceipt>('write', cells, options),
    undo: (receipt) => call('undo', receipt),
    reveal: (area) => call('reveal', area),
  };
}
