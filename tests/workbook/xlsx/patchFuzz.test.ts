/** Sheets made up at random: whatever stands beside whatever, a patched file reads back as what was calculated. */
import * as XLSX from '@e965/xlsx';
import { cellName } from '../../../functions/address';
import { CellError } from '../../../functions/cell';
import { calculate } from '../../../workbook/engine/univer/headless';
import { readWorkbook } from '../../../workbook/xlsx/read';
import { uniform } from '../../support/random';
import { packageOf, worksheet } from './package';
import { recalculated } from './patched';

const [rows, columns] = [9, 6];
const formulas = [
  'PACE.EVENT({40;25})',
  'PACE.EVENT({40,25,20})',
  'SEQUENCE(2,2)',
  '1+1',
  'SUM(A1:A9)',
  'IF(1>2,1,"no")',
];

/** A third of the cells are filled, half of these with a formula that has no value yet or a stale one. */
function madeUp(seed: number): string {
  const next = uniform(seed);
  return Array.from({ length: rows }, (_, r) => {
    const cells = Array.from({ length: columns }, (__, c) => {
      if (next() > 0.33) return '';
      const name = cellName(r, c);
      if (next() > 0.5) return `<c r="${name}"><v>${Math.round(100 * next())}</v></c>`;
      const formula = formulas[Math.floor(next() * formulas.length)]
        .replace(/"/g, '&quot;')
        .replace(/>/g, '&gt;');
      return `<c r="${name}"><f>${formula}</f>${next() > 0.5 ? '<v>7</v>' : ''}</c>`;
    }).join('');
    return cells === '' && next() > 0.5 ? '' : `<row r="${r + 1}">${cells}</row>`;
  }).join('');
}

test.each(Array.from({ length: 60 }, (_, i) => i + 1))('sheet made up from seed %d', async (seed) => {
  const bytes = packageOf({ sheets: { Run: worksheet(madeUp(seed)) } });
  const expected = await calculate(readWorkbook(bytes));
  const sheet = XLSX.read(await recalculated(bytes), { type: 'array' }).Sheets.Run;
  for (let r = 0; r < rows + 3; r++) {
    for (let c = 0; c < columns + 3; c++) {
      const shown = expected.shown('Run', r, c);
      const found = sheet[cellName(r, c)] as XLSX.CellObject | undefined;
      if (shown instanceof CellError) expect(found?.t).toBe('e');
      else expect(found?.v ?? null).toEqual(shown);
    }
  }
});
