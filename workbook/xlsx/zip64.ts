/**
 * Sizes and places that a zip file writes in 64 bits (PKWARE APPNOTE 6.3, 4.3.14 to 4.5.3): for large files, and
 * by programs that could not know how large theirs would be. What is written back goes without.
 */
const signature = { end: 0x06064b50, locator: 0x07064b50 };
const extraField = 1;
/** Stands in the 32 bits of what is written in 64. */
const isElsewhere = (value: number): boolean => value === 0xffffffff;
const length = { central: 46, locator: 20 };

const wide = (view: DataView, at: number): number => Number(view.getBigUint64(at, true));

/** Number of entries and start of the central directory. @param end of the record that ends the file */
export function directoryAt(view: DataView, end: number): { readonly count: number; readonly start: number } {
  const locator = end - length.locator;
  if (locator < 0 || view.getUint32(locator, true) !== signature.locator)
    return { count: view.getUint16(end + 10, true), start: view.getUint32(end + 16, true) };
  const record = wide(view, locator + 8);
  if (view.getUint32(record, true) !== signature.end) throw new RangeError('no record at its place');
  return { count: wide(view, record + 32), start: wide(view, record + 48) };
}

export interface Measures {
  readonly size: number;
  readonly packedSize: number;
  /** Of the local header. */
  readonly offset: number;
  /** The header without the 64 bits. */
  readonly central: Uint8Array;
}

/** @param central an entry's header in the central directory, with name and extra fields */
export function measuresOf(central: Uint8Array): Measures {
  const view = new DataView(central.buffer, central.byteOffset, central.byteLength);
  const narrow = [24, 20, 42].map((at) => view.getUint32(at, true));
  const extra = length.central + view.getUint16(28, true);
  const end = extra + view.getUint16(30, true);
  for (let at = extra; at + 4 <= end; at += 4 + view.getUint16(at + 2, true)) {
    if (view.getUint16(at, true) !== extraField) continue;
    let next = at + 4;
    const [size, packedSize, offset] = narrow.map((value) => {
      if (!isElsewhere(value)) return value;
      next += 8;
      return wide(view, next - 8);
    });
    return { size, packedSize, offset, central: without(central, at, at + 4 + view.getUint16(at + 2, true)) };
  }
  const [size, packedSize, offset] = narrow;
  return { size, packedSize, offset, central };
}

function without(central: Uint8Array, start: number, end: number): Uint8Array {
  const kept = new Uint8Array(central.length - (end - start));
  kept.set(central.subarray(0, start));
  kept.set(central.subarray(end), start);
  const view = new DataView(kept.buffer);
  view.setUint16(30, view.getUint16(30, true) - (end - start), true);
  return kept;
}
