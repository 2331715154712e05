/** The looks that cells refer to by number: bold, wrapped, and how a number is shown. */
import { builtInFormats } from './numberFormats';
import { elementsIn } from './parts';
import type { Package } from './zip';

export interface CellLook {
  readonly bold: boolean;
  readonly wrap: boolean;
  /** Left out for a number that is shown as it is. */
  readonly numberFormat?: string;
}

export function readLooks(pack: Package, path: string | undefined): CellLook[] {
  if (path === undefined || !pack.has(path)) return [];
  const boldFonts: boolean[] = [];
  const formats = new Map(builtInFormats);
  const looks: { font: number; format: number; wrap: boolean }[] = [];
  for (const { name, attributes, inside } of elementsIn(pack, path)) {
    const parent = inside.at(-1);
    if (name === 'font' && parent === 'fonts') boldFonts.push(false);
    else if (name === 'b' && parent === 'font' && inside.includes('fonts'))
      boldFonts[boldFonts.length - 1] = isOn(attributes.val);
    else if (name === 'numFmt' && parent === 'numFmts')
      formats.set(Number(attributes.numFmtId), attributes.formatCode);
    else if (name === 'xf' && parent === 'cellXfs')
      looks.push({
        font: Number(attributes.fontId ?? 0),
        format: Number(attributes.numFmtId ?? 0),
        wrap: false,
      });
    else if (name === 'alignment' && inside.includes('cellXfs'))
      looks.at(-1)!.wrap = isOn(attributes.wrapText ?? '0');
  }
  return looks.map(({ font, format, wrap }) => {
    const numberFormat = formats.get(format);
    const isPlain = numberFormat === undefined || numberFormat === 'General';
    return { bold: boldFonts[font] ?? false, wrap, ...(isPlain ? {} : { numberFormat }) };
  });
}

/** Of an attribute that is a flag. */
export const isOn = (value: string | undefined): boolean =>
  value === undefined || value === '1' || value === 'true';
