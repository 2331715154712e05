/** Workbooks as .xlsx files. */
import type { BookModel, CellModel } from '../engine/engine';
import { createWorkbook } from '../xlsx/create';
import { plainKind } from '../xlsx/kinds';
import { patchWorkbook } from '../xlsx/patch';
import { readWorkbook } from '../xlsx/read';
import { typeCells } from '../xlsx/typeCells';
import type { FileFormat } from './documents';

export const fileFormat: FileFormat = {
  read: readWorkbook,
  create: createWorkbook,
  nameOf: (name, before, now) =>
    hasSameSheets(before, now) ? name : name.replace(/\.xl\w+$/i, plainKind.extension),
  update(original, before, now, calculated) {
    if (!hasSameSheets(before, now)) {
      return {
        bytes: createWorkbook(now, calculated),
        missing:
          'since sheets were added, renamed, moved or removed, the file was made anew: charts and other parts of the opened file are not in it',
      };
    }
    const bytes = patchWorkbook(typeCells(original, before, now), now, calculated);
    return hasSameLooks(before, now)
      ? { bytes }
      : { bytes, missing: 'bold and wrapped words set here are not in it' };
  },
};

const hasSameSheets = (before: BookModel, now: BookModel): boolean =>
  JSON.stringify(before.sheets.map(({ name }) => name)) ===
  JSON.stringify(now.sheets.map(({ name }) => name));

const look = ({ bold, wrap }: CellModel): string => JSON.stringify([bold, wrap]);

/** Only of cells that hold something; a new cell without a look of its own has none to lose. */
function hasSameLooks(before: BookModel, now: BookModel): boolean {
  return now.sheets.every((sheet, place) => {
    const looks = new Map(
      before.sheets[place].cells.map((cell) => [`${cell.row},${cell.column}`, look(cell)]),
    );
    return sheet.cells.every((cell) => {
      const known = looks.get(`${cell.row},${cell.column}`) ?? look({ ...cell, ...noLook });
      return known === look(cell);
    });
  });
}

const noLook = { bold: undefined, wrap: undefined } as const;
