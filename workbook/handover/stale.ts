/** Whether the inputs of a frozen cell are still those of the day it was frozen: a formula that tells. */
import type { Area } from '../../functions/address';
import { fixedArea, numberText, quoted } from '../../functions/builtIn/text';
import { CellError, type CellRange } from '../../functions/cell';
import type { World } from './world';

export interface Fingerprint {
  /** A sum over all inputs, each with a weight of its own, so that no two changes make up for each other by chance. */
  readonly formula: string;
  /** What it came to on the day of the copy. */
  readonly value: number;
}

/** Other programs round the last digits otherwise; a change that matters is larger. */
export const fingerprintTolerance = 1e-11;

/** Texts watched to the letter, in one range. */
const mostTexts = 40;

/**
 * @param sheet on which the frozen formula stands
 * @returns nothing where there are no inputs, or one of them is an error already
 */
export function fingerprintOf(areas: readonly Area[], sheet: string, world: World): Fingerprint | undefined {
  const terms = areas.map((area, n) =>
    termsOf({ ...area, sheet: area.sheet ?? sheet }, world.cellsIn(area, sheet), 1 / (1 + n / 7)),
  );
  if (terms.length === 0 || terms.some((term) => term === undefined)) return undefined;
  const known = terms as Fingerprint[];
  return {
    formula: known.map(({ formula }) => formula).join('+'),
    value: known.reduce((sum, { value }) => sum + value, 0),
  };
}

/** Numbers as a share of their weighted size, so that moles count as much as seconds; then kinds and texts. */
function termsOf(area: Area, cells: CellRange, share: number): Fingerprint | undefined {
  if (cells.flat().some((cell) => cell instanceof CellError)) return undefined;
  if (cells.flat().some((cell) => typeof cell === 'boolean')) return flagTerm(area, cells);
  const weight = (r: number, c: number): number => Math.sqrt(r * area.columns + c + 1);
  let [sum, size, kinds] = [0, 0, 0];
  const texts: string[] = [];
  cells.forEach((row, r) =>
    row.forEach((cell, c) => {
      if (typeof cell === 'number') {
        sum += cell * weight(r, c);
        size += Math.abs(cell) * weight(r, c);
        kinds += weight(r, c);
      } else if (typeof cell === 'string' && cell !== '' && texts.length < mostTexts) {
        const one = { ...area, row: area.row + r, column: area.column + c, rows: 1, columns: 1 };
        texts.push(`EXACT(${fixedArea(one)},${quoted(cell)})`);
      }
    }),
  );
  const factor = share / (size || 1);
  const [all, weights] = [fixedArea(area), weightText(area)];
  const formula = [
    `SUMPRODUCT(${all},${weights})*${numberText(factor)}`,
    `SUMPRODUCT(ISNUMBER(${all})*${weights})`,
    ...texts,
  ].join('+');
  return { formula, value: sum * factor + kinds + texts.length };
}

/** To some programs TRUE is a number and to others not: a flag is watched by itself, and not among readings. */
function flagTerm(area: Area, cells: CellRange): Fingerprint | undefined {
  if (cells.flat().length > 1) return undefined;
  return { formula: `IF(${fixedArea(area)},1,0)`, value: cells[0][0] ? 1 : 0 };
}

/** √1, √2, √3 … over the cells, row by row, wherever the area lies. */
function weightText(area: Area): string {
  const all = fixedArea(area);
  const first = fixedArea({ ...area, rows: 1, columns: 1 });
  const place = [
    ...(area.rows > 1 ? [`(ROW(${all})-ROW(${first}))*${area.columns}`] : []),
    ...(area.columns > 1 ? [`COLUMN(${all})-COLUMN(${first})`] : []),
    '1',
  ].join('+');
  return `SQRT(${place})`;
}
