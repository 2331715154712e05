/** The workbook on the page as a document: opened, changed, saved. */
import type { BookModel, CalculatedBook } from '../engine/engine';
import type { Grid } from '../engine/grid';
import { chooseFile, saveFile } from './files';
import { ask } from './question';

/** How a workbook becomes a file and back. */
export interface FileFormat {
  /** @throws an Error whose words say what is wrong with the file */
  read(bytes: Uint8Array): BookModel;
  create(book: BookModel, calculated: CalculatedBook): Uint8Array;
  /** What the updated file can be called: one that has to be made anew is an .xlsx. */
  nameOf(name: string, before: BookModel, now: BookModel): string;
  /** The original with what has changed since, and everything else in it as it was. */
  update(original: Uint8Array, before: BookModel, now: BookModel, calculated: CalculatedBook): Updated;
}

export interface Updated {
  readonly bytes: Uint8Array;
  /** What could not be put into the file, in words. */
  readonly missing?: string;
}

export interface DocumentView {
  showFile(name: string, isUnsaved: boolean): void;
  say(words: string, tone?: 'good' | 'bad'): void;
}

export interface Documents {
  open(): Promise<void>;
  saveAs(): Promise<void>;
  demo(): Promise<void>;
  /** The workbook as a file would hold it now. */
  file(): Promise<Updated>;
  readonly name: string;
  readonly isUnsaved: boolean;
}

interface Shown {
  readonly name: string;
  /** The file it was opened from, and what stood in it; a demo comes from none. */
  readonly original?: { readonly bytes: Uint8Array; readonly book: BookModel };
}

const demoName = 'demo.xlsx';

/** @param grid shows the demo now */
export function documentsOf(
  grid: Grid,
  format: FileFormat,
  demoWorkbook: () => BookModel,
  view: DocumentView,
): Documents {
  let shown: Shown = { name: demoName };
  let isUnsaved = false;
  const mark = (unsaved: boolean): void => {
    isUnsaved = unsaved;
    view.showFile(shown.name, isUnsaved);
  };
  mark(false);
  grid.onEdit(() => mark(true));

  /** What goes wrong with a file is said in one sentence, and the sheet stays as it is. */
  const guarded = (action: () => Promise<void>, failed: string) => async (): Promise<void> => {
    view.say('');
    try {
      await action();
    } catch (error) {
      view.say(`${failed}: ${error instanceof Error ? error.message : String(error)}`, 'bad');
    }
  };

  async function show(name: string, book: BookModel, bytes?: Uint8Array): Promise<void> {
    await grid.open(book);
    selectFirstNumber(grid, book);
    // as the grid tells it, so that nothing counts as changed which only reads differently there
    shown = { name, ...(bytes && { original: { bytes, book: grid.book() } }) };
    mark(false);
    grid.focus();
  }

  async function mayReplace(): Promise<boolean> {
    await grid.settled(); // what is being typed is work as well
    if (!isUnsaved) return true;
    const answer = await ask(`${shown.name} holds changes that are not saved.`, [
      'Save as…',
      'Go on without saving',
      'Stay here',
    ]);
    if (answer === 'Save as…') return save();
    return answer === 'Go on without saving';
  }

  async function open(): Promise<void> {
    const file = await chooseFile();
    if (!file) return;
    const book = format.read(file.bytes);
    if (await mayReplace()) await show(file.name, book, file.bytes);
  }

  async function fileNow(): Promise<Updated> {
    await grid.settled();
    const [now, calculated] = [grid.book(), grid.calculated()];
    const { original } = shown;
    return original
      ? format.update(original.bytes, original.book, now, calculated)
      : { bytes: format.create(now, calculated) };
  }

  /** @returns whether it was saved */
  async function save(): Promise<boolean> {
    let missing: string | undefined;
    const { original } = shown;
    const suggested = original ? format.nameOf(shown.name, original.book, grid.book()) : shown.name;
    const name = await saveFile(suggested, async () => {
      const file = await fileNow();
      missing = file.missing;
      return file.bytes;
    });
    if (name === null) return false;
    shown = { ...shown, name };
    mark(false);
    grid.focus();
    view.say([`saved as ${name}`, missing].filter(Boolean).join('; '), missing ? 'bad' : 'good');
    return true;
  }

  async function demo(): Promise<void> {
    if (await mayReplace()) await show(demoName, demoWorkbook());
  }

  return {
    open: guarded(open, 'the file was not opened'),
    saveAs: guarded(async () => void (await save()), 'the file was not saved'),
    demo: guarded(demo, 'the demo was not opened'),
    file: fileNow,
    get name() {
      return shown.name;
    },
    get isUnsaved() {
      return isUnsaved;
    },
  };
}

/** Where the work begins: the pane finds the run around it. */
export function selectFirstNumber(grid: Grid, { sheets: [sheet] }: BookModel): void {
  const numbers = sheet.cells.filter((cell) => typeof cell.value === 'number' && cell.formula === undefined);
  const first = numbers.reduce<BookModel['sheets'][number]['cells'][number] | undefined>(
    (best, cell) =>
      !best || cell.row < best.row || (cell.row === best.row && cell.column < best.column) ? cell : best,
    undefined,
  );
  if (first) grid.select({ sheet: sheet.name, row: first.row, column: first.column, rows: 1, columns: 1 });
}
