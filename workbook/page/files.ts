/** Files in and out through the browser. */
import { h } from '../../taskpane/h';
import { kindNamed, plainKind, workbookKinds } from '../xlsx/kinds';

export interface OpenedFile {
  readonly name: string;
  readonly bytes: Uint8Array;
}

/** Asks for one workbook. @returns `null` when the person thought better of it */
export function chooseFile(): Promise<OpenedFile | null> {
  const accept = workbookKinds.flatMap(({ extension, mediaType }) => [extension, mediaType]).join(',');
  const input = h('input', { type: 'file', accept });
  return new Promise((resolve, reject) => {
    input.oncancel = () => resolve(null);
    input.onchange = () => {
      const file = input.files?.[0];
      if (!file) resolve(null);
      else
        file
          .arrayBuffer()
          .then((bytes) => resolve({ name: file.name, bytes: new Uint8Array(bytes) }), reject);
    };
    input.click();
  });
}

/** The part of the file picker that is used; not every browser has one. */
interface SavePicker {
  showSaveFilePicker?(options: {
    suggestedName: string;
    types: readonly { description: string; accept: Readonly<Record<string, readonly string[]>> }[];
  }): Promise<{
    readonly name: string;
    createWritable(): Promise<{ write(data: Blob): Promise<void>; close(): Promise<void> }>;
  }>;
}

/**
 * Saves where the person says, or into the downloads where the browser cannot ask.
 * @param bytes asked for once the place is known
 * @returns the name of the file, or `null` when the person thought better of it
 */
export async function saveFile(
  suggestedName: string,
  bytes: () => Promise<Uint8Array>,
): Promise<string | null> {
  const { showSaveFilePicker } = window as SavePicker;
  const { extension, mediaType } = kindNamed(suggestedName) ?? plainKind;
  const blobOf = (content: Uint8Array): Blob =>
    new Blob([content as Uint8Array<ArrayBuffer>], { type: mediaType });
  if (!showSaveFilePicker) return download(suggestedName, blobOf(await bytes()));
  try {
    const place = await showSaveFilePicker.call(window, {
      suggestedName,
      types: [{ description: 'Workbook', accept: { [mediaType]: [extension] } }],
    });
    const content = blobOf(await bytes()); // before the file is opened for writing, which empties it
    const file = await place.createWritable();
    await file.write(content);
    await file.close();
    return place.name;
  } catch (error) {
    if (error instanceof DOMException && error.name === 'AbortError') return null;
    throw error;
  }
}

function download(name: string, content: Blob): string {
  const address = URL.createObjectURL(content);
  h('a', { href: address, download: name }).click();
  setTimeout(() => URL.revokeObjectURL(address), 60_000); // the browser has it by then
  return name;
}
