/**
 * A package as it lies in its file: entries in their order, each with its own compressed bytes, so that what
 * is not replaced is written back exactly as it came (PKWARE APPNOTE 6.3, sections 4.3 and 4.4).
 */
import { deflateSync, inflateSync } from 'fflate';
import { crc32 } from './crc32';
import { NotAWorkbook } from './notAWorkbook';
import { directoryAt, measuresOf } from './zip64';

interface Entry {
  readonly name: string;
  /** Method, time, date and the rest of the central header, as they came. */
  readonly central: Uint8Array;
  readonly flags: number;
  readonly method: number;
  readonly checksum: number;
  readonly size: number;
  readonly packed: Uint8Array;
}

const signature = { local: 0x04034b50, central: 0x02014b50, end: 0x06054b50 };
const length = { local: 30, central: 46, end: 22 };
const method = { stored: 0, deflated: 8 };
const flag = { encrypted: 1, sizesFollow: 8, utf8: 0x800 };
const broken = 'the file is not a whole zip package: it may be cut off or damaged';

/** Change a part, remove it (`null`) or add one; nothing is written until `bytes`. */
export class Package {
  private readonly changes = new Map<string, Uint8Array | null>();

  private constructor(
    private readonly original: Uint8Array,
    private readonly entries: readonly Entry[],
  ) {}

  /** @throws NotAWorkbook for what is not a zip package, or a broken one */
  static open(bytes: Uint8Array): Package {
    return new Package(bytes, readEntries(bytes));
  }

  has(name: string): boolean {
    const change = this.changes.get(name);
    return change !== undefined ? change !== null : this.entries.some((entry) => entry.name === name);
  }

  /** Of all parts that are there now. */
  names(): string[] {
    const all = new Set([...this.entries.map(({ name }) => name), ...this.changes.keys()]);
    return [...all].filter((name) => this.has(name));
  }

  /** @throws NotAWorkbook when the part is missing or damaged */
  read(name: string): Uint8Array {
    const change = this.changes.get(name);
    if (change) return change;
    const entry = this.entries.find((e) => e.name === name);
    if (!entry || change === null) throw new NotAWorkbook(`a part of the workbook is missing: ${name}`);
    return unpack(entry);
  }

  write(name: string, content: Uint8Array): void {
    this.changes.set(name, content);
  }

  remove(name: string): void {
    this.changes.set(name, null);
  }

  bytes(): Uint8Array {
    if (this.changes.size === 0) return this.original;
    const kept = this.entries.filter(({ name }) => this.changes.get(name) !== null);
    const changed = kept.map((entry) => {
      const content = this.changes.get(entry.name);
      return content ? packed(entry.name, content, entry.central) : entry;
    });
    const known = new Set(this.entries.map(({ name }) => name));
    const added = [...this.changes].flatMap(([name, content]) =>
      content && !known.has(name) ? [packed(name, content, kept[0].central)] : [],
    );
    return writeEntries([...changed, ...added]);
  }
}

function readEntries(bytes: Uint8Array): Entry[] {
  const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  try {
    const { count, start } = directoryAt(view, endOfDirectory(view));
    const entries: Entry[] = [];
    for (let at = start; entries.length < count; at += centralLength(view, at))
      entries.push(readEntry(bytes, view, at));
    return entries;
  } catch (error) {
    if (error instanceof RangeError) throw new NotAWorkbook(broken);
    throw error;
  }
}

function endOfDirectory(view: DataView): number {
  const furthest = Math.max(0, view.byteLength - length.end - 0xffff);
  for (let at = view.byteLength - length.end; at >= furthest; at--) {
    if (view.getUint32(at, true) === signature.end) return at;
  }
  throw new NotAWorkbook(broken);
}

const centralLength = (view: DataView, at: number): number =>
  length.central + [28, 30, 32].reduce((sum, field) => sum + view.getUint16(at + field, true), 0);

function readEntry(bytes: Uint8Array, view: DataView, at: number): Entry {
  if (view.getUint32(at, true) !== signature.central) throw new NotAWorkbook(broken);
  const flags = view.getUint16(at + 8, true);
  if (flags & flag.encrypted)
    throw new NotAWorkbook('the file is protected with a password: save it without one first');
  const nameEnd = at + length.central + view.getUint16(at + 28, true);
  const name = new TextDecoder().decode(bytes.subarray(at + length.central, nameEnd));
  const whole = bytes.subarray(at, at + centralLength(view, at));
  const { size, packedSize, offset: local, central } = measuresOf(whole);
  if (view.getUint32(local, true) !== signature.local) throw new NotAWorkbook(broken);
  const start = local + length.local + view.getUint16(local + 26, true) + view.getUint16(local + 28, true);
  if (start + packedSize > bytes.length) throw new NotAWorkbook(broken);
  return {
    name,
    central,
    flags,
    method: view.getUint16(at + 10, true),
    checksum: view.getUint32(at + 16, true),
    size,
    packed: bytes.subarray(start, start + packedSize),
  };
}

function unpack(entry: Entry): Uint8Array {
  if (entry.method !== method.stored && entry.method !== method.deflated) {
    throw new NotAWorkbook(
      `a part is packed in a way that no workbook uses: ${entry.name} (method ${entry.method})`,
    );
  }
  try {
    const content =
      entry.method === method.stored
        ? entry.packed
        : inflateSync(entry.packed, { out: new Uint8Array(entry.size) });
    if (content.length === entry.size && crc32(content) === entry.checksum) return content;
  } catch {
    // said below, in the same words
  }
  throw new NotAWorkbook(`a part of the file is damaged: ${entry.name}`);
}

/** Time, attributes and the like from the entry it replaces, or for a new one from its neighbour. */
function packed(name: string, content: Uint8Array, like: Uint8Array): Entry {
  const encoded = new TextEncoder().encode(name);
  const central = new Uint8Array(length.central + encoded.length);
  central.set(like.subarray(0, length.central));
  central.set(encoded, length.central);
  const view = new DataView(central.buffer);
  view.setUint16(28, encoded.length, true);
  view.setUint32(30, 0, true); // neither extra field nor comment
  return {
    name,
    central,
    flags: flag.utf8,
    method: method.deflated,
    checksum: crc32(content),
    size: content.length,
    packed: deflateSync(content),
  };
}

function writeEntries(entries: readonly Entry[]): Uint8Array {
  const pieces: Uint8Array[] = [];
  const directory: Uint8Array[] = [];
  let at = 0;
  for (const entry of entries) {
    const header = localHeader(entry);
    directory.push(centralHeader(entry, at));
    pieces.push(header, entry.packed);
    at += header.length + entry.packed.length;
  }
  const size = directory.reduce((sum, { length: l }) => sum + l, 0);
  return joined([...pieces, ...directory, endRecord(entries.length, size, at)]);
}

/** Sizes stand in the header itself: those that followed the data are known by now. */
const settled = (flags: number): number => flags & ~flag.sizesFollow;

function describe(view: DataView, at: number, entry: Entry): void {
  view.setUint16(at, settled(entry.flags), true);
  view.setUint16(at + 2, entry.method, true);
  view.setUint32(at + 8, entry.checksum, true);
  view.setUint32(at + 12, entry.packed.length, true);
  view.setUint32(at + 16, entry.size, true);
}

function localHeader(entry: Entry): Uint8Array {
  const source = new DataView(entry.central.buffer, entry.central.byteOffset);
  const nameLength = source.getUint16(28, true);
  const header = new Uint8Array(length.local + nameLength);
  const view = new DataView(header.buffer);
  view.setUint32(0, signature.local, true);
  view.setUint16(4, source.getUint16(6, true), true); // version needed
  view.setUint32(10, source.getUint32(12, true), true); // time and date
  describe(view, 6, entry);
  view.setUint16(26, nameLength, true);
  header.set(entry.central.subarray(length.central, length.central + nameLength), length.local);
  return header;
}

function centralHeader(entry: Entry, offset: number): Uint8Array {
  // a copy, also where the bytes came in Node's Buffer, whose own slice would share them
  const header = Uint8Array.from(entry.central);
  const view = new DataView(header.buffer);
  describe(view, 8, entry);
  view.setUint32(42, offset, true);
  return header;
}

function endRecord(count: number, size: number, offset: number): Uint8Array {
  const record = new Uint8Array(length.end);
  const view = new DataView(record.buffer);
  view.setUint32(0, signature.end, true);
  view.setUint16(8, count, true);
  view.setUint16(10, count, true);
  view.setUint32(12, size, true);
  view.setUint32(16, offset, true);
  return record;
}

function joined(pieces: readonly Uint8Array[]): Uint8Array {
  const whole = new Uint8Array(pieces.reduce((sum, piece) => sum + piece.length, 0));
  let at = 0;
  for (const piece of pieces) {
    whole.set(piece, at);
    at += piece.length;
  }
  return whole;
}
