/** What every workbook port must do. Each implementation runs these same tests. */
import { CellError, type CellValue } from '../../functions/cell';
import { parseArea } from '../../functions/address';
import { CellsInUse, type CellToWrite, type SheetArea, type WorkbookPort } from '../../taskpane/port';

/** One workbook under test. */
export interface PortBench {
  readonly port: WorkbookPort;
  /** Selects as a person would; the active cell is the first of the area. */
  select(reference: string): void | Promise<void>;
  /** Of one cell, `General` where it has none of its own. */
  numberFormat(reference: string): string | Promise<string>;
  dispose?(): void | Promise<void>;
}

/** Rows of values from A1 on, by sheet, the first sheet shown; errors by their code as `CellError`. */
export type BenchSheets = Readonly<Record<string, readonly (readonly CellValue[])[]>>;

const area = (reference: string): SheetArea => ({ sheet: 'Gas run', ...parseArea(reference)! });
const bare = (names: readonly string[]): string[] =>
  names.map((name) => name.replace(/^.*!/, '').replace(/\$/g, ''));
const value = (reference: string, content: CellValue): CellToWrite => ({
  area: area(reference),
  content: { value: content },
});
const formula = (reference: string, typed: string, rows = 1, columns = 1): CellToWrite => ({
  area: area(reference),
  content: { formula: typed },
  ...(rows * columns > 1 ? { spills: { rows, columns } } : {}),
});

const sheets: BenchSheets = {
  'Gas run': [
    ['t / s', 'V / mL', null, 'note'],
    [0, 0, null, true],
    [10, 4.5, null, null],
    [20, null, null, null],
    [30, 12.25, null, null],
  ],
  Empty: [],
};

export function portContract(
  name: string,
  open: (sheets: BenchSheets) => PortBench | Promise<PortBench>,
): void {
  describe(`${name} keeps the workbook port's contract`, () => {
    let bench: PortBench;
    let port: WorkbookPort;

    beforeEach(async () => {
      bench = await open(sheets);
      port = bench.port;
    });
    afterEach(() => bench.dispose?.());

    const cellsIn = async (reference: string): Promise<CellValue[][]> =>
      (await port.read(area(reference))).cells.map((row) => [...row]);
    const plain = { overwrite: false, description: 'a test' };
    const forced = { overwrite: true, description: 'a test' };

    test('read gives numbers, words, truth values, and null for a blank', async () => {
      expect(await cellsIn('A1:D4')).toEqual(sheets['Gas run'].slice(0, 4));
    });

    test('read keeps the area it was asked for', async () => {
      expect((await port.read(area('B2:B3'))).area).toEqual(area('B2:B3'));
    });

    test('a sheet that is not there is refused by name', async () => {
      await expect(port.read({ ...area('A1'), sheet: 'Elsewhere' })).rejects.toThrow('Elsewhere');
    });

    test('selection is trimmed to what is used', async () => {
      await bench.select("'Gas run'!A1:B400");
      const selection = await port.selection();
      expect(selection?.area).toEqual(area('A1:B5'));
      expect(selection?.cells[4]).toEqual([30, 12.25]);
    });

    test('selection is null where nothing is filled', async () => {
      await bench.select("'Gas run'!H20:J30");
      expect(await port.selection()).toBeNull();
    });

    test('regionAroundActiveCell grows until blank rows and columns', async () => {
      await bench.select("'Gas run'!A3");
      expect((await port.regionAroundActiveCell())?.area).toEqual(area('A1:B5'));
    });

    test('regionAroundActiveCell is null in an empty part of the sheet', async () => {
      await bench.select("'Gas run'!H20");
      expect(await port.regionAroundActiveCell()).toBeNull();
    });

    test('activeCell is there, filled or not', async () => {
      await bench.select("'Gas run'!H20");
      expect(await port.activeCell()).toEqual(area('H20'));
    });

    test('onSelectionChange tells, until it is stopped', async () => {
      const listener = jest.fn();
      const stop = port.onSelectionChange(listener);
      await settled();
      await bench.select("'Gas run'!B2");
      await settled();
      expect(listener).toHaveBeenCalled();
      stop();
      await settled();
      listener.mockClear();
      await bench.select("'Gas run'!B3");
      await settled();
      expect(listener).not.toHaveBeenCalled();
    });

    test('occupied names filled cells one by one', async () => {
      expect(bare(await port.occupied(area('B3:D5')))).toEqual(['B3', 'B5']);
      expect(await port.occupied(area('F1:G9'))).toEqual([]);
    });

    test('write fills free cells, words as words', async () => {
      await port.write([value('F1', '1/2 t'), value('F2', 3.5), value('F3', false)], plain);
      expect(await cellsIn('F1:F3')).toEqual([['1/2 t'], [3.5], [false]]);
    });

    test('write over filled cells is refused, names them, and writes nothing at all', async () => {
      const refused = port.write([value('F2', 1), value('B3', 2)], plain);
      await expect(refused).rejects.toBeInstanceOf(CellsInUse);
      await refused.catch((error: CellsInUse) => expect(bare(error.areas)).toEqual(['B3']));
      expect(await cellsIn('F2')).toEqual([[null]]);
      expect(await cellsIn('B3')).toEqual([[4.5]]);
    });

    test('a formula that would spill over filled cells is refused', async () => {
      await expect(port.write([formula('C2', '={1;2;3}&""', 3, 2)], plain)).rejects.toBeInstanceOf(
        CellsInUse,
      );
      expect(await cellsIn('C2')).toEqual([[null]]);
    });

    test('a formula makes its cell occupied', async () => {
      await port.write([formula('F2', '=1+1')], plain);
      expect(bare(await port.occupied(area('F1:F3')))).toEqual(['F2']);
    });

    test('write replaces when told to, and undo puts back', async () => {
      const receipt = await port.write([value('B3', 99), formula('B5', '=2+2')], forced);
      expect(await cellsIn('B3')).toEqual([[99]]);
      await port.undo(receipt);
      expect(await cellsIn('B3:B5')).toEqual([[4.5], [null], [12.25]]);
    });

    test('undo empties what was empty', async () => {
      const receipt = await port.write([value('F1', 'rate'), formula('F2', '=SEQUENCE(3)', 3, 1)], plain);
      await port.undo(receipt);
      expect(await port.occupied(area('F1:F4'))).toEqual([]);
    });

    test('undo brings a formula back, not its value', async () => {
      await port.write([formula('F2', '=1+1')], plain);
      const receipt = await port.write([value('F2', 7)], forced);
      await port.undo(receipt);
      expect(bare(await port.occupied(area('F2')))).toEqual(['F2']);
      expect(await cellsIn('F2')).not.toEqual([[7]]);
    });

    const formatsIn = (...references: string[]): Promise<string[]> =>
      Promise.all(references.map(async (one) => bench.numberFormat(`'Gas run'!${one}`)));
    const table: CellToWrite = {
      ...formula('F2', '={1,2;3,4}', 2, 2),
      numberFormats: [
        ['0.00', null],
        ['0.00', '0.0E+00'],
      ],
    };

    test('number formats reach as far as the formula, where they are given', async () => {
      await port.write([value('F1', 'rate'), table], plain);
      expect(await formatsIn('F1', 'F2', 'F3', 'G2', 'G3')).toEqual([
        'General',
        '0.00',
        '0.00',
        'General',
        '0.0E+00',
      ]);
    });

    test('undo brings back the formats that were there, and those that were not', async () => {
      await port.write([{ ...value('F2', 3.5), numberFormats: [['0.000']] }], plain);
      const receipt = await port.write([table], forced);
      expect(await formatsIn('F2')).toEqual(['0.00']);
      await port.undo(receipt);
      expect(await formatsIn('F2', 'F3', 'G3')).toEqual(['0.000', 'General', 'General']);
      expect(await cellsIn('F2:G3')).toEqual([
        [3.5, null],
        [null, null],
      ]);
    });

    test('a receipt says what was done and where', async () => {
      const receipt = await port.write([value('F1', 'rate'), value('F2', 3)], {
        ...plain,
        description: 'rate in F2',
      });
      expect(receipt.description).toBe('rate in F2');
      expect(receipt.area.sheet).toBe('Gas run');
    });

    test('reveal moves to the cell, and selects all that is named', async () => {
      await port.reveal(area('B4'));
      expect(await port.activeCell()).toEqual(area('B4'));
      await port.reveal(area('A2:B4'));
      expect((await port.selection())?.area).toEqual(area('A2:B4'));
    });

    test('onActiveCell tells the cell and its formula, at once and when it is another', async () => {
      await port.write([formula('F2', '=1+1')], plain);
      await bench.select("'Gas run'!F2");
      const told: unknown[] = [];
      const stop = port.onActiveCell((cell) => told.push(cell));
      await until(() => told.length > 0);
      expect(told.at(-1)).toEqual({ at: area('F2'), formula: '=1+1' });
      await bench.select("'Gas run'!A2");
      await until(() => (told.at(-1) as { formula: unknown }).formula === null);
      expect(told.at(-1)).toEqual({ at: area('A2'), formula: null });
      stop();
    });
  });
}

/** An error cell must come through as one; for ports whose workbook can be opened with one. */
export function portErrorCells(
  name: string,
  open: (sheets: BenchSheets) => PortBench | Promise<PortBench>,
): void {
  test(`${name} reads an error cell as an error`, async () => {
    const bench = await open({ 'Gas run': [[1, new CellError('#DIV/0!')]] });
    const { cells } = await bench.port.read(area('A1:B1'));
    expect(cells[0][1]).toMatchObject({ code: '#DIV/0!' });
    expect(cells[0][1]).toBeInstanceOf(CellError);
    await bench.dispose?.();
  });
}

/** Gives up after a while: the expectation that follows says what is there instead. */
async function until(isTrue: () => boolean): Promise<void> {
  for (let tries = 0; !isTrue() && tries < 200; tries++) await settled();
}

const settled = (): Promise<void> => new Promise((resolve) => setTimeout(resolve, 20));
