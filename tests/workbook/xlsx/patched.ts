/** What the tests of patching have in common: one sheet in, its rows after recalculation out. */
import { parseArea } from '../../../functions/address';
import { recalculate } from '../../../workbook/commands/recalculate';
import { packageOf, partsOf, rowsOf, worksheet } from './package';

/** Whatever a test looks at: each cell stands once, in reading order, in every sheet. */
export async function recalculated(bytes: Uint8Array): Promise<Uint8Array> {
  const after = (await recalculate(bytes)).bytes;
  for (const [path, part] of Object.entries(partsOf(after))) {
    if (!/worksheets\/[^/]+\.xml$/.test(path)) continue;
    const cells = new TextDecoder().decode(part).matchAll(/<(?:\w+:)?c [^>]*?\br="([A-Z]+\d+)"/g);
    const places = [...cells].map(([, name]) => parseArea(name)!);
    const order = places.map(({ row, column }) => row * 20_000 + column);
    order.slice(1).forEach((place, i) => expect(place).toBeGreaterThan(order[i]));
  }
  return after;
}

/** The rows of one sheet, before and after. */
export async function rows(before: string, options: Parameters<typeof worksheet>[1] = {}): Promise<string> {
  return rowsOf(await recalculated(packageOf({ sheets: { Run: worksheet(before, options) } })));
}

export const dynamic = (ref: string, formula: string): string => `<f t="array" ref="${ref}">${formula}</f>`;
export const times = '<c r="A1"><v>40</v></c>';
export const row2 = '<row r="2"><c r="A2"><v>25</v></c></row>';

export const metadata = (inside: string): string =>
  `<metadata xmlns="http://schemas.openxmlformats.org/spreadsheetml/2006/main">${inside}</metadata>`;
export const metadataPart = {
  path: 'xl/metadata.xml',
  type: 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheetMetadata+xml',
  kind: 'sheetMetadata',
};
