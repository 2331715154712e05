import { strFromU8, strToU8, unzipSync } from 'fflate';
import { NotAWorkbook } from '../../../workbook/xlsx/notAWorkbook';
import { Package } from '../../../workbook/xlsx/zip';
import { zipped } from './package';

const files = {
  'first.xml': '<a/>',
  'folder/second.bin': new Uint8Array([0, 1, 2, 255]),
  'Größe ±.txt': 'third',
};

/** Name, time and packing of each entry, from the central directory. */
function directory(bytes: Uint8Array): { name: string; time: number; method: number; packed: string }[] {
  const view = new DataView(bytes.buffer, bytes.byteOffset);
  const end = bytes.length - 22;
  let at = view.getUint32(end + 16, true);
  return Array.from({ length: view.getUint16(end + 10, true) }, () => {
    const nameLength = view.getUint16(at + 28, true);
    const local = view.getUint32(at + 42, true);
    const data = local + 30 + view.getUint16(local + 26, true) + view.getUint16(local + 28, true);
    const entry = {
      name: strFromU8(bytes.subarray(at + 46, at + 46 + nameLength)),
      time: view.getUint32(at + 12, true),
      method: view.getUint16(at + 10, true),
      packed: Buffer.from(bytes.subarray(data, data + view.getUint32(at + 20, true))).toString('hex'),
    };
    at += 46 + nameLength + view.getUint16(at + 30, true) + view.getUint16(at + 32, true);
    return entry;
  });
}

test('opened and not changed, it is the same bytes', () => {
  const bytes = zipped(files);
  expect(Package.open(bytes).bytes()).toBe(bytes);
});

test('what is not changed keeps its place, time and packed bytes; another program can read all of it', () => {
  const before = zipped(files);
  const pack = Package.open(before);
  pack.write('first.xml', strToU8('<b>longer than it was</b>'));
  pack.write('new.xml', strToU8('<c/>'));
  const after = pack.bytes();
  const was = directory(before);
  const is = directory(after);
  expect(is.map(({ name }) => name)).toEqual([...Object.keys(files), 'new.xml']);
  expect(is.slice(1, 3)).toEqual(was.slice(1));
  expect(is[0].time).toBe(was[0].time);
  const read = unzipSync(after);
  expect(strFromU8(read['first.xml'])).toBe('<b>longer than it was</b>');
  expect(strFromU8(read['new.xml'])).toBe('<c/>');
  expect([...read['folder/second.bin']]).toEqual([0, 1, 2, 255]);
});

test('a part is removed, changed parts are read as changed', () => {
  const pack = Package.open(zipped(files));
  pack.remove('first.xml');
  pack.write('folder/second.bin', strToU8('x'));
  expect([pack.has('first.xml'), pack.has('folder/second.bin'), pack.has('none')]).toEqual([
    false,
    true,
    false,
  ]);
  expect(strFromU8(pack.read('folder/second.bin'))).toBe('x');
  expect(Object.keys(unzipSync(pack.bytes()))).toEqual(['folder/second.bin', 'Größe ±.txt']);
  expect(() => pack.read('first.xml')).toThrow(/missing: first\.xml/);
});

test('a part whose bytes have changed on the way is told by its checksum', () => {
  const bytes = zipped(files);
  const at = Buffer.from(bytes).indexOf(Buffer.from([0, 1, 2, 255]));
  bytes[at + 1] = 9;
  const pack = Package.open(bytes);
  expect(() => pack.read('folder/second.bin')).toThrow(NotAWorkbook);
  expect(strFromU8(pack.read('first.xml'))).toBe('<a/>');
});

test('every way of cutting it short is refused', () => {
  const bytes = zipped(files);
  for (const length of [0, 10, 30, bytes.length >> 1, bytes.length - 23, bytes.length - 1]) {
    expect(() => Package.open(bytes.slice(0, length))).toThrow(NotAWorkbook);
  }
});
