/** Packages as other programs write them: in 64 bits, in one go without looking back, with bytes behind their end. */
import { spawnSync } from 'node:child_process';
import { strFromU8, strToU8, unzipSync, Zip, ZipDeflate } from 'fflate';
import { recalculate } from '../../../workbook/commands/recalculate';
import { Package } from '../../../workbook/xlsx/zip';
import { packageOf, partsOf, rowsOf, worksheet } from './package';

const book = packageOf({
  sheets: { Run: worksheet('<row r="1"><c r="A1"><v>40</v></c><c r="B1"><f>A1/4</f><v>9</v></c></row>') },
  parts: { 'xl/vbaProject.bin': new Uint8Array([1, 2, 250]) },
});

/** The sizes of each part follow its data. */
function streamed(bytes: Uint8Array): Uint8Array {
  const pieces: Uint8Array[] = [];
  const zip = new Zip((_, piece) => void pieces.push(piece));
  for (const [path, content] of Object.entries(partsOf(bytes))) {
    const part = new ZipDeflate(path);
    zip.add(part);
    part.push(content, true);
  }
  zip.end();
  return Buffer.concat(pieces);
}

/** The same parts, written by a program of another family; each entry with 64-bit fields, and those of the end too. */
const python = `
import io, sys, zipfile
source = zipfile.ZipFile(io.BytesIO(sys.stdin.buffer.read()))
zipfile.ZIP64_LIMIT = zipfile.ZIP_FILECOUNT_LIMIT = 0
out = io.BytesIO()
with zipfile.ZipFile(out, 'w', zipfile.ZIP_DEFLATED) as made:
    for name in source.namelist():
        with made.open(name, 'w', force_zip64=True) as part:
            part.write(source.read(name))
sys.stdout.buffer.write(out.getvalue())
`;
const inPython = (bytes: Uint8Array): Uint8Array => {
  const { stdout, stderr } = spawnSync('python3', ['-c', python], { input: bytes });
  if (stdout.length === 0) throw new Error(stderr.toString());
  return stdout;
};
const hasPython = spawnSync('python3', ['--version']).status === 0;
if (!hasPython) process.stderr.write('Python is not installed: packages in 64 bits are not read\n');

const has = (bytes: Uint8Array, signature: number): boolean =>
  Buffer.from(bytes).includes(Buffer.from(new Uint32Array([signature]).buffer));

async function expectRightCopy(bytes: Uint8Array): Promise<void> {
  const { bytes: after } = await recalculate(bytes);
  expect(rowsOf(after)).toContain('<f>A1/4</f><v>10</v>');
  const [was, is] = [partsOf(book), unzipSync(after)];
  expect(Object.keys(is).sort()).toEqual(Object.keys(was).sort());
  for (const path of Object.keys(was).filter((one) => !one.includes('sheet1')))
    expect([path, strFromU8(is[path], true)]).toEqual([path, strFromU8(was[path], true)]);
  // in 32 bits throughout
  expect(has(after, 0x06064b50)).toBe(false);
  expect(Package.open(after).names().sort()).toEqual(Object.keys(was).sort());
}

test('sizes that follow the data', async () => {
  const bytes = streamed(book);
  expect(has(bytes, 0x08074b50)).toBe(true);
  await expectRightCopy(bytes);
});

(hasPython ? test : test.skip)('64 bits', async () => {
  const bytes = inPython(book);
  expect(has(bytes, 0x06064b50)).toBe(true);
  await expectRightCopy(bytes);
});

test.each([1, 1000, 60_000])('%d bytes behind the end, which the copy leaves out', async (count) => {
  await expectRightCopy(Buffer.concat([book, strToU8('x'.repeat(count))]));
});
