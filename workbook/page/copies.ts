import type { WorkbookFiles } from '../../taskpane/port';
import { kindOf, plainKind } from '../xlsx/kinds';
import type { Documents } from './documents';
import { saveFile } from './files';

/** The open workbook as a file, and where a copy of it goes. */
export const pageFiles = (documents: Documents): WorkbookFiles => ({
  gives: 'is saved as a file of its own',
  verb: 'Save the copy…',
  read: () => documents.file(),
  async give(bytes) {
    const name = await saveFile(copyName(documents.name, kindOf(bytes)), async () => bytes);
    return name && `the copy is saved as ${name}`;
  },
});

/** @example copyName('Week 3.xlsm', kindOf(bytes)) // 'Week 3 handed over.xlsm' */
export const copyName = (name: string, { extension } = plainKind): string =>
  `${name.replace(/\.xl\w+$/i, '')} handed over${extension}`;
