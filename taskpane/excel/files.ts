/** The workbook as a file: its bytes through Office.js, and a copy opened beside it. */
import type { WorkbookFiles } from '../port';
import { answered } from './answered';

/** No host hands over larger slices than all of them do (on an iPad, 64 KiB). */
const sliceSize = 65_536;

export const excelFiles: WorkbookFiles = {
  gives: 'opens as a new workbook, not saved yet',
  verb: 'Open the copy',
  read: async () => ({ bytes: await wholeFile() }),
  async give(bytes) {
    await Excel.createWorkbook(base64(bytes));
    return 'the copy is open in a window of its own: save it from there';
  },
};

async function wholeFile(): Promise<Uint8Array> {
  const { document } = Office.context;
  const file = await answered<Office.File>((done) =>
    document.getFileAsync(Office.FileType.Compressed, { sliceSize }, done),
  );
  try {
    const bytes = new Uint8Array(file.size);
    for (let place = 0, filled = 0; place < file.sliceCount; place++) {
      const { data } = await answered<Office.Slice>((done) => file.getSliceAsync(place, done));
      bytes.set(data as ArrayLike<number>, filled);
      filled += (data as ArrayLike<number>).length;
    }
    return bytes;
  } finally {
    await answered<void>((done) => file.closeAsync(done)); // Office keeps two at most
  }
}

/** Divisible by three, so that the pieces join without padding between them; and no more than a call takes arguments. */
const piece = 24_576;

function base64(bytes: Uint8Array): string {
  const pieces: string[] = [];
  for (let from = 0; from < bytes.length; from += piece)
    pieces.push(btoa(String.fromCharCode(...bytes.subarray(from, from + piece))));
  return pieces.join('');
}
