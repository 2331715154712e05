/** The looks that cells refer to by number: bold, wrapped, and how a number is shown. */
import { elementsIn } from './parts';
import type { Package } from './zip';

export interface CellLook {
  readonly bold: boolean;
  readonly wrap: boolean;
}

export function readLooks(pack: Package, path: string | undefined): CellLook[] {
  if (path === undefined || !pack.has(path)) return [];
  const boldFonts: boolean[] = [];
  const looks: { font: number; wrap: boolean }[] = [];
  for (const { name, attributes, inside } of elementsIn(pack, path)) {
    const parent = inside.at(-1);
    if (name === 'font' && parent === 'fonts') boldFonts.push(false);
    else if (name === 'b' && parent === 'font' && inside.includes('fonts'))
      boldFonts[boldFonts.length - 1] = isOn(attributes.val);
    else if (name === 'xf' && parent === 'cellXfs')
      looks.push({ font: Number(attributes.fontId ?? 0), wrap: false });
    else if (name === 'alignment' && inside.includes('cellXfs'))
      looks.at(-1)!.wrap = isOn(attributes.wrapText ?? '0');
  }
  return looks.map(({ font, wrap }) => ({ bold: boldFonts[font] ?? false, wrap }));
}

const isOn = (value: string | undefined): boolean => value === undefined || value === '1' || value === 'true';
